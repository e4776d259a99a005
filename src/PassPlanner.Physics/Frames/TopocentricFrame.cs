namespace PassPlanner.Physics.Frames;

/// <summary>
/// East, north and up at a station on the WGS-84 ellipsoid; up is the ellipsoid's normal. Built once per station;
/// immutable. Angles are geometric: no refraction, no light time, no aberration.
/// </summary>
public sealed class TopocentricFrame
{
    private const double DegPerRad = 180.0 / Math.PI;

    /// <summary>Builds the frame of a station.</summary>
    /// <param name="position">Latitude -90 to 90 degrees, longitude -180 to 360 degrees, height -1,000 to 100,000 m.</param>
    /// <exception cref="ArgumentOutOfRangeException">A coordinate is outside its range or not finite.</exception>
    public TopocentricFrame(GeodeticPosition position)
    {
        Require(position.LatitudeDeg is >= -90.0 and <= 90.0, nameof(position.LatitudeDeg), position.LatitudeDeg, "degrees, -90 to 90");
        Require(position.LongitudeDeg is >= -180.0 and <= 360.0, nameof(position.LongitudeDeg), position.LongitudeDeg, "degrees, -180 to 360");
        Require(position.HeightM is >= -1000.0 and <= 100000.0, nameof(position.HeightM), position.HeightM, "m, -1000 to 100000");
        Position = position;
        PositionKm = Wgs84.ToEcefKm(position);
        (double sinLatitude, double cosLatitude) = Math.SinCos(position.LatitudeDeg / DegPerRad);
        (double sinLongitude, double cosLongitude) = Math.SinCos(position.LongitudeDeg / DegPerRad);
        East = new Vector3D(-sinLongitude, cosLongitude, 0.0);
        North = new Vector3D(-sinLatitude * cosLongitude, -sinLatitude * sinLongitude, cosLatitude);
        Up = new Vector3D(cosLatitude * cosLongitude, cosLatitude * sinLongitude, sinLatitude);
    }

    /// <summary>Where the station is.</summary>
    public GeodeticPosition Position { get; }

    /// <summary>Earth-fixed position of the station, km.</summary>
    public Vector3D PositionKm { get; }

    /// <summary>Unit vector to the east, Earth-fixed.</summary>
    public Vector3D East { get; }

    /// <summary>Unit vector to the north, Earth-fixed.</summary>
    public Vector3D North { get; }

    /// <summary>Unit vector along the ellipsoid's normal, Earth-fixed.</summary>
    public Vector3D Up { get; }

    /// <summary>Where the station sees a spacecraft, and how fast the distance grows.</summary>
    /// <param name="spacecraft">Earth-fixed state of the spacecraft, not at the station itself.</param>
    public LookAngles Look(in EcefState spacecraft)
    {
        Vector3D sight = spacecraft.PositionKm - PositionKm;
        (double azimuthDeg, double elevationDeg) = Direction(sight);
        double rangeKm = sight.Norm;
        return new LookAngles(azimuthDeg, elevationDeg, rangeKm, sight.Dot(spacecraft.VelocityKmPerS) / rangeKm);
    }

    /// <summary>Sine of the geometric elevation of an Earth-fixed position: the cheap test against a level horizon.</summary>
    /// <param name="positionKm">Earth-fixed position, km, not at the station itself.</param>
    public double SinElevation(in Vector3D positionKm)
    {
        Vector3D sight = positionKm - PositionKm;
        return sight.Dot(Up) / sight.Norm;
    }

    /// <summary>Azimuth (0 to below 360) and elevation, degrees, of an Earth-fixed vector from the station, of any length.</summary>
    /// <param name="sight">Vector, not zero.</param>
    public (double AzimuthDeg, double ElevationDeg) Direction(in Vector3D sight)
    {
        double east = sight.Dot(East);
        double north = sight.Dot(North);
        double elevation = Math.Atan2(sight.Dot(Up), Math.Sqrt((east * east) + (north * north)));
        return (AzimuthDeg(east, north), elevation * DegPerRad);
    }

    /// <summary>Earth-fixed unit vector of a direction that the station looks in.</summary>
    /// <param name="azimuthDeg">Clockwise from true north, degrees.</param>
    /// <param name="elevationDeg">Above the local level, degrees, -90 to 90.</param>
    public Vector3D UnitVector(double azimuthDeg, double elevationDeg)
    {
        (double sinAzimuth, double cosAzimuth) = Math.SinCos(azimuthDeg / DegPerRad);
        (double sinElevation, double cosElevation) = Math.SinCos(elevationDeg / DegPerRad);
        return (East * (cosElevation * sinAzimuth)) + (North * (cosElevation * cosAzimuth)) + (Up * sinElevation);
    }

    private static double AzimuthDeg(double east, double north)
    {
        double azimuthDeg = Math.Atan2(east, north) * DegPerRad;
        if (azimuthDeg < 0.0)
        {
            azimuthDeg += 360.0;
        }

        return azimuthDeg < 360.0 ? azimuthDeg : 0.0;
    }

    private static void Require(bool holds, string name, double value, string range)
    {
        if (!holds)
        {
            throw new ArgumentOutOfRangeException(name, value, $"{name} must be {range}.");
        }
    }
}
