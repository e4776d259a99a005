using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// How far along its track an object may have gone from an ageing element set, and the age past which to warn.
/// The model is 1 sigma along track = a + b d + c d^2, km, d in days since epoch: fits to published comparisons of
/// public element sets with operators' orbits (low orbits by height: Kahr et al., JSR 50(2), 2013; Riesing,
/// SSC15-VIII-5, 2015; other rows to comparisons of public sets with precise orbits). The row below 450 km is the one for small spacecraft under
/// an active Sun; large ones age several times slower. The figures are typical, within a factor of two or so; a
/// storm or a manoeuvre breaks them.
/// </summary>
public static class ElementSetAge
{
    /// <summary>
    /// Along-track error that makes a set stale in low, medium and eccentric orbits, km: about a degree on the sky at
    /// 600 km, 1.3 s of a low orbit.
    /// </summary>
    public const double StaleSigmaKm = 10.0;

    /// <summary>The same in geosynchronous orbit, km: 0.1 degree on the sky.</summary>
    public const double StaleGeosynchronousSigmaKm = 60.0;

    /// <summary>No set is fresh for longer, h: the comparisons reach over one week, and this is twice that.</summary>
    public const double LongestLimitHours = 14.0 * 24.0;

    /// <summary>The class of an element set, by eccentricity, revolutions a day and mean height.</summary>
    /// <param name="elements">The set.</param>
    public static OrbitAgeingClass ClassOf(ElementSet elements)
    {
        ArgumentNullException.ThrowIfNull(elements);
        if (elements.Eccentricity >= 0.1)
        {
            return OrbitAgeingClass.Eccentric;
        }

        if (elements.MeanMotionRevPerDay is >= 0.95 and <= 1.05)
        {
            return OrbitAgeingClass.Geosynchronous;
        }

        GravityModel gravity = GravityModel.Wgs72;
        double meanMotionRadPerS = elements.MeanMotionRevPerDay * 2.0 * Math.PI / 86400.0;
        double meanHeightKm = Math.Cbrt(gravity.MuKm3PerS2 / (meanMotionRadPerS * meanMotionRadPerS)) - gravity.EarthRadiusKm;
        return meanHeightKm switch
        {
            < 450.0 => OrbitAgeingClass.Below450Km,
            < 600.0 => OrbitAgeingClass.From450To600Km,
            < 800.0 => OrbitAgeingClass.From600To800Km,
            < 3000.0 => OrbitAgeingClass.Above800Km,
            _ => OrbitAgeingClass.Medium,
        };
    }

    /// <summary>One standard deviation of the along-track error, km.</summary>
    /// <param name="ageingClass">Class of the orbit.</param>
    /// <param name="days">Days from the epoch, to either side; the fits hold to 7.</param>
    public static double AlongTrackSigmaKm(OrbitAgeingClass ageingClass, double days)
    {
        (double a, double b, double c) = Coefficients(ageingClass);
        double d = Math.Abs(days);
        return a + (b * d) + (c * d * d);
    }

    /// <summary>The age past which a set is stale, h: when the along-track error reaches its threshold, at most 336 h.</summary>
    /// <param name="ageingClass">Class of the orbit.</param>
    public static double LimitHours(OrbitAgeingClass ageingClass)
    {
        double threshold = ageingClass == OrbitAgeingClass.Geosynchronous ? StaleGeosynchronousSigmaKm : StaleSigmaKm;
        (double a, double b, double c) = Coefficients(ageingClass);
        double rest = threshold - a;

        // The positive root of c d^2 + b d = rest, in the form that stays exact as c or b goes to zero.
        double slope = b + Math.Sqrt((b * b) + (4.0 * c * rest));
        return slope > 0.0 ? Math.Min(LongestLimitHours, 24.0 * 2.0 * rest / slope) : LongestLimitHours;
    }

    /// <summary>The age past which a set is stale, h, by the class of its orbit.</summary>
    /// <param name="elements">The set.</param>
    public static double LimitHours(ElementSet elements) => LimitHours(ClassOf(elements));

    /// <summary>Standard deviation of the time of every event of a pass, s: the along-track error over the mean orbital speed.</summary>
    /// <param name="elements">Element set.</param>
    /// <param name="ageDays">Age, days; of any sign.</param>
    public static double TimingSigmaS(ElementSet elements, double ageDays)
    {
        double motionRadPerS = elements.MeanMotionRevPerDay * 2.0 * Math.PI / 86400.0;
        double speedKmPerS = Math.Cbrt(GravityModel.Wgs72.MuKm3PerS2 * motionRadPerS);
        return AlongTrackSigmaKm(ClassOf(elements), Math.Abs(ageDays)) / speedKmPerS;
    }

    /// <summary>Age of a set at an instant, h; negative before its epoch.</summary>
    /// <param name="elements">The set.</param>
    /// <param name="instant">Instant, UTC.</param>
    public static double AgeHours(ElementSet elements, UtcInstant instant)
    {
        ArgumentNullException.ThrowIfNull(elements);
        return instant.SecondsSince(elements.EpochUtc) / 3600.0;
    }

    private static (double AKm, double BKmPerDay, double CKmPerDay2) Coefficients(OrbitAgeingClass ageingClass) => ageingClass switch
    {
        OrbitAgeingClass.Below450Km => (2.0, 11.0, 4.0),
        OrbitAgeingClass.From450To600Km => (0.9, 0.6, 0.25),
        OrbitAgeingClass.From600To800Km => (0.6, 0.2, 0.07),
        OrbitAgeingClass.Above800Km => (0.35, 0.0, 0.005),
        OrbitAgeingClass.Medium => (2.2, 0.0, 0.0),
        OrbitAgeingClass.Geosynchronous => (7.0, 5.0, 0.35),
        OrbitAgeingClass.Eccentric => (5.0, 1.0, 0.0),
        _ => throw new ArgumentOutOfRangeException(nameof(ageingClass), ageingClass, "ageingClass must be one of the listed classes."),
    };
}
