namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Drag by a static atmosphere whose density falls with the fourth power of the height above a reference (section 5 of
/// Spacetrack Report #3, whose names are kept).
/// </summary>
internal sealed record DragTerms
{
    private const double SimplePerigeeKm = 220;
    private const double LeastEccentricity = 1e-4;

    /// <summary>Works out the coefficients at the epoch.</summary>
    public DragTerms(GravityModel gravity, in MeanElements epoch, double bStar, double a)
    {
        double e = epoch.Eccentricity;
        double n = epoch.MotionRadPerMin;
        (double sinI, double cosI) = Math.SinCos(epoch.InclinationRad);
        double theta2 = cosI * cosI;
        double x3thm1 = (3 * theta2) - 1;
        double betaSquared = 1 - (e * e);
        double p = a * betaSquared;
        (double s, double q0mS4) = Atmosphere(gravity, ((a * (1 - e)) - 1) * gravity.EarthRadiusKm);
        IsSimple = a * (1 - e) < (SimplePerigeeKm / gravity.EarthRadiusKm) + 1;

        double xi = 1 / (a - s);
        Eta = a * e * xi;
        double eta2 = Eta * Eta;
        double eEta = e * Eta;
        double psi2 = Math.Abs(1 - eta2);
        double coef = q0mS4 * xi * xi * xi * xi;
        double coef1 = coef / Math.Pow(psi2, 3.5);
        double c2 = coef1 * n * ((a * (1 + (1.5 * eta2) + (eEta * (4 + eta2))))
            + (0.375 * gravity.J2 * xi / psi2 * x3thm1 * (8 + (3 * eta2 * (8 + eta2)))));
        C1 = bStar * c2;
        double c3 = e > LeastEccentricity ? -2 * coef * xi * gravity.J3OverJ2 * n * sinI / e : 0;
        C4 = 2 * n * coef1 * a * betaSquared * ((Eta * (2 + (0.5 * eta2))) + (e * (0.5 + (2 * eta2)))
            - (gravity.J2 * xi / (a * psi2)
                * ((-3 * x3thm1 * (1 - (2 * eEta) + (eta2 * (1.5 - (0.5 * eEta)))))
                    + (0.75 * (1 - theta2) * ((2 * eta2) - (eEta * (1 + eta2))) * Math.Cos(2 * epoch.PerigeeRad)))));
        C5 = 2 * coef1 * a * betaSquared * (1 + (2.75 * (eta2 + eEta)) + (eEta * eta2));
        PerigeeFactor = bStar * c3 * Math.Cos(epoch.PerigeeRad);
        AnomalyFactor = e > LeastEccentricity ? -2.0 / 3 * coef * bStar / eEta : 0;
        double nodeRateOfJ2 = -1.5 * gravity.J2 / (p * p) * n * cosI;
        NodeFactor = 3.5 * betaSquared * nodeRateOfJ2 * C1;
        double delta = 1 + (Eta * Math.Cos(epoch.AnomalyRad));
        AnomalyAtEpochCubed = delta * delta * delta;
        SinAnomalyAtEpoch = Math.Sin(epoch.AnomalyRad);

        T2 = 1.5 * C1;
        double c1Squared = C1 * C1;
        D2 = 4 * a * xi * c1Squared;
        double temp = D2 * xi * C1 / 3;
        D3 = ((17 * a) + s) * temp;
        D4 = 0.5 * temp * a * xi * ((221 * a) + (31 * s)) * C1;
        T3 = D2 + (2 * c1Squared);
        T4 = 0.25 * ((3 * D3) + (C1 * ((12 * D2) + (10 * c1Squared))));
        T5 = 0.2 * ((3 * D4) + (12 * C1 * D3) + (6 * D2 * D2) + (15 * c1Squared * ((2 * D2) + c1Squared)));
    }

    /// <summary>Whether only the first power of time is kept: for a perigee below 220 km, and in deep space.</summary>
    public bool IsSimple { get; init; }

    public double Eta { get; }

    public double C1 { get; }

    public double C4 { get; }

    public double C5 { get; }

    public double D2 { get; }

    public double D3 { get; }

    public double D4 { get; }

    public double T2 { get; }

    public double T3 { get; }

    public double T4 { get; }

    public double T5 { get; }

    public double PerigeeFactor { get; }

    public double AnomalyFactor { get; }

    public double NodeFactor { get; }

    public double AnomalyAtEpochCubed { get; }

    public double SinAnomalyAtEpoch { get; }

    /// <summary>The parameter s and (q0 - s)^4 by the height of the perigee, Earth radii.</summary>
    private static (double S, double Q0MinusS4) Atmosphere(GravityModel gravity, double perigeeKm)
    {
        double sKm = perigeeKm switch
        {
            < 98 => 20,
            < 156 => perigeeKm - 78,
            _ => 78,
        };
        double q0mS = (120 - sKm) / gravity.EarthRadiusKm;
        return ((sKm / gravity.EarthRadiusKm) + 1, q0mS * q0mS * q0mS * q0mS);
    }
}
