namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Resonance of one-day and half-day orbits with the Earth's tesseral harmonics, integrated in steps of 720 min
/// (Hujsak 1979; the routines DSINIT and DSPACE of AIAA 2006-6753). Angles in rad, time in min.
/// </summary>
internal sealed class Sgp4Resonance
{
    private const double StepMin = 720.0;

    // Products of the harmonics' amplitudes (q, root) and their phases (fasx, g).
    private const double Q22 = 1.7891679e-6, Q31 = 2.1460748e-6, Q33 = 2.2123015e-7;
    private const double Root22 = 1.7891679e-6, Root32 = 3.7393792e-7, Root44 = 7.3636953e-9;
    private const double Root52 = 1.1428639e-7, Root54 = 2.1765803e-9;
    private const double Phase31 = 0.13130908, Phase22 = 2.8843198, Phase33 = 0.37448087;
    private const double G22 = 5.7686396, G32 = 0.95240898, G44 = 1.8014998, G52 = 1.0508330, G54 = 4.4108898;

    private readonly double n0;
    private readonly double omega0;
    private readonly double omegaDot0;
    private readonly double longitude0;
    private readonly double longitudeRate;

    // Amplitudes of the one-day terms.
    private readonly double del1, del2, del3;

    // Amplitudes of the half-day terms.
    private readonly double d2201, d2211, d3210, d3222, d4410, d4422, d5220, d5232, d5421, d5433;

    private Sgp4Resonance(Sgp4NearEarthConstants c, GravityModel gravity, bool isHalfDay, double theta0, double mDot, double omegaDot, double nodeDot)
    {
        IsHalfDay = isHalfDay;
        n0 = c.N0;
        omega0 = c.Omega0;
        omegaDot0 = c.OmegaDot;
        double aInverse = Math.Pow(c.N0 / gravity.RootMuPerMin, 2.0 / 3.0);
        if (isHalfDay)
        {
            longitude0 = (c.M0 + c.Node0 + c.Node0 - theta0 - theta0) % (2.0 * Math.PI);
            longitudeRate = c.MDot + mDot + (2.0 * (c.NodeDot + nodeDot - Sgp4DeepSpace.EarthRotation)) - c.N0;
            HalfDayEccentricity g = new(c.E0);
            HalfDayInclination f = new(c.SinI0, c.CosI0);
            double scale = 3.0 * c.N0 * c.N0 * aInverse * aInverse;
            d2201 = scale * Root22 * f.F220 * g.G201;
            d2211 = scale * Root22 * f.F221 * g.G211;
            scale *= aInverse;
            d3210 = scale * Root32 * f.F321 * g.G310;
            d3222 = scale * Root32 * f.F322 * g.G322;
            scale *= aInverse;
            d4410 = 2.0 * scale * Root44 * f.F441 * g.G410;
            d4422 = 2.0 * scale * Root44 * f.F442 * g.G422;
            scale *= aInverse;
            d5220 = scale * Root52 * f.F522 * g.G520;
            d5232 = scale * Root52 * f.F523 * g.G532;
            d5421 = 2.0 * scale * Root54 * f.F542 * g.G521;
            d5433 = 2.0 * scale * Root54 * f.F543 * g.G533;
        }
        else
        {
            longitude0 = (c.M0 + c.Node0 + c.Omega0 - theta0) % (2.0 * Math.PI);
            longitudeRate = c.MDot + c.OmegaDot + c.NodeDot - Sgp4DeepSpace.EarthRotation + mDot + omegaDot + nodeDot - c.N0;
            double e2 = c.E0 * c.E0;
            double g200 = 1.0 + (e2 * (-2.5 + (0.8125 * e2)));
            double g310 = 1.0 + (2.0 * e2);
            double g300 = 1.0 + (e2 * (-6.0 + (6.60937 * e2)));
            double onePlusCosI = 1.0 + c.CosI0;
            double f220 = 0.75 * onePlusCosI * onePlusCosI;
            double f311 = (0.9375 * c.SinI0 * c.SinI0 * (1.0 + (3.0 * c.CosI0))) - (0.75 * onePlusCosI);
            double f330 = 1.875 * onePlusCosI * onePlusCosI * onePlusCosI;
            double scale = 3.0 * c.N0 * c.N0 * aInverse * aInverse;
            del2 = 2.0 * scale * f220 * g200 * Q22;
            del3 = 3.0 * scale * f330 * g300 * Q33 * aInverse;
            del1 = scale * f311 * g310 * Q31 * aInverse;
        }
    }

