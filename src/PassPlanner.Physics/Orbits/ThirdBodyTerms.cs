namespace PassPlanner.Physics.Orbits;

/// <summary>
/// What the Sun or the Moon does to an orbit: coefficients of the secular rates and of the long-period terms, by the
/// geometry of the two orbital planes (Hujsak, Spacetrack Report #1; section 6 of Spacetrack Report #3, whose names
/// are kept).
/// </summary>
internal sealed class ThirdBodyTerms
{
    private readonly double meanMotionRadPerMin;
    private readonly double eccentricity;
    private readonly double anomalyAtEpochRad;
    private readonly double e2;
    private readonly double e3;
    private readonly double i2;
    private readonly double i3;
    private readonly double l2;
    private readonly double l3;
    private readonly double l4;
    private readonly double gh2;
    private readonly double gh3;
    private readonly double gh4;
    private readonly double h2;
    private readonly double h3;

    /// <summary>Works out the coefficients.</summary>
    /// <param name="orbit">Mean elements of the spacecraft at epoch.</param>
    /// <param name="body">Mean orbit of the body.</param>
    public ThirdBodyTerms(in MeanElements orbit, in ThirdBody body)
    {
        (meanMotionRadPerMin, eccentricity, anomalyAtEpochRad) = (body.MeanMotionRadPerMin, body.Eccentricity, body.AnomalyAtEpochRad);
        (double sinI, double cosI) = Math.SinCos(orbit.InclinationRad);
        (double sinOmega, double cosOmega) = Math.SinCos(orbit.PerigeeRad);
        double ee = orbit.Eccentricity * orbit.Eccentricity;
        double betaSquared = 1 - ee;
        double beta = Math.Sqrt(betaSquared);

        // Direction cosines of the body's orbit in the axes of the spacecraft's.
        double a1 = (body.CosG * body.CosH) + (body.SinG * body.CosI * body.SinH);
        double a3 = (-body.SinG * body.CosH) + (body.CosG * body.CosI * body.SinH);
        double a7 = (-body.CosG * body.SinH) + (body.SinG * body.CosI * body.CosH);
        double a8 = body.SinG * body.SinI;
        double a9 = (body.SinG * body.SinH) + (body.CosG * body.CosI * body.CosH);
        double a10 = body.CosG * body.SinI;
        double a2 = (cosI * a7) + (sinI * a8);
        double a4 = (cosI * a9) + (sinI * a10);
        double a5 = (-sinI * a7) + (cosI * a8);
        double a6 = (-sinI * a9) + (cosI * a10);

        double x1 = (a1 * cosOmega) + (a2 * sinOmega);
        double x2 = (a3 * cosOmega) + (a4 * sinOmega);
        double x3 = (-a1 * sinOmega) + (a2 * cosOmega);
        double x4 = (-a3 * sinOmega) + (a4 * cosOmega);
        double x5 = a5 * sinOmega;
        double x6 = a6 * sinOmega;
        double x7 = a5 * cosOmega;
        double x8 = a6 * cosOmega;

        double z31 = (12 * x1 * x1) - (3 * x3 * x3);
        double z32 = (24 * x1 * x2) - (6 * x3 * x4);
        double z33 = (12 * x2 * x2) - (3 * x4 * x4);
        double z1 = (2 * ((3 * ((a1 * a1) + (a2 * a2))) + (z31 * ee))) + (betaSquared * z31);
        double z2 = (2 * ((6 * ((a1 * a3) + (a2 * a4))) + (z32 * ee))) + (betaSquared * z32);
        double z3 = (2 * ((3 * ((a3 * a3) + (a4 * a4))) + (z33 * ee))) + (betaSquared * z33);
        double z11 = (-6 * a1 * a5) + (ee * ((-24 * x1 * x7) - (6 * x3 * x5)));
        double z12 = (-6 * ((a1 * a6) + (a3 * a5))) + (ee * ((-24 * ((x2 * x7) + (x1 * x8))) - (6 * ((x3 * x6) + (x4 * x5)))));
        double z13 = (-6 * a3 * a6) + (ee * ((-24 * x2 * x8) - (6 * x4 * x6)));
        double z21 = (6 * a2 * a5) + (ee * ((24 * x1 * x5) - (6 * x3 * x7)));
        double z22 = (6 * ((a4 * a5) + (a2 * a6))) + (ee * ((24 * ((x2 * x5) + (x1 * x6))) - (6 * ((x4 * x7) + (x3 * x8)))));
        double z23 = (6 * a4 * a6) + (ee * ((24 * x2 * x6) - (6 * x4 * x8)));

        double s3 = body.Strength / orbit.MotionRadPerMin;
        double s2 = -0.5 * s3 / beta;
        double s4 = s3 * beta;
        double s1 = -15 * orbit.Eccentricity * s4;
        double s5 = (x1 * x3) + (x2 * x4);
        double s6 = (x2 * x3) + (x1 * x4);
        double s7 = (x2 * x4) - (x1 * x3);

        e2 = 2 * s1 * s6;
        e3 = 2 * s1 * s7;
        i2 = 2 * s2 * z12;
        i3 = 2 * s2 * (z13 - z11);
        l2 = -2 * s3 * z2;
        l3 = -2 * s3 * (z3 - z1);
        l4 = -2 * s3 * (-21 - (9 * ee)) * body.Eccentricity;
        gh2 = 2 * s4 * z32;
        gh3 = 2 * s4 * (z33 - z31);
        gh4 = -18 * s4 * body.Eccentricity;
        h2 = -2 * s2 * z22;
        h3 = -2 * s2 * (z23 - z21);

        double n = body.MeanMotionRadPerMin;
        EccentricityRate = s1 * n * s5;
        InclinationRate = s2 * n * (z11 + z13);
        AnomalyRate = -n * s3 * (z1 + z3 - 14 - (6 * ee));
        PerigeePlusNodeRate = s4 * n * (z31 + z33 - 6);
        NodeRateTimesSine = -n * s2 * (z21 + z23);
    }

