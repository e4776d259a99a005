namespace PassPlanner.Physics.Orbits;

/// <summary>
/// How far a spacecraft strays along its track from an ageing element set: one standard deviation is a + b d + c d^2
/// km after d days. The coefficients are fits to published comparisons of public element sets with operators' orbits
/// and GPS fixes (Kahr et al., Journal of Spacecraft and Rockets 50(2), 2013; Riesing, SSC15-VIII-5; Jankovic,
/// arXiv:2605.19850); those of the two lowest and the eccentric class are guides from memory.
/// </summary>
public static class ElementSetAge
{
    /// <summary>Along-track error at which a result is marked as resting on an old element set, km: 1.3 s of time in low orbit.</summary>
    public const double MarkedErrorKm = 10;

    private const double EarthRadiusKm = 6378.135;
    private const double GravityKm3PerS2 = 398600.8;
    private const double LongestLimitDays = 14;

    /// <summary>The class of an element set's orbit.</summary>
    public static OrbitClass ClassOf(ElementSet elements)
    {
        double meanMotionRadPerS = elements.MeanMotionRevPerDay * 2 * Math.PI / 86400;
        double heightKm = Math.Cbrt(GravityKm3PerS2 / (meanMotionRadPerS * meanMotionRadPerS)) - EarthRadiusKm;
        double periodMin = 1440 / elements.MeanMotionRevPerDay;
        return elements.Eccentricity >= 0.1 ? OrbitClass.Eccentric
            : Math.Abs(periodMin - 1436) < 200 ? OrbitClass.Geosynchronous
            : heightKm switch
            {
                < 450 => OrbitClass.LowBelow450Km,
                < 600 => OrbitClass.Low450To600Km,
                < 800 => OrbitClass.Low600To800Km,
                < 2000 => OrbitClass.LowAbove800Km,
                _ => OrbitClass.Medium,
            };
    }

    /// <summary>Standard deviation along the track, km.</summary>
    /// <param name="orbit">Class of the orbit.</param>
    /// <param name="ageDays">Age, days, at least 0.</param>
    public static double AlongTrackSigmaKm(OrbitClass orbit, double ageDays)
    {
        (double a, double b, double c) = Coefficients(orbit);
        return a + (b * ageDays) + (c * ageDays * ageDays);
    }

    /// <summary>
    /// Age past which a result is marked, hours: where the standard deviation reaches <see cref="MarkedErrorKm"/>, and at
    /// most 14 days. For medium, geosynchronous and eccentric orbits, whose error is large from the start and small
    /// against the range, it is 7 days.
    /// </summary>
    public static double LimitHours(ElementSet elements)
    {
        OrbitClass orbit = ClassOf(elements);
        if (orbit is OrbitClass.Medium or OrbitClass.Geosynchronous or OrbitClass.Eccentric)
        {
            return 7 * 24;
        }

        (double a, double b, double c) = Coefficients(orbit);
        double days = (Math.Sqrt((b * b) + (4 * c * (MarkedErrorKm - a))) - b) / (2 * c);
        return 24 * Math.Min(days, LongestLimitDays);
    }

    private static (double A, double B, double C) Coefficients(OrbitClass orbit) => orbit switch
    {
        OrbitClass.LowBelow450Km => (1, 0.7, 1),
        OrbitClass.Low450To600Km => (0.9, 0.6, 0.25),
        OrbitClass.Low600To800Km => (0.6, 0.2, 0.07),
        OrbitClass.LowAbove800Km => (0.35, 0, 0.005),
        OrbitClass.Medium => (2.2, 0, 0),
        OrbitClass.Geosynchronous => (7, 5, 0.35),
        _ => (5, 1, 0),
    };
}
