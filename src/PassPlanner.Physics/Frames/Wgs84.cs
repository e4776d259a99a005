namespace PassPlanner.Physics.Frames;

/// <summary>The WGS-84 ellipsoid and rotation (NIMA TR8350.2, third edition, tables 3.1 and 3.3).</summary>
public static class Wgs84
{
    /// <summary>Equatorial radius, km.</summary>
    public const double EquatorialRadiusKm = 6378.137;

    /// <summary>Flattening.</summary>
    public const double Flattening = 1 / 298.257223563;

    /// <summary>Earth-fixed position of a place, km.</summary>
    public static Vector3D ToEcefKm(GeodeticPosition position)
    {
        const double eccentricitySquared = Flattening * (2 - Flattening);
        (double sinLatitude, double cosLatitude) = Math.SinCos(double.DegreesToRadians(position.LatitudeDeg));
        (double sinLongitude, double cosLongitude) = Math.SinCos(double.DegreesToRadians(position.LongitudeDeg));
        double heightKm = position.HeightM / 1000;
        double normalKm = EquatorialRadiusKm / Math.Sqrt(1 - (eccentricitySquared * sinLatitude * sinLatitude));
        return new Vector3D(
            (normalKm + heightKm) * cosLatitude * cosLongitude,
            (normalKm + heightKm) * cosLatitude * sinLongitude,
            ((normalKm * (1 - eccentricitySquared)) + heightKm) * sinLatitude);
    }
}
