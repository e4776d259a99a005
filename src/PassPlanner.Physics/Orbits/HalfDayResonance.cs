namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Resonance of eccentric orbits of about half a day: ten terms, whose functions of the eccentricity are fits in
/// several ranges (section 6 of Spacetrack Report #3).
/// </summary>
internal sealed class HalfDayResonance : Resonance
{
    private const double Root22 = 1.7891679e-6;
    private const double Root32 = 3.7393792e-7;
    private const double Root44 = 7.3636953e-9;
    private const double Root52 = 1.1428639e-7;
    private const double Root54 = 2.1765803e-9;
    private const double G22Rad = 5.7686396;
    private const double G32Rad = 0.95240898;
    private const double G44Rad = 1.8014998;
    private const double G52Rad = 1.0508330;
    private const double G54Rad = 4.4108898;

    private readonly double perigeeAtEpochRad;
    private readonly double perigeeRateRadPerMin;
    private readonly double d2201;
    private readonly double d2211;
    private readonly double d3210;
    private readonly double d3222;
    private readonly double d4410;
    private readonly double d4422;
    private readonly double d5220;
    private readonly double d5232;
    private readonly double d5421;
    private readonly double d5433;

    /// <summary>Works out the coefficients at the epoch.</summary>
    public HalfDayResonance(GravityModel gravity, double siderealTimeRad, in MeanElements epoch, in SecularRates rates)
        : base(epoch.MotionRadPerMin, siderealTimeRad)
    {
        (perigeeAtEpochRad, perigeeRateRadPerMin) = (epoch.PerigeeRad, rates.PerigeeRadPerMin);
        (double sinI, double cosI) = Math.SinCos(epoch.InclinationRad);
        double cosSquared = cosI * cosI;
        double sinSquared = sinI * sinI;
        double f220 = 0.75 * (1 + (2 * cosI) + cosSquared);
        double f221 = 1.5 * sinSquared;
        double f321 = 1.875 * sinI * (1 - (2 * cosI) - (3 * cosSquared));
        double f322 = -1.875 * sinI * (1 + (2 * cosI) - (3 * cosSquared));
        double f441 = 35 * sinSquared * f220;
        double f442 = 39.3750 * sinSquared * sinSquared;
        double f522 = 9.84375 * sinI * ((sinSquared * (1 - (2 * cosI) - (5 * cosSquared))) + (0.33333333 * (-2 + (4 * cosI) + (6 * cosSquared))));
        double f523 = sinI * ((4.92187512 * sinSquared * (-2 - (4 * cosI) + (10 * cosSquared))) + (6.56250012 * (1 + (2 * cosI) - (3 * cosSquared))));
        double f542 = 29.53125 * sinI * (2 - (8 * cosI) + (cosSquared * (-12 + (8 * cosI) + (10 * cosSquared))));
        double f543 = 29.53125 * sinI * (-2 - (8 * cosI) + (cosSquared * (12 + (8 * cosI) - (10 * cosSquared))));

        var g = new EccentricityFunctions(epoch.Eccentricity);
        double inverseAxis = Math.Pow(epoch.MotionRadPerMin / gravity.Ke, 2.0 / 3);
        double scale = 3 * epoch.MotionRadPerMin * epoch.MotionRadPerMin * inverseAxis * inverseAxis;
        d2201 = scale * Root22 * f220 * g.G201;
        d2211 = scale * Root22 * f221 * g.G211;
        scale *= inverseAxis;
        d3210 = scale * Root32 * f321 * g.G310;
        d3222 = scale * Root32 * f322 * g.G322;
        scale *= inverseAxis;
        d4410 = 2 * scale * Root44 * f441 * g.G410;
        d4422 = 2 * scale * Root44 * f442 * g.G422;
        scale *= inverseAxis;
        d5220 = scale * Root52 * f522 * g.G520;
        d5232 = scale * Root52 * f523 * g.G532;
        d5421 = 2 * scale * Root54 * f542 * g.G521;
        d5433 = 2 * scale * Root54 * f543 * g.G533;
        LongitudeAtEpochRad = (epoch.AnomalyRad + (2 * epoch.NodeRad) - (2 * siderealTimeRad)) % (2 * Math.PI);
        LongitudeRateRadPerMin = rates.AnomalyRadPerMin + (2 * (rates.NodeRadPerMin - EarthRateRadPerMin)) - epoch.MotionRadPerMin;
    }

