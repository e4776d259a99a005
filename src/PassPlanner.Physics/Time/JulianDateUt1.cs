namespace PassPlanner.Physics.Time;

/// <summary>
/// A Julian date on the UT1 scale in two parts, so that a day number near 2.46 million does not cost the
/// microseconds of the fraction (as the two-part dates of the IAU SOFA convention).
/// </summary>
/// <param name="Day">Whole part, ending in .5 (midnight).</param>
/// <param name="FractionOfDay">Fraction of the day.</param>
public readonly record struct JulianDateUt1(double Day, double FractionOfDay);
