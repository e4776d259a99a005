using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>Where the propagation of a spacecraft ends.</summary>
/// <param name="Status">Why; never Ok.</param>
/// <param name="FirstUtc">First instant without a position, to a millisecond; nothing after it is used, even where SGP4 recovers.</param>
public sealed record PropagationFailure(Sgp4Status Status, UtcInstant FirstUtc);
