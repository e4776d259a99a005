namespace PassPlanner.Planning.Profiles;

/// <summary>Boresight of an antenna that does not move.</summary>
/// <param name="AzimuthDeg">Azimuth, degrees, 0 to below 360.</param>
/// <param name="ElevationDeg">Elevation, degrees, 0 to 90.</param>
public sealed record FixedDirection(double AzimuthDeg, double ElevationDeg);
