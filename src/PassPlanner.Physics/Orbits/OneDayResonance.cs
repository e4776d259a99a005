namespace PassPlanner.Physics.Orbits;

/// <summary>Resonance of orbits of about a day.</summary>
internal sealed class OneDayResonance : Resonance
{
    private const double Q22 = 1.7891679e-6;
    private const double Q31 = 2.1460748e-6;
    private const double Q33 = 2.2123015e-7;
    private const double Phase22Rad = 2.8843198;
    private const double Phase31Rad = 0.13130908;
    private const double Phase33Rad = 0.37448087;

    private readonly double delta1;
    private readonly double delta2;
    private readonly double delta3;

    /// <summary>Works out the coefficients at the epoch.</summary>
    public OneDayResonance(
        GravityModel gravity, double siderealTimeRad, in MeanElements epoch, in SecularRates rates, double lunisolarPerigeeRate)
        : base(epoch.MotionRadPerMin, siderealTimeRad)
    {
        (double sinI, double cosI) = Math.SinCos(epoch.InclinationRad);
        double ee = epoch.Eccentricity * epoch.Eccentricity;
        double g200 = 1 + (ee * (-2.5 + (0.8125 * ee)));
        double g310 = 1 + (2 * ee);
        double g300 = 1 + (ee * (-6 + (6.60937 * ee)));
        double f220 = 0.75 * (1 + cosI) * (1 + cosI);
        double f311 = (0.9375 * sinI * sinI * (1 + (3 * cosI))) - (0.75 * (1 + cosI));
        double f330 = 1.875 * (1 + cosI) * (1 + cosI) * (1 + cosI);
        double inverseAxis = Math.Pow(epoch.MotionRadPerMin / gravity.Ke, 2.0 / 3);
        double common = 3 * epoch.MotionRadPerMin * epoch.MotionRadPerMin * inverseAxis * inverseAxis;
        delta1 = common * f311 * g310 * Q31 * inverseAxis;
        delta2 = 2 * common * f220 * g200 * Q22;
        delta3 = 3 * common * f330 * g300 * Q33 * inverseAxis;
        LongitudeAtEpochRad = (epoch.AnomalyRad + epoch.NodeRad + epoch.PerigeeRad - siderealTimeRad) % (2 * Math.PI);
        LongitudeRateRadPerMin = rates.AnomalyRadPerMin + rates.PerigeeRadPerMin + rates.NodeRadPerMin + lunisolarPerigeeRate
            - EarthRateRadPerMin - epoch.MotionRadPerMin;
    }

    /// <inheritdoc/>
    protected override (double MotionRate, double MotionRateByLongitude) Derivatives(double longitudeRad, double minutes)
    {
        (double sin1, double cos1) = Math.SinCos(longitudeRad - Phase31Rad);
        (double sin2, double cos2) = Math.SinCos(2 * (longitudeRad - Phase22Rad));
        (double sin3, double cos3) = Math.SinCos(3 * (longitudeRad - Phase33Rad));
        return ((delta1 * sin1) + (delta2 * sin2) + (delta3 * sin3), (delta1 * cos1) + (2 * delta2 * cos2) + (3 * delta3 * cos3));
    }

    /// <inheritdoc/>
    protected override double AnomalyRad(double longitudeRad, double siderealTimeRad, in MeanElements elements) =>
        longitudeRad - elements.NodeRad - elements.PerigeeRad + siderealTimeRad;
}
