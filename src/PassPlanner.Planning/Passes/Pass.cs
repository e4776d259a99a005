using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>A spacecraft above a station's horizon mask, from rise to set. Angles are geometric.</summary>
public sealed record Pass
{
    /// <summary>From AOS to LOS, half-open.</summary>
    public required TimeWindow Window { get; init; }

    /// <summary>Whether the spacecraft was up before, so that the window starts where the search, a day or a period does.</summary>
    public required bool AosIsOpen { get; init; }

    /// <summary>Whether the spacecraft stays up, or its element set fails, so that the window ends before it sets.</summary>
    public required bool LosIsOpen { get; init; }

    /// <summary>Instant of the greatest elevation.</summary>
    public required UtcInstant MaximumElevationUtc { get; init; }

    /// <summary>Greatest elevation, degrees.</summary>
    public required double MaximumElevationDeg { get; init; }

    /// <summary>Azimuth at the greatest elevation, degrees.</summary>
    public required double MaximumElevationAzimuthDeg { get; init; }

    /// <summary>Range at the greatest elevation, km.</summary>
    public required double MaximumElevationRangeKm { get; init; }

    /// <summary>Instant of the least range.</summary>
    public required UtcInstant ClosestApproachUtc { get; init; }

    /// <summary>Least range, km.</summary>
    public required double ClosestRangeKm { get; init; }

    /// <summary>Azimuth at AOS, degrees.</summary>
    public required double AosAzimuthDeg { get; init; }

    /// <summary>Azimuth at LOS, degrees.</summary>
    public required double LosAzimuthDeg { get; init; }

    /// <summary>Whether the azimuth goes through north.</summary>
    public required bool CrossesNorth { get; init; }
}
