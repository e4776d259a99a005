namespace PassPlanner.Physics.Atmosphere;

/// <summary>
/// Bending of radio waves in the lower atmosphere: Recommendation ITU-R P.834-9, section 4 (mean reference
/// atmosphere), for stations below 3 km and elevations from -1 to 10 degrees. Outside these the formulas go on as
/// follows: a higher station is taken at 3 km; below -1 degree the correction is that of -1 degree; above 10 degrees
/// it falls from its value there with the cotangent of the elevation, as through a flat atmosphere (common practice),
/// and is 0 at the zenith.
/// </summary>
public static class ItuRP834
{
    private const double LowestDeg = -1;
    private const double HighestDeg = 10;
    private const double HighestStationKm = 3;

    /// <summary>Elevation at which a wave from a geometric elevation arrives, degrees.</summary>
    /// <param name="elevationDeg">Geometric (free-space) elevation, degrees, -90 to 90.</param>
    /// <param name="stationHeightM">Height of the station above sea level, m.</param>
    public static double ApparentElevationDeg(double elevationDeg, double stationHeightM)
    {
        double heightKm = Math.Clamp(stationHeightM / 1000, 0, HighestStationKm);
        return elevationDeg + Spread(elevationDeg, t => FromFreeSpaceDeg(t, heightKm));
    }

    /// <summary>Geometric elevation of what arrives at an apparent elevation, degrees.</summary>
    /// <param name="apparentElevationDeg">Apparent elevation, degrees, -90 to 90.</param>
    /// <param name="stationHeightM">Height of the station above sea level, m.</param>
    public static double GeometricElevationDeg(double apparentElevationDeg, double stationHeightM)
    {
        double heightKm = Math.Clamp(stationHeightM / 1000, 0, HighestStationKm);
        return apparentElevationDeg - Spread(apparentElevationDeg, t => FromApparentDeg(t, heightKm));
    }

    /// <summary>Section 4.2, from the free-space elevation.</summary>
    private static double FromFreeSpaceDeg(double t, double h) => 1 / (
        1.728 + (0.5411 * t) + (0.03723 * t * t)
        + (h * (0.1815 + (0.06272 * t) + (0.01380 * t * t)))
        + (h * h * (0.01727 + (0.008288 * t))));

    /// <summary>Section 4.1, from the apparent elevation.</summary>
    private static double FromApparentDeg(double t, double h) => 1 / (
        1.314 + (0.6437 * t) + (0.02869 * t * t)
        + (h * (0.2305 + (0.09428 * t) + (0.01096 * t * t)))
        + (0.008583 * h * h));

    private static double Spread(double elevationDeg, Func<double, double> correctionDeg) =>
        elevationDeg <= HighestDeg
            ? correctionDeg(Math.Max(elevationDeg, LowestDeg))
            : correctionDeg(HighestDeg) * Cotangent(elevationDeg) / Cotangent(HighestDeg);

    private static double Cotangent(double angleDeg) => 1 / Math.Tan(double.DegreesToRadians(angleDeg));
}
