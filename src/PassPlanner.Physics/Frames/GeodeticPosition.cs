namespace PassPlanner.Physics.Frames;

/// <summary>A place on or above the WGS-84 ellipsoid. The default value is the equator at the prime meridian.</summary>
/// <param name="LatitudeDeg">Geodetic latitude, degrees north, -90 to 90.</param>
/// <param name="LongitudeDeg">Longitude, degrees east, -180 to 360.</param>
/// <param name="HeightM">Height above the ellipsoid, m.</param>
public readonly record struct GeodeticPosition(double LatitudeDeg, double LongitudeDeg, double HeightM);
