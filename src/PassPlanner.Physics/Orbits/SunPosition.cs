using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Apparent position of the Sun by the low-precision formula of the Astronomical Almanac (page C5): mean longitude and
/// anomaly and two terms of the equation of the centre; 0.01 degrees between 1950 and 2050.
/// </summary>
public static class SunPosition
{
    private const double AstronomicalUnitKm = 149597870.7;

    /// <summary>Position of the Sun's centre, km, in true-equator axes with the mean equinox (as near to TEME as the formula is good).</summary>
    /// <param name="utc">Instant; the difference of UTC from terrestrial time, about a minute, moves the Sun by 0.0008 degrees.</param>
    public static Vector3D TemeKm(UtcInstant utc)
    {
        JulianDateUt1 date = utc.ToUt1(0);
        double n = date.Day - 2451545.0 + date.FractionOfDay;
        double meanLongitudeDeg = 280.460 + (0.9856474 * n);
        double anomalyRad = double.DegreesToRadians(357.528 + (0.9856003 * n));
        double longitudeRad = double.DegreesToRadians(
            meanLongitudeDeg + (1.915 * Math.Sin(anomalyRad)) + (0.020 * Math.Sin(2 * anomalyRad)));
        double obliquityRad = double.DegreesToRadians(23.439 - (0.0000004 * n));
        double distanceKm = AstronomicalUnitKm * (1.00014 - (0.01671 * Math.Cos(anomalyRad)) - (0.00014 * Math.Cos(2 * anomalyRad)));
        (double sinLongitude, double cosLongitude) = Math.SinCos(longitudeRad);
        return new Vector3D(
            distanceKm * cosLongitude,
            distanceKm * Math.Cos(obliquityRad) * sinLongitude,
            distanceKm * Math.Sin(obliquityRad) * sinLongitude);
    }

    /// <summary>Where a station sees the Sun's centre, parallax included, without refraction.</summary>
    /// <param name="station">Axes of the station.</param>
    /// <param name="utc">Instant.</param>
    /// <param name="ut1MinusUtcS">UT1-UTC, s.</param>
    public static (double AzimuthDeg, double ElevationDeg) Look(TopocentricFrame station, UtcInstant utc, double ut1MinusUtcS) =>
        station.Direction(EarthRotation.ToEcef(TemeKm(utc), utc.ToUt1(ut1MinusUtcS)) - station.PositionKm);
}