    /// <summary>Whether the orbit makes two revolutions a day; otherwise it makes one.</summary>
    public bool IsHalfDay { get; }

    /// <summary>The resonance of an orbit, or null where it has none.</summary>
    public static Sgp4Resonance? TryCreate(
        Sgp4NearEarthConstants c, GravityModel gravity, double theta0, double mDot, double omegaDot, double nodeDot)
    {
        bool oneDay = c.N0 is < 0.0052359877 and > 0.0034906585;
        bool halfDay = c.N0 is >= 8.26e-3 and <= 9.24e-3 && c.E0 >= 0.5;
        return oneDay || halfDay ? new Sgp4Resonance(c, gravity, halfDay, theta0, mDot, omegaDot, nodeDot) : null;
    }

    /// <summary>Mean longitude, rad, and mean motion, rad/min, at a time.</summary>
    public double Integrate(double minutes, ref Sgp4Sweep sweep, out double n)
    {
        if (sweep.TimeMin == 0.0 || minutes * sweep.TimeMin <= 0.0 || Math.Abs(minutes) < Math.Abs(sweep.TimeMin))
        {
            sweep.TimeMin = 0.0;
            sweep.MeanMotionRadPerMin = n0;
            sweep.MeanLongitudeRad = longitude0;
        }

        double step = minutes > 0.0 ? StepMin : -StepMin;
        double longitudeDot, nDot, nDdot;
        while (true)
        {
            longitudeDot = sweep.MeanMotionRadPerMin + longitudeRate;
            if (IsHalfDay)
            {
                HalfDayDerivatives(sweep.TimeMin, sweep.MeanLongitudeRad, out nDot, out nDdot);
            }
            else
            {
                OneDayDerivatives(sweep.MeanLongitudeRad, out nDot, out nDdot);
            }

            nDdot *= longitudeDot;
            if (Math.Abs(minutes - sweep.TimeMin) < StepMin)
            {
                break;
            }

            sweep.MeanLongitudeRad += (longitudeDot * step) + (nDot * (StepMin * StepMin / 2.0));
            sweep.MeanMotionRadPerMin += (nDot * step) + (nDdot * (StepMin * StepMin / 2.0));
            sweep.TimeMin += step;
        }

        double rest = minutes - sweep.TimeMin;
        n = sweep.MeanMotionRadPerMin + (nDot * rest) + (nDdot * rest * rest * 0.5);
        return sweep.MeanLongitudeRad + (longitudeDot * rest) + (nDot * rest * rest * 0.5);
    }

    private void OneDayDerivatives(double longitude, out double nDot, out double nDdotPerRate)
    {
        (double sin1, double cos1) = Math.SinCos(longitude - Phase31);
        (double sin2, double cos2) = Math.SinCos(2.0 * (longitude - Phase22));
        (double sin3, double cos3) = Math.SinCos(3.0 * (longitude - Phase33));
        nDot = (del1 * sin1) + (del2 * sin2) + (del3 * sin3);
        nDdotPerRate = (del1 * cos1) + (2.0 * del2 * cos2) + (3.0 * del3 * cos3);
    }

    private void HalfDayDerivatives(double time, double longitude, out double nDot, out double nDdotPerRate)
    {
        double omega = omega0 + (omegaDot0 * time);
        double sum = 0.0, rate = 0.0;
        Add(d2201, (2.0 * omega) + longitude - G22, 1.0, ref sum, ref rate);
        Add(d2211, longitude - G22, 1.0, ref sum, ref rate);
        Add(d3210, omega + longitude - G32, 1.0, ref sum, ref rate);
        Add(d3222, -omega + longitude - G32, 1.0, ref sum, ref rate);
        Add(d4410, (2.0 * omega) + (2.0 * longitude) - G44, 2.0, ref sum, ref rate);
        Add(d4422, (2.0 * longitude) - G44, 2.0, ref sum, ref rate);
        Add(d5220, omega + longitude - G52, 1.0, ref sum, ref rate);
        Add(d5232, -omega + longitude - G52, 1.0, ref sum, ref rate);
        Add(d5421, omega + (2.0 * longitude) - G54, 2.0, ref sum, ref rate);
        Add(d5433, -omega + (2.0 * longitude) - G54, 2.0, ref sum, ref rate);
        nDot = sum;
        nDdotPerRate = rate;
    }

