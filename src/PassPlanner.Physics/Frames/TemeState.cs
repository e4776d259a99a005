namespace PassPlanner.Physics.Frames;

/// <summary>Position and velocity in the true-equator, mean-equinox frame of SGP4.</summary>
/// <param name="PositionKm">Position, km.</param>
/// <param name="VelocityKmPerS">Velocity, km/s.</param>
public readonly record struct TemeState(Vector3D PositionKm, Vector3D VelocityKmPerS);
