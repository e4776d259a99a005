namespace PassPlanner.Service.Status;

/// <summary>The service at a glance.</summary>
public sealed record StatusResponse
{
    /// <summary>The service's clock.</summary>
    public required string NowUtc { get; init; }

    /// <summary>Version of the service.</summary>
    public required string Version { get; init; }

    /// <summary>Whether the demo scenario is loaded.</summary>
    public required bool HasDemo { get; init; }

    /// <summary>Number of stations.</summary>
    public required int Stations { get; init; }

    /// <summary>Number of spacecraft.</summary>
    public required int Spacecraft { get; init; }

    /// <summary>UT1-UTC in use, s.</summary>
    public required double Ut1MinusUtcS { get; init; }

    /// <summary>Where UT1-UTC comes from.</summary>
    public required string Ut1Source { get; init; }
}
