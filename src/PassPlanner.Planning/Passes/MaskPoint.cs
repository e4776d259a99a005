namespace PassPlanner.Planning.Passes;

/// <summary>One point of a horizon mask.</summary>
/// <param name="AzimuthDeg">Clockwise from true north, degrees, 0 to below 360.</param>
/// <param name="ElevationDeg">Elevation of the horizon there, degrees, -5 to 90.</param>
public readonly record struct MaskPoint(double AzimuthDeg, double ElevationDeg);
