namespace PassPlanner.Physics.Orbits;

/// <summary>
/// The mean orbit of the Sun or the Moon as seen from the spacecraft's node at epoch (section 6 of Spacetrack Report #3;
/// constants as printed there and in AIAA 2006-6753).
/// </summary>
internal readonly struct ThirdBody
{
    private ThirdBody(
        double eccentricity, double meanMotionRadPerMin, double strength, double anomalyAtEpochRad, (double Sin, double Cos) i, (double Sin, double Cos) g, (double Sin, double Cos) h)
    {
        (Eccentricity, MeanMotionRadPerMin, Strength, AnomalyAtEpochRad) = (eccentricity, meanMotionRadPerMin, strength, anomalyAtEpochRad);
        (SinI, CosI) = i;
        (SinG, CosG) = g;
        (SinH, CosH) = h;
    }

    /// <summary>Eccentricity of the body's orbit.</summary>
    public double Eccentricity { get; }

    /// <summary>Mean motion, rad/min.</summary>
    public double MeanMotionRadPerMin { get; }

    /// <summary>Perturbation coefficient, rad/min.</summary>
    public double Strength { get; }

    /// <summary>Mean anomaly at the epoch, rad.</summary>
    public double AnomalyAtEpochRad { get; }

    /// <summary>Sine of the inclination.</summary>
    public double SinI { get; }

    /// <summary>Cosine of the inclination.</summary>
    public double CosI { get; }

    /// <summary>Sine of the argument of perigee.</summary>
    public double SinG { get; }

    /// <summary>Cosine of the argument of perigee.</summary>
    public double CosG { get; }

    /// <summary>Sine of the node, less that of the spacecraft.</summary>
    public double SinH { get; }

    /// <summary>Cosine of the node, less that of the spacecraft.</summary>
    public double CosH { get; }

    /// <summary>The Sun.</summary>
    /// <param name="nodeRad">Node of the spacecraft at epoch, rad.</param>
    /// <param name="days">Days since 1900 January 0.5.</param>
    public static ThirdBody Sun(double nodeRad, double days) => new(
        0.01675, 1.19459e-5, 2.9864797e-6, (6.2565837 + (0.017201977 * days)) % (2 * Math.PI), (0.39785416, 0.91744867), (-0.98088458, 0.1945905), Math.SinCos(nodeRad));

    /// <summary>The Moon.</summary>
    /// <param name="nodeRad">Node of the spacecraft at epoch, rad.</param>
    /// <param name="days">Days since 1900 January 0.5.</param>
    public static ThirdBody Moon(double nodeRad, double days)
    {
        double nodeOfMoonRad = (4.5236020 - (9.2422029e-4 * days)) % (2 * Math.PI);
        (double sinNode, double cosNode) = Math.SinCos(nodeOfMoonRad);
        double cosI = 0.91375164 - (0.03568096 * cosNode);
        double sinI = Math.Sqrt(1 - (cosI * cosI));
        double sinH = 0.089683511 * sinNode / sinI;
        double cosH = Math.Sqrt(1 - (sinH * sinH));
        double perigeeRad = 5.8351514 + (0.0019443680 * days);
        double x = 0.39785416 * sinNode / sinI;
        double y = (cosH * cosNode) + (0.91744867 * sinH * sinNode);
        double gRad = perigeeRad + Math.Atan2(x, y) - nodeOfMoonRad;
        (double sinOwn, double cosOwn) = Math.SinCos(nodeRad);
        return new ThirdBody(
            0.05490,
            1.5835218e-4,
            4.7968065e-7,
            (4.7199672 + (0.22997150 * days) - perigeeRad) % (2 * Math.PI),
            (sinI, cosI),
            Math.SinCos(gRad),
            ((sinOwn * cosH) - (cosOwn * sinH), (cosH * cosOwn) + (sinH * sinOwn)));
    }
}
