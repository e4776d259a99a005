namespace PassPlanner.Physics.Frames;

/// <summary>Local axes at a station: east, north, and up along the normal of the ellipsoid. Immutable.</summary>
public sealed class TopocentricFrame
{
    private readonly Vector3D east;
    private readonly Vector3D north;
    private readonly Vector3D up;

    /// <summary>Axes at a place.</summary>
    public TopocentricFrame(GeodeticPosition position)
    {
        Position = position;
        PositionKm = Wgs84.ToEcefKm(position);
        (double sinLatitude, double cosLatitude) = Math.SinCos(double.DegreesToRadians(position.LatitudeDeg));
        (double sinLongitude, double cosLongitude) = Math.SinCos(double.DegreesToRadians(position.LongitudeDeg));
        east = new Vector3D(-sinLongitude, cosLongitude, 0);
        north = new Vector3D(-sinLatitude * cosLongitude, -sinLatitude * sinLongitude, cosLatitude);
        up = new Vector3D(cosLatitude * cosLongitude, cosLatitude * sinLongitude, sinLatitude);
    }

    /// <summary>The place.</summary>
    public GeodeticPosition Position { get; }

    /// <summary>The place in Earth-fixed axes, km.</summary>
    public Vector3D PositionKm { get; }

    /// <summary>Where the station sees a spacecraft.</summary>
    public LookAngles Look(in EcefState spacecraft)
    {
        Vector3D lineOfSight = spacecraft.PositionKm - PositionKm;
        double rangeKm = lineOfSight.Norm;
        (double azimuthDeg, double elevationDeg) = Direction(lineOfSight);
        return new LookAngles(azimuthDeg, elevationDeg, rangeKm, lineOfSight.Dot(spacecraft.VelocityKmPerS) / rangeKm);
    }

    /// <summary>Azimuth, degrees 0 to below 360, and elevation, degrees, of an Earth-fixed vector of any length.</summary>
    public (double AzimuthDeg, double ElevationDeg) Direction(in Vector3D ecef)
    {
        double alongEast = ecef.Dot(east);
        double alongNorth = ecef.Dot(north);
        double azimuthDeg = double.RadiansToDegrees(Math.Atan2(alongEast, alongNorth));
        azimuthDeg = azimuthDeg < 0 ? azimuthDeg + 360 : azimuthDeg;
        double elevationRad = Math.Atan2(ecef.Dot(up), Math.Sqrt((alongEast * alongEast) + (alongNorth * alongNorth)));
        return (azimuthDeg >= 360 ? 0 : azimuthDeg, double.RadiansToDegrees(elevationRad));
    }

    /// <summary>Sine of the elevation of a spacecraft: enough to tell whether it may be up, for a fraction of the cost.</summary>
    public double SineOfElevation(in Vector3D spacecraftKm)
    {
        Vector3D lineOfSight = spacecraftKm - PositionKm;
        return lineOfSight.Dot(up) / lineOfSight.Norm;
    }

    /// <summary>Rate of the sine of the elevation, 1/s.</summary>
    public double RateOfSineOfElevation(in EcefState spacecraft)
    {
        Vector3D lineOfSight = spacecraft.PositionKm - PositionKm;
        double rangeKm = lineOfSight.Norm;
        double alongUp = lineOfSight.Dot(up);
        double rangeRate = lineOfSight.Dot(spacecraft.VelocityKmPerS) / rangeKm;
        return (spacecraft.VelocityKmPerS.Dot(up) - (alongUp / rangeKm * rangeRate)) / rangeKm;
    }
}