    private static void Add(double amplitude, double argument, double multiple, ref double sum, ref double rate)
    {
        (double sin, double cos) = Math.SinCos(argument);
        sum += amplitude * sin;
        rate += multiple * amplitude * cos;
    }

    /// <summary>The eccentricity functions G of the half-day terms: polynomial fits by range of eccentricity.</summary>
    private readonly struct HalfDayEccentricity
    {
        public readonly double G201, G211, G310, G322, G410, G422, G520, G521, G532, G533;

        public HalfDayEccentricity(double e)
        {
            G201 = -0.306 - ((e - 0.64) * 0.440);
            if (e <= 0.65)
            {
                G211 = Cubic(e, 3.616, -13.2470, 16.2900, 0.0);
                G310 = Cubic(e, -19.302, 117.3900, -228.4190, 156.5910);
                G322 = Cubic(e, -18.9068, 109.7927, -214.6334, 146.5816);
                G410 = Cubic(e, -41.122, 242.6940, -471.0940, 313.9530);
                G422 = Cubic(e, -146.407, 841.8800, -1629.014, 1083.4350);
                G520 = Cubic(e, -532.114, 3017.977, -5740.032, 3708.2760);
            }
            else
            {
                G211 = Cubic(e, -72.099, 331.819, -508.738, 266.724);
                G310 = Cubic(e, -346.844, 1582.851, -2415.925, 1246.113);
                G322 = Cubic(e, -342.585, 1554.908, -2366.899, 1215.972);
                G410 = Cubic(e, -1052.797, 4758.686, -7193.992, 3651.957);
                G422 = Cubic(e, -3581.690, 16178.110, -24462.770, 12422.520);
                G520 = e > 0.715
                    ? Cubic(e, -5149.66, 29936.92, -54087.36, 31324.56)
                    : Cubic(e, 1464.74, -4664.75, 3763.64, 0.0);
            }

            if (e < 0.7)
            {
                G533 = Cubic(e, -919.22770, 4988.6100, -9064.7700, 5542.21);
                G521 = Cubic(e, -822.71072, 4568.6173, -8491.4146, 5337.524);
                G532 = Cubic(e, -853.66600, 4690.2500, -8624.7700, 5341.4);
            }
            else
            {
                G533 = Cubic(e, -37995.780, 161616.52, -229838.20, 109377.94);
                G521 = Cubic(e, -51752.104, 218913.95, -309468.16, 146349.42);
                G532 = Cubic(e, -40023.880, 170470.89, -242699.48, 115605.82);
            }
        }

        private static double Cubic(double e, double c0, double c1, double c2, double c3)
            => c0 + (c1 * e) + (c2 * e * e) + (c3 * e * e * e);
    }

    /// <summary>The inclination functions F of the half-day terms.</summary>
    private readonly struct HalfDayInclination
    {
        public readonly double F220, F221, F321, F322, F441, F442, F522, F523, F542, F543;

        public HalfDayInclination(double sinI, double cosI)
        {
            double sin2 = sinI * sinI;
            double cos2 = cosI * cosI;
            F220 = 0.75 * (1.0 + (2.0 * cosI) + cos2);
            F221 = 1.5 * sin2;
            F321 = 1.875 * sinI * (1.0 - (2.0 * cosI) - (3.0 * cos2));
            F322 = -1.875 * sinI * (1.0 + (2.0 * cosI) - (3.0 * cos2));
            F441 = 35.0 * sin2 * F220;
            F442 = 39.3750 * sin2 * sin2;
            F522 = 9.84375 * sinI * (
                (sin2 * (1.0 - (2.0 * cosI) - (5.0 * cos2))) + (0.33333333 * (-2.0 + (4.0 * cosI) + (6.0 * cos2))));
            F523 = sinI * (
                (4.92187512 * sin2 * (-2.0 - (4.0 * cosI) + (10.0 * cos2))) + (6.56250012 * (1.0 + (2.0 * cosI) - (3.0 * cos2))));
            F542 = 29.53125 * sinI * (2.0 - (8.0 * cosI) + (cos2 * (-12.0 + (8.0 * cosI) + (10.0 * cos2))));
            F543 = 29.53125 * sinI * (-2.0 - (8.0 * cosI) + (cos2 * (12.0 + (8.0 * cosI) - (10.0 * cos2))));
        }
    }
}
