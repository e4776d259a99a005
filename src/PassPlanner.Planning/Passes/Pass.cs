using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>A spacecraft above a station's horizon mask, from rise to set. Angles are geometric.</summary>
public sealed record Pass
{
    /// <summary>From AOS to LOS, half-open, each to better than a millisecond. An open end stands at UTC midnight.</summary>
    public required TimeWindow Window { get; init; }

    /// <summary>Whether the spacecraft was up before the window: it rose more than a day before the period, or never.</summary>
    public required bool AosIsOpen { get; init; }

    /// <summary>Whether the window ends before the spacecraft sets: it stays up for more than a day past the period, or its propagation fails.</summary>
    public required bool LosIsOpen { get; init; }

    /// <summary>Why and when the propagation fails, when that is what cuts the pass; else nothing.</summary>
    public PropagationFailure? CutBy { get; init; }

    /// <summary>Instant of the greatest elevation.</summary>
    public required UtcInstant MaximumElevationUtc { get; init; }

    /// <summary>Greatest elevation, degrees.</summary>
    public required double MaximumElevationDeg { get; init; }

    /// <summary>Azimuth at the greatest elevation, degrees, 0 to below 360.</summary>
    public required double MaximumElevationAzimuthDeg { get; init; }

    /// <summary>Range at the greatest elevation, km.</summary>
    public required double MaximumElevationRangeKm { get; init; }

    /// <summary>Instant of the least range within the window; in eccentric orbits it can be AOS or LOS itself.</summary>
    public required UtcInstant ClosestApproachUtc { get; init; }

    /// <summary>Least range within the window, km.</summary>
    public required double ClosestRangeKm { get; init; }

    /// <summary>Azimuth at the start of the window, degrees, 0 to below 360.</summary>
    public required double AosAzimuthDeg { get; init; }

    /// <summary>Azimuth at the end of the window, degrees, 0 to below 360.</summary>
    public required double LosAzimuthDeg { get; init; }

    /// <summary>Whether the azimuth goes through north, 0 or 360 degrees.</summary>
    public required bool CrossesNorth { get; init; }
}
