namespace PassPlanner.Physics.Time;

/// <summary>A half-open interval of UTC: the start belongs to it, the end does not. The default value is empty.</summary>
/// <param name="StartUtc">First instant inside.</param>
/// <param name="EndUtc">First instant after it.</param>
public readonly record struct TimeWindow(UtcInstant StartUtc, UtcInstant EndUtc)
{
    /// <summary>Length, s.</summary>
    public double DurationS => EndUtc.SecondsSince(StartUtc);

    /// <summary>Whether an instant lies inside.</summary>
    public bool Contains(UtcInstant instant) => StartUtc <= instant && instant < EndUtc;

    /// <summary>Whether the two windows share an instant.</summary>
    public bool Overlaps(TimeWindow other) => StartUtc < other.EndUtc && other.StartUtc < EndUtc;
}
