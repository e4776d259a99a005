using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Frames;

/// <summary>
/// From the frame of SGP4 to the Earth's and back: a turn by the Greenwich mean sidereal time of 1982 about the pole
/// (AIAA 2006-6753, appendix C). Polar motion is left out: it moves a place by less than 10 m.
/// </summary>
public static class EarthRotation
{
    private const double SecondsPerDay = 86400;
    private const double J2000Day = 2451545.0;
    private const double DaysPerCentury = 36525;

    /// <summary>Greenwich mean sidereal time, rad, 0 to below 2 pi (Aoki et al. 1982; IAU 1982).</summary>
    public static double Gmst82Rad(JulianDateUt1 ut1)
    {
        double daysSinceJ2000 = ut1.Day - J2000Day + ut1.FractionOfDay;
        double t = daysSinceJ2000 / DaysPerCentury;

        // At 0h UT1, and the day's own turn apart, so that the fraction keeps its digits.
        double polynomialS = 24110.54841 + (t * (8640184.812866 + (t * (0.093104 - (t * 6.2e-6)))));
        double turns = (polynomialS / SecondsPerDay) + ut1.FractionOfDay + (ut1.Day - Math.Floor(ut1.Day)) - 0.5;
        return 2 * Math.PI * (turns - Math.Floor(turns));
    }

    /// <summary>Rate of that angle, rad/s, its derivative.</summary>
    public static double RateRadPerS(JulianDateUt1 ut1)
    {
        double t = (ut1.Day - J2000Day + ut1.FractionOfDay) / DaysPerCentury;
        double polynomialRate = (8640184.812866 + (t * ((2 * 0.093104) - (3 * 6.2e-6 * t)))) / (DaysPerCentury * SecondsPerDay);
        return 2 * Math.PI * (1 + polynomialRate) / SecondsPerDay;
    }

    /// <summary>A TEME state in Earth-fixed axes; the velocity becomes that relative to the turning Earth.</summary>
    public static EcefState ToEcef(in TemeState teme, JulianDateUt1 ut1)
    {
        (double sine, double cosine) = Math.SinCos(Gmst82Rad(ut1));
        double rate = RateRadPerS(ut1);
        Vector3D position = TurnToEcef(teme.PositionKm, sine, cosine);
        Vector3D velocity = TurnToEcef(teme.VelocityKmPerS, sine, cosine);
        return new EcefState(position, new Vector3D(velocity.X + (rate * position.Y), velocity.Y - (rate * position.X), velocity.Z));
    }

    /// <summary>A TEME direction or position in Earth-fixed axes.</summary>
    public static Vector3D ToEcef(in Vector3D teme, JulianDateUt1 ut1)
    {
        (double sine, double cosine) = Math.SinCos(Gmst82Rad(ut1));
        return TurnToEcef(teme, sine, cosine);
    }

    /// <summary>An Earth-fixed direction or position in TEME axes.</summary>
    public static Vector3D ToTeme(in Vector3D ecef, JulianDateUt1 ut1)
    {
        (double sine, double cosine) = Math.SinCos(Gmst82Rad(ut1));
        return new Vector3D((cosine * ecef.X) - (sine * ecef.Y), (sine * ecef.X) + (cosine * ecef.Y), ecef.Z);
    }

    private static Vector3D TurnToEcef(in Vector3D teme, double sine, double cosine) =>
        new((cosine * teme.X) + (sine * teme.Y), (cosine * teme.Y) - (sine * teme.X), teme.Z);
}
