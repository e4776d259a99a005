using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>A rise above, or a fall below, the horizon mask.</summary>
internal readonly record struct Crossing(UtcInstant Utc, bool IsRise);
