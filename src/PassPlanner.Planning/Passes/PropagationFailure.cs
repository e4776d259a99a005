using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>Where the propagation of a spacecraft ends.</summary>
/// <param name="Status">Why.</param>
/// <param name="FirstUtc">First instant without a position, to 0.1 s; nothing after it is used.</param>
public sealed record PropagationFailure(Sgp4Status Status, UtcInstant FirstUtc);
