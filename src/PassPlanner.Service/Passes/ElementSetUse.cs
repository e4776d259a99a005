namespace PassPlanner.Service.Passes;

/// <summary>The element set behind a result.</summary>
public sealed record ElementSetUse
{
    /// <summary>Its epoch.</summary>
    public required string EpochUtc { get; init; }

    /// <summary>Its age at the greatest elevation, hours; negative for an epoch later than that.</summary>
    public required double AgeH { get; init; }

    /// <summary>Age past which a result is marked, hours; it depends on the orbit.</summary>
    public required double LimitH { get; init; }

    /// <summary>Expected error of every instant of the pass at that age, one standard deviation, s.</summary>
    public required double TimingErrorS { get; init; }

    /// <summary>Whether the age is past the limit.</summary>
    public required bool IsStale { get; init; }
}
