namespace PassPlanner.Physics.Frames;

/// <summary>The WGS-84 ellipsoid (NGA.STND.0036, 2014).</summary>
public static class Wgs84
{
    /// <summary>Equatorial radius, km, defining.</summary>
    public const double EquatorialRadiusKm = 6378.137;

    /// <summary>Flattening, defining: 1 / 298.257223563.</summary>
    public const double Flattening = 1.0 / 298.257223563;

    /// <summary>Square of the first eccentricity.</summary>
    public const double EccentricitySquared = Flattening * (2.0 - Flattening);

    /// <summary>Earth-fixed position of a place; exact (closed form).</summary>
    /// <param name="position">Geodetic latitude, longitude and height.</param>
    /// <returns>Position, km.</returns>
    public static Vector3D ToEcefKm(GeodeticPosition position)
    {
        (double sinLatitude, double cosLatitude) = Math.SinCos(position.LatitudeDeg * (Math.PI / 180.0));
        (double sinLongitude, double cosLongitude) = Math.SinCos(position.LongitudeDeg * (Math.PI / 180.0));
        double heightKm = position.HeightM / 1000.0;
        double normalKm = EquatorialRadiusKm / Math.Sqrt(1.0 - (EccentricitySquared * sinLatitude * sinLatitude));
        double equatorialKm = (normalKm + heightKm) * cosLatitude;
        return new Vector3D(
            equatorialKm * cosLongitude,
            equatorialKm * sinLongitude,
            ((normalKm * (1.0 - EccentricitySquared)) + heightKm) * sinLatitude);
    }

    /// <summary>
    /// Geodetic position of an Earth-fixed point, by Bowring's formula (1976) with a second turn of its parametric
    /// latitude: within 1e-9 degrees and 0.1 mm from the surface to beyond geostationary height.
    /// </summary>
    /// <param name="positionKm">Earth-fixed position, km, at least 1,000 km from the Earth's centre.</param>
    /// <returns>Latitude and longitude (-180 to 180), degrees; height, m.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The point is nearer to the centre, or not finite.</exception>
    public static GeodeticPosition ToGeodetic(in Vector3D positionKm)
    {
        double distanceKm = positionKm.Norm;
        if (!(distanceKm >= 1000.0) || !double.IsFinite(distanceKm))
        {
            throw new ArgumentOutOfRangeException(
                nameof(positionKm), distanceKm, "positionKm must lie at least 1000 km from the Earth's centre, and be finite.");
        }

        const double PolarRadiusKm = EquatorialRadiusKm * (1.0 - Flattening);
        const double SecondEccentricitySquared = EccentricitySquared / (1.0 - EccentricitySquared);
        double equatorialKm = Math.Sqrt((positionKm.X * positionKm.X) + (positionKm.Y * positionKm.Y));
        double parametric = Math.Atan2(positionKm.Z * EquatorialRadiusKm, equatorialKm * PolarRadiusKm);
        double latitude = 0.0;
        for (int turn = 0; turn < 2; turn++)
        {
            (double sin, double cos) = Math.SinCos(parametric);
            latitude = Math.Atan2(
                positionKm.Z + (SecondEccentricitySquared * PolarRadiusKm * sin * sin * sin),
                equatorialKm - (EccentricitySquared * EquatorialRadiusKm * cos * cos * cos));
            parametric = Math.Atan((1.0 - Flattening) * Math.Tan(latitude));
        }

        (double sinLatitude, double cosLatitude) = Math.SinCos(latitude);
        double heightKm = (equatorialKm * cosLatitude) + (positionKm.Z * sinLatitude)
            - (EquatorialRadiusKm * Math.Sqrt(1.0 - (EccentricitySquared * sinLatitude * sinLatitude)));
        return new GeodeticPosition(
            latitude * (180.0 / Math.PI), Math.Atan2(positionKm.Y, positionKm.X) * (180.0 / Math.PI), heightKm * 1000.0);
    }
}
