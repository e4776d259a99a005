namespace PassPlanner.Physics.Frames;

/// <summary>Where a station sees a spacecraft: geometric, without refraction, light time or aberration.</summary>
/// <param name="AzimuthDeg">Clockwise from true north, degrees, 0 to below 360.</param>
/// <param name="ElevationDeg">Above the plane normal to the ellipsoid, degrees, -90 to 90.</param>
/// <param name="SlantRangeKm">Distance, km.</param>
/// <param name="RangeRateKmPerS">Rate of the distance, km/s, positive when receding; the Earth's rotation is in it.</param>
public readonly record struct LookAngles(double AzimuthDeg, double ElevationDeg, double SlantRangeKm, double RangeRateKmPerS);