    /// <summary>Secular rate of the eccentricity, 1/min.</summary>
    public double EccentricityRate { get; }

    /// <summary>Secular rate of the inclination, rad/min.</summary>
    public double InclinationRate { get; }

    /// <summary>Secular rate of the mean anomaly, rad/min.</summary>
    public double AnomalyRate { get; }

    /// <summary>Secular rate of the perigee plus cos i times that of the node, rad/min.</summary>
    public double PerigeePlusNodeRate { get; }

    /// <summary>Secular rate of the node times sin i, rad/min.</summary>
    public double NodeRateTimesSine { get; }

    /// <summary>Adds the long-period terms at a time.</summary>
    /// <param name="minutes">Minutes since the epoch.</param>
    /// <param name="periodics">Terms so far.</param>
    public void AddPeriodics(double minutes, ref LunisolarPeriodics periodics)
    {
        double anomalyRad = anomalyAtEpochRad + (meanMotionRadPerMin * minutes);
        (double sinF, double cosF) = Math.SinCos(anomalyRad + (2 * eccentricity * Math.Sin(anomalyRad)));
        double f2 = (0.5 * sinF * sinF) - 0.25;
        double f3 = -0.5 * sinF * cosF;
        periodics.Eccentricity += (e2 * f2) + (e3 * f3);
        periodics.InclinationRad += (i2 * f2) + (i3 * f3);
        periodics.AnomalyRad += (l2 * f2) + (l3 * f3) + (l4 * sinF);
        periodics.PerigeePlusNodeRad += (gh2 * f2) + (gh3 * f3) + (gh4 * sinF);
        periodics.NodeTimesSineRad += (h2 * f2) + (h3 * f3);
    }
}
