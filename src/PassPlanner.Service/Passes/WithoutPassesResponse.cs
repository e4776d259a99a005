namespace PassPlanner.Service.Passes;

/// <summary>A spacecraft, or a pair of spacecraft and station, without a pass, or whose passes end early.</summary>
public sealed record WithoutPassesResponse
{
    /// <summary>Spacecraft.</summary>
    public required string Spacecraft { get; init; }

    /// <summary>Station; left out when the reason holds for all.</summary>
    public string? Station { get; init; }

    /// <summary>noElementSet, noAntennaForFrequency, neverUp, decayed or propagationFailed.</summary>
    public required string Reason { get; init; }

    /// <summary>The reason in words.</summary>
    public required string Detail { get; init; }
}
