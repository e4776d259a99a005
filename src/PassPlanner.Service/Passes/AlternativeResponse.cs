namespace PassPlanner.Service.Passes;

/// <summary>The same pass by another antenna or link.</summary>
public sealed record AlternativeResponse
{
    /// <summary>Antenna.</summary>
    public required string Antenna { get; init; }

    /// <summary>Its name.</summary>
    public required string AntennaName { get; init; }

    /// <summary>Link.</summary>
    public required LinkReference Link { get; init; }

    /// <summary>Verdict.</summary>
    public required string Verdict { get; init; }

    /// <summary>Bytes.</summary>
    public required double YieldBytes { get; init; }

    /// <summary>Address.</summary>
    public required string PassUrl { get; init; }
}
