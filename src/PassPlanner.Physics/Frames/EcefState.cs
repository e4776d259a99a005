namespace PassPlanner.Physics.Frames;

/// <summary>Position and velocity in Earth-fixed axes; the velocity is relative to the rotating Earth.</summary>
/// <param name="PositionKm">Position, km.</param>
/// <param name="VelocityKmPerS">Velocity relative to the Earth's surface, km/s.</param>
public readonly record struct EcefState(Vector3D PositionKm, Vector3D VelocityKmPerS);
