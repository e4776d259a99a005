namespace PassPlanner.Physics.Orbits;

/// <summary>
/// The coefficients by which the Sun or the Moon disturbs an orbit, from the geometry at epoch (the routine
/// DSCOM of AIAA 2006-6753; Hujsak 1979). The names S and Z follow the paper.
/// </summary>
internal readonly struct Sgp4ThirdBody
{
    // Eccentricities and mean motions (rad/min) of the apparent orbits of Sun and Moon, and perturbation coefficients.
    public const double SolarEccentricity = 0.01675;
    public const double LunarEccentricity = 0.05490;
    public const double SolarMeanMotion = 1.19459e-5;
    public const double LunarMeanMotion = 1.5835218e-4;
    private const double SolarCoefficient = 2.9864797e-6;
    private const double LunarCoefficient = 4.7968065e-7;

    // Orientation of the Sun's apparent orbit: sine and cosine of the obliquity and of the argument of perigee.
    private const double SinObliquity = 0.39785416;
    private const double CosObliquity = 0.91744867;
    private const double CosSolarPerigee = 0.1945905;
    private const double SinSolarPerigee = -0.98088458;

    public readonly double S1, S2, S3, S4, S5, S6, S7;
    public readonly double Z1, Z2, Z3, Z11, Z12, Z13, Z21, Z22, Z23, Z31, Z32, Z33;

    /// <summary>Mean anomaly of the body at epoch, rad.</summary>
    public readonly double MeanAnomaly0;

    public readonly double Eccentricity;
    public readonly double MeanMotion;

    private Sgp4ThirdBody(Sgp4NearEarthConstants c, in Orientation body, double eccentricity, double meanMotion, double coefficient, double meanAnomaly0)
    {
        Eccentricity = eccentricity;
        MeanMotion = meanMotion;
        MeanAnomaly0 = meanAnomaly0;
        (double sinOmega, double cosOmega) = Math.SinCos(c.Omega0);
        double sinI = c.SinI0;
        double cosI = c.CosI0;
        double e2 = c.E0 * c.E0;
        double beta2 = 1.0 - e2;
        double beta = Math.Sqrt(beta2);

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

        Z31 = (12.0 * x1 * x1) - (3.0 * x3 * x3);
        Z32 = (24.0 * x1 * x2) - (6.0 * x3 * x4);
        Z33 = (12.0 * x2 * x2) - (3.0 * x4 * x4);
        Z11 = (-6.0 * a1 * a5) + (e2 * ((-24.0 * x1 * x7) - (6.0 * x3 * x5)));
        Z12 = (-6.0 * ((a1 * a6) + (a3 * a5))) + (e2 * ((-24.0 * ((x2 * x7) + (x1 * x8))) - (6.0 * ((x3 * x6) + (x4 * x5)))));
        Z13 = (-6.0 * a3 * a6) + (e2 * ((-24.0 * x2 * x8) - (6.0 * x4 * x6)));
        Z21 = (6.0 * a2 * a5) + (e2 * ((24.0 * x1 * x5) - (6.0 * x3 * x7)));
        Z22 = (6.0 * ((a4 * a5) + (a2 * a6))) + (e2 * ((24.0 * ((x2 * x5) + (x1 * x6))) - (6.0 * ((x4 * x7) + (x3 * x8)))));
        Z23 = (6.0 * a4 * a6) + (e2 * ((24.0 * x2 * x6) - (6.0 * x4 * x8)));
        double z1 = (3.0 * ((a1 * a1) + (a2 * a2))) + (Z31 * e2);
        double z2 = (6.0 * ((a1 * a3) + (a2 * a4))) + (Z32 * e2);
        double z3 = (3.0 * ((a3 * a3) + (a4 * a4))) + (Z33 * e2);
        Z1 = z1 + z1 + (beta2 * Z31);
        Z2 = z2 + z2 + (beta2 * Z32);
        Z3 = z3 + z3 + (beta2 * Z33);

        S3 = coefficient / c.N0;
        S2 = -0.5 * S3 / beta;
        S4 = S3 * beta;
        S1 = -15.0 * c.E0 * S4;
        S5 = (x1 * x3) + (x2 * x4);
        S6 = (x2 * x3) + (x1 * x4);
        S7 = (x2 * x4) - (x1 * x3);
    }

    /// <summary>The Sun.</summary>
    /// <param name="c">The orbit.</param>
    /// <param name="days1900">Days since 1900 January 0.5.</param>
    public static Sgp4ThirdBody Sun(Sgp4NearEarthConstants c, double days1900)
    {
        (double sinNode, double cosNode) = Math.SinCos(c.Node0);
        var orientation = new Orientation(
            SinSolarPerigee, CosSolarPerigee, SinObliquity, CosObliquity, sinNode, cosNode);
        double meanAnomaly = (6.2565837 + (0.017201977 * days1900)) % (2.0 * Math.PI);
        return new Sgp4ThirdBody(c, orientation, SolarEccentricity, SolarMeanMotion, SolarCoefficient, meanAnomaly);
    }

    /// <summary>The Moon.</summary>
    /// <param name="c">The orbit.</param>
    /// <param name="days1900">Days since 1900 January 0.5.</param>
    public static Sgp4ThirdBody Moon(Sgp4NearEarthConstants c, double days1900)
    {
        (double sinNode, double cosNode) = Math.SinCos(c.Node0);
        double moonNode = (4.5236020 - (9.2422029e-4 * days1900)) % (2.0 * Math.PI);
        (double sinMoonNode, double cosMoonNode) = Math.SinCos(moonNode);
        double cosI = 0.91375164 - (0.03568096 * cosMoonNode);
        double sinI = Math.Sqrt(1.0 - (cosI * cosI));
        double sinH = 0.089683511 * sinMoonNode / sinI;
        double cosH = Math.Sqrt(1.0 - (sinH * sinH));
        double perigee = 5.8351514 + (0.0019443680 * days1900);
        double zx = SinObliquity * sinMoonNode / sinI;
        double zy = (cosH * cosMoonNode) + (CosObliquity * sinH * sinMoonNode);
        (double sinG, double cosG) = Math.SinCos(perigee + Math.Atan2(zx, zy) - moonNode);
        var orientation = new Orientation(
            sinG, cosG, sinI, cosI, (sinNode * cosH) - (cosNode * sinH), (cosH * cosNode) + (sinH * sinNode));
        double meanAnomaly = (4.7199672 + (0.22997150 * days1900) - perigee) % (2.0 * Math.PI);
        return new Sgp4ThirdBody(c, orientation, LunarEccentricity, LunarMeanMotion, LunarCoefficient, meanAnomaly);
    }

    /// <summary>Sines and cosines of a body's argument of perigee g, inclination i, and node relative to the orbit's h.</summary>
    private readonly record struct Orientation(double SinG, double CosG, double SinI, double CosI, double SinH, double CosH);
}
