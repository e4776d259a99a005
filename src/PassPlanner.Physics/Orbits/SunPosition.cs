using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// The Sun by the low-precision formulas of the Astronomical Almanac (section C, "Low-precision formulas for the
/// Sun's coordinates"; stated error 0.01 degrees from 1950 to 2050, aberration in). Its mean equinox of date stands
/// for the equinox of TEME, and its time for terrestrial time: both cost less than 0.005 degrees.
/// </summary>
public static class SunPosition
{
    /// <summary>Astronomical unit, km, exact. IAU 2012 resolution B2.</summary>
    public const double AstronomicalUnitKm = 149597870.7;

    private const double RadPerDeg = Math.PI / 180.0;

    /// <summary>Geocentric position of the Sun, km, in the TEME frame.</summary>
    /// <param name="instant">Instant, UTC.</param>
    public static Vector3D TemeKm(UtcInstant instant)
    {
        JulianDateUt1 date = instant.ToUt1(0.0);
        double days = date.Day - 2451545.0 + date.FractionOfDay;
        double meanLongitudeDeg = 280.460 + (0.9856474 * days);
        double meanAnomaly = (357.528 + (0.9856003 * days)) * RadPerDeg;
        double longitude = (meanLongitudeDeg + (1.915 * Math.Sin(meanAnomaly)) + (0.020 * Math.Sin(2.0 * meanAnomaly))) * RadPerDeg;
        double obliquity = (23.439 - (0.0000004 * days)) * RadPerDeg;
        double distanceKm = AstronomicalUnitKm
            * (1.00014 - (0.01671 * Math.Cos(meanAnomaly)) - (0.00014 * Math.Cos(2.0 * meanAnomaly)));
        (double sinLongitude, double cosLongitude) = Math.SinCos(longitude);
        (double sinObliquity, double cosObliquity) = Math.SinCos(obliquity);
        return new Vector3D(cosLongitude, cosObliquity * sinLongitude, sinObliquity * sinLongitude) * distanceKm;
    }

    /// <summary>Geocentric position of the Sun, km, in Earth-fixed axes.</summary>
    /// <param name="instant">Instant, UTC.</param>
    /// <param name="ut1MinusUtcS">UT1-UTC, s; 0 when no table is loaded.</param>
    public static Vector3D EcefKm(UtcInstant instant, double ut1MinusUtcS)
        => EarthRotation.ToEcef(TemeKm(instant), instant.ToUt1(ut1MinusUtcS));

    /// <summary>Where a station sees the Sun's centre: azimuth and elevation, degrees, with parallax, without refraction.</summary>
    /// <param name="station">The station.</param>
    /// <param name="instant">Instant, UTC.</param>
    /// <param name="ut1MinusUtcS">UT1-UTC, s; 0 when no table is loaded.</param>
    public static (double AzimuthDeg, double ElevationDeg) Look(TopocentricFrame station, UtcInstant instant, double ut1MinusUtcS)
    {
        ArgumentNullException.ThrowIfNull(station);
        return station.Direction(EcefKm(instant, ut1MinusUtcS) - station.PositionKm);
    }
}
