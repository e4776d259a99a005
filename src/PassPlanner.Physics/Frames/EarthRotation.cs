using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Frames;

/// <summary>
/// The turn between the true-equator, mean-equinox frame of SGP4 and Earth-fixed axes: Greenwich mean sidereal
/// time of 1982 as a function of UT1 alone (AIAA 2006-6753, appendix C). Polar motion is left out: at most
/// 15 m on the ground.
/// </summary>
public static class EarthRotation
{
    /// <summary>Rate of mean sidereal time, rad/s of UT1: the linear term of the 1982 expression.</summary>
    public const double RateRadPerS = 2.0 * Math.PI / 86400.0 * (1.0 + (8640184.812866 / (36525.0 * 86400.0)));

    /// <summary>Greenwich mean sidereal time, IAU 1982 (Aoki et al., A&amp;A 105, 359, 1982, equation 14).</summary>
    /// <param name="ut1">Instant on the UT1 scale; the day part must end in .5.</param>
    /// <returns>Angle, rad, 0 to below 2 pi.</returns>
    public static double Gmst82Rad(JulianDateUt1 ut1)
    {
        double centuries = (ut1.Day - 2451545.0 + ut1.FractionOfDay) / 36525.0;
        double seconds = 24110.54841
            + (centuries * (8640184.812866 + (centuries * (0.093104 - (centuries * 6.2e-6)))))
            + (86400.0 * ut1.FractionOfDay);
        double turns = seconds / 86400.0;
        return (turns - Math.Floor(turns)) * (2.0 * Math.PI);
    }

    /// <summary>Turns a TEME state into Earth-fixed axes, with the velocity relative to the rotating Earth.</summary>
    /// <param name="state">Position, km, and velocity, km/s, TEME.</param>
    /// <param name="ut1">Instant of the state on the UT1 scale.</param>
    public static EcefState ToEcef(in TemeState state, JulianDateUt1 ut1)
    {
        (double sin, double cos) = Math.SinCos(Gmst82Rad(ut1));
        Vector3D position = TurnForward(state.PositionKm, sin, cos);
        Vector3D velocity = TurnForward(state.VelocityKmPerS, sin, cos);
        return new EcefState(
            position,
            new Vector3D(velocity.X + (RateRadPerS * position.Y), velocity.Y - (RateRadPerS * position.X), velocity.Z));
    }

    /// <summary>Turns a TEME vector (a direction, or a position) into Earth-fixed axes.</summary>
    /// <param name="vector">Vector, TEME.</param>
    /// <param name="ut1">Instant on the UT1 scale.</param>
    public static Vector3D ToEcef(in Vector3D vector, JulianDateUt1 ut1)
    {
        (double sin, double cos) = Math.SinCos(Gmst82Rad(ut1));
        return TurnForward(vector, sin, cos);
    }

    /// <summary>Turns an Earth-fixed state into TEME, with the inertial velocity.</summary>
    /// <param name="state">Position, km, and velocity relative to the rotating Earth, km/s.</param>
    /// <param name="ut1">Instant of the state on the UT1 scale.</param>
    public static TemeState ToTeme(in EcefState state, JulianDateUt1 ut1)
    {
        (double sin, double cos) = Math.SinCos(Gmst82Rad(ut1));
        Vector3D position = state.PositionKm;
        Vector3D velocity = state.VelocityKmPerS;
        var inertial = new Vector3D(
            velocity.X - (RateRadPerS * position.Y), velocity.Y + (RateRadPerS * position.X), velocity.Z);
        return new TemeState(TurnForward(position, -sin, cos), TurnForward(inertial, -sin, cos));
    }

    /// <summary>Turns an Earth-fixed vector (a direction, or a position) into TEME.</summary>
    /// <param name="vector">Vector, Earth-fixed.</param>
    /// <param name="ut1">Instant on the UT1 scale.</param>
    public static Vector3D ToTeme(in Vector3D vector, JulianDateUt1 ut1)
    {
        (double sin, double cos) = Math.SinCos(Gmst82Rad(ut1));
        return TurnForward(vector, -sin, cos);
    }

    private static Vector3D TurnForward(in Vector3D v, double sin, double cos)
        => new((cos * v.X) + (sin * v.Y), (cos * v.Y) - (sin * v.X), v.Z);
}