    /// <inheritdoc/>
    protected override (double MotionRate, double MotionRateByLongitude) Derivatives(double longitudeRad, double minutes)
    {
        double perigee = perigeeAtEpochRad + (perigeeRateRadPerMin * minutes);
        double twice = 2 * longitudeRad;
        (double Sin, double Cos) a = Math.SinCos((2 * perigee) + longitudeRad - G22Rad);
        (double Sin, double Cos) b = Math.SinCos(longitudeRad - G22Rad);
        (double Sin, double Cos) c = Math.SinCos(perigee + longitudeRad - G32Rad);
        (double Sin, double Cos) d = Math.SinCos(-perigee + longitudeRad - G32Rad);
        (double Sin, double Cos) e = Math.SinCos((2 * perigee) + twice - G44Rad);
        (double Sin, double Cos) f = Math.SinCos(twice - G44Rad);
        (double Sin, double Cos) g = Math.SinCos(perigee + longitudeRad - G52Rad);
        (double Sin, double Cos) h = Math.SinCos(-perigee + longitudeRad - G52Rad);
        (double Sin, double Cos) i = Math.SinCos(perigee + twice - G54Rad);
        (double Sin, double Cos) j = Math.SinCos(-perigee + twice - G54Rad);
        double rate = (d2201 * a.Sin) + (d2211 * b.Sin) + (d3210 * c.Sin) + (d3222 * d.Sin) + (d4410 * e.Sin)
            + (d4422 * f.Sin) + (d5220 * g.Sin) + (d5232 * h.Sin) + (d5421 * i.Sin) + (d5433 * j.Sin);
        double byLongitude = (d2201 * a.Cos) + (d2211 * b.Cos) + (d3210 * c.Cos) + (d3222 * d.Cos) + (d5220 * g.Cos) + (d5232 * h.Cos)
            + (2 * ((d4410 * e.Cos) + (d4422 * f.Cos) + (d5421 * i.Cos) + (d5433 * j.Cos)));
        return (rate, byLongitude);
    }

    /// <inheritdoc/>
    protected override double AnomalyRad(double longitudeRad, double siderealTimeRad, in MeanElements elements) =>
        longitudeRad - (2 * elements.NodeRad) + (2 * siderealTimeRad);

    /// <summary>Functions of the eccentricity, cubic fits by range.</summary>
    private readonly struct EccentricityFunctions
    {
        public EccentricityFunctions(double e)
        {
            double Cubic(double a, double b, double c, double d) => a + (e * (b + (e * (c + (e * d)))));
            G201 = -0.306 - ((e - 0.64) * 0.440);
            bool low = e <= 0.65;
            G211 = low ? Cubic(3.616, -13.2470, 16.2900, 0) : Cubic(-72.099, 331.819, -508.738, 266.724);
            G310 = low ? Cubic(-19.302, 117.3900, -228.4190, 156.5910) : Cubic(-346.844, 1582.851, -2415.925, 1246.113);
            G322 = low ? Cubic(-18.9068, 109.7927, -214.6334, 146.5816) : Cubic(-342.585, 1554.908, -2366.899, 1215.972);
            G410 = low ? Cubic(-41.122, 242.6940, -471.0940, 313.9530) : Cubic(-1052.797, 4758.686, -7193.992, 3651.957);
            G422 = low ? Cubic(-146.407, 841.8800, -1629.014, 1083.4350) : Cubic(-3581.690, 16178.110, -24462.770, 12422.520);
            G520 = low ? Cubic(-532.114, 3017.977, -5740.032, 3708.2760)
                : e > 0.715 ? Cubic(-5149.66, 29936.92, -54087.36, 31324.56)
                : Cubic(1464.74, -4664.75, 3763.64, 0);
            bool middle = e < 0.7;
            G533 = middle ? Cubic(-919.22770, 4988.6100, -9064.7700, 5542.21) : Cubic(-37995.780, 161616.52, -229838.20, 109377.94);
            G521 = middle ? Cubic(-822.71072, 4568.6173, -8491.4146, 5337.524) : Cubic(-51752.104, 218913.95, -309468.16, 146349.42);
            G532 = middle ? Cubic(-853.66600, 4690.2500, -8624.7700, 5341.4) : Cubic(-40023.880, 170470.89, -242699.48, 115605.82);
        }

        public double G201 { get; }

        public double G211 { get; }

        public double G310 { get; }

        public double G322 { get; }

        public double G410 { get; }

        public double G422 { get; }

        public double G520 { get; }

        public double G533 { get; }

        public double G521 { get; }

        public double G532 { get; }
    }
}
