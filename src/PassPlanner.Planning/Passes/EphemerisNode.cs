using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>A state by SGP4 itself on a node of time.</summary>
/// <param name="Utc">Instant.</param>
/// <param name="State">Earth-fixed state.</param>
internal readonly record struct EphemerisNode(UtcInstant Utc, EcefState State)
{
    /// <summary>Seconds to a later node.</summary>
    public double SecondsTo(in EphemerisNode later) => later.Utc.SecondsSince(Utc);
}
