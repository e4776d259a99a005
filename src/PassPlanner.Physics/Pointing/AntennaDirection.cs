namespace PassPlanner.Physics.Pointing;

/// <summary>A direction in antenna axes.</summary>
/// <param name="OffAxisRad">Angle from the boresight, rad, 0 to pi.</param>
/// <param name="PhiRad">Angle about the boresight from the reference direction towards boresight x reference, rad, -pi to pi.</param>
public readonly record struct AntennaDirection(double OffAxisRad, double PhiRad);
