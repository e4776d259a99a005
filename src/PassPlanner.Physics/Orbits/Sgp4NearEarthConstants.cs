namespace PassPlanner.Physics.Orbits;

/// <summary>
/// What SGP4 computes once from an element set: the original ("Brouwer") mean motion, the secular rates by the
/// zonal harmonics and the drag coefficients. Spacetrack Report #3, section 6; AIAA 2006-6753, appendix C.
/// Lengths in Earth radii, times in minutes, angles in radians; the names follow the report.
/// </summary>
internal sealed class Sgp4NearEarthConstants
{
    /// <summary>Below this perigee height the drag equations are cut to their first terms, km.</summary>
    private const double SimpleDragPerigeeKm = 220.0;

    /// <summary>Heights of the density model's lower bound s and its scale q0, km. STR#3, section 6.</summary>
    private const double DensityFloorKm = 78.0;
    private const double DensityTopKm = 120.0;

    public Sgp4NearEarthConstants(ElementSet elements, GravityModel gravity)
    {
        const double RadPerDeg = Math.PI / 180.0;
        double e0 = E0 = elements.Eccentricity;
        double i0 = I0 = elements.InclinationDeg * RadPerDeg;
        double omega0 = Omega0 = elements.ArgumentOfPerigeeDeg * RadPerDeg;
        double m0 = M0 = elements.MeanAnomalyDeg * RadPerDeg;
        Node0 = elements.RightAscensionOfNodeDeg * RadPerDeg;
        BStar = elements.BStarPerEarthRadius;
        double kozaiN = elements.MeanMotionRevPerDay * (2.0 * Math.PI / 1440.0);
        double j2 = gravity.J2;
        double j4 = gravity.J4;
        double j3OverJ2 = gravity.J3OverJ2;

        // Original mean motion n0'' and semi-major axis a0'' from the Kozai mean motion.
        (double sinI0, double cosI0) = Math.SinCos(i0);
        SinI0 = sinI0;
        CosI0 = cosI0;
        double theta2 = cosI0 * cosI0;
        double theta4 = theta2 * theta2;
        double e02 = e0 * e0;
        double beta02 = 1.0 - e02;
        double beta0 = Math.Sqrt(beta02);
        double a1 = Math.Pow(gravity.RootMuPerMin / kozaiN, 2.0 / 3.0);
        double d1 = 0.75 * j2 * ((3.0 * theta2) - 1.0) / (beta0 * beta02);
        double delta = d1 / (a1 * a1);
        double a0Prime = a1 * (1.0 - (delta * delta) - (delta * ((1.0 / 3.0) + (134.0 * delta * delta / 81.0))));
        delta = d1 / (a0Prime * a0Prime);
        double n0 = N0 = kozaiN / (1.0 + delta);
        double a0 = Math.Pow(gravity.RootMuPerMin / n0, 2.0 / 3.0);
        double p0 = a0 * beta02;
        double perigee = a0 * (1.0 - e0);

        ThreeTheta2Minus1 = (3.0 * theta2) - 1.0;
        OneMinusTheta2 = 1.0 - theta2;
        SevenTheta2Minus1 = (7.0 * theta2) - 1.0;
        double oneMinusFiveTheta2 = 1.0 - (5.0 * theta2);

        // The density parameters s and (q0 - s)^4 follow the perigee when it is low.
        double perigeeHeightKm = (perigee - 1.0) * gravity.EarthRadiusKm;
        double floorKm = DensityFloorKm;
        if (perigeeHeightKm < 156.0)
        {
            floorKm = perigeeHeightKm < 98.0 ? 20.0 : perigeeHeightKm - DensityFloorKm;
        }

        double s = 1.0 + (floorKm / gravity.EarthRadiusKm);
        double q0MinusS = (DensityTopKm - floorKm) / gravity.EarthRadiusKm;
        double q0MinusS4 = q0MinusS * q0MinusS * q0MinusS * q0MinusS;

        double p0Inv2 = 1.0 / (p0 * p0);
        double xi = 1.0 / (a0 - s);
        double eta = Eta = a0 * e0 * xi;
        double eta2 = eta * eta;
        double eEta = e0 * eta;
        double psi2 = Math.Abs(1.0 - eta2);
        double coefficient = q0MinusS4 * xi * xi * xi * xi;
        double coefficient1 = coefficient / Math.Pow(psi2, 3.5);

        // C1 to C5.
        double c2 = coefficient1 * n0 * (
            (a0 * (1.0 + (1.5 * eta2) + (eEta * (4.0 + eta2))))
            + (0.375 * j2 * xi / psi2 * ThreeTheta2Minus1 * (8.0 + (3.0 * eta2 * (8.0 + eta2)))));
        double c1 = C1 = BStar * c2;
        double c3 = e0 > 1.0e-4 ? -2.0 * coefficient * xi * j3OverJ2 * n0 * sinI0 / e0 : 0.0;
        C4 = 2.0 * n0 * coefficient1 * a0 * beta02 * (
            (eta * (2.0 + (0.5 * eta2)))
            + (e0 * (0.5 + (2.0 * eta2)))
            - (j2 * xi / (a0 * psi2) * (
                (-3.0 * ThreeTheta2Minus1 * (1.0 - (2.0 * eEta) + (eta2 * (1.5 - (0.5 * eEta)))))
                + (0.75 * OneMinusTheta2 * ((2.0 * eta2) - (eEta * (1.0 + eta2))) * Math.Cos(2.0 * omega0)))));
        C5 = 2.0 * coefficient1 * a0 * beta02 * (1.0 + (2.75 * (eta2 + eEta)) + (eEta * eta2));

        // Secular rates of mean anomaly, perigee and node.
        double k2Rate = 1.5 * j2 * p0Inv2 * n0;
        double k2SquaredRate = 0.5 * k2Rate * j2 * p0Inv2;
        double k4Rate = -0.46875 * j4 * p0Inv2 * p0Inv2 * n0;
        MDot = n0
            + (0.5 * k2Rate * beta0 * ThreeTheta2Minus1)
            + (0.0625 * k2SquaredRate * beta0 * (13.0 - (78.0 * theta2) + (137.0 * theta4)));
        OmegaDot = (-0.5 * k2Rate * oneMinusFiveTheta2)
            + (0.0625 * k2SquaredRate * (7.0 - (114.0 * theta2) + (395.0 * theta4)))
            + (k4Rate * (3.0 - (36.0 * theta2) + (49.0 * theta4)));
        double nodeDot1 = -k2Rate * cosI0;
        NodeDot = nodeDot1
            + (((0.5 * k2SquaredRate * (4.0 - (19.0 * theta2))) + (2.0 * k4Rate * (3.0 - (7.0 * theta2)))) * cosI0);

        // Drag on perigee, mean anomaly, node and mean longitude.
        OmegaDrag = BStar * c3 * Math.Cos(omega0);
        MDrag = e0 > 1.0e-4 ? -2.0 / 3.0 * coefficient * BStar / eEta : 0.0;
        NodeDrag = 3.5 * beta02 * nodeDot1 * c1;
        T2 = 1.5 * c1;
        double deltaM0 = 1.0 + (eta * Math.Cos(m0));
        DeltaM0 = deltaM0 * deltaM0 * deltaM0;
        SinM0 = Math.Sin(m0);

        // Long-period terms by J3.
        ALong = LongPeriodA(sinI0, j3OverJ2);
        LLong = LongPeriodL(sinI0, cosI0, j3OverJ2);

        IsDeepSpace = 2.0 * Math.PI / n0 >= 225.0;
        HasSimpleDrag = IsDeepSpace || perigee < (SimpleDragPerigeeKm / gravity.EarthRadiusKm) + 1.0;
        if (!HasSimpleDrag)
        {
            double c12 = c1 * c1;
            D2 = 4.0 * a0 * xi * c12;
            double d = D2 * xi * c1 / 3.0;
            D3 = ((17.0 * a0) + s) * d;
            D4 = 0.5 * d * a0 * xi * ((221.0 * a0) + (31.0 * s)) * c1;
            T3 = D2 + (2.0 * c12);
            T4 = 0.25 * ((3.0 * D3) + (c1 * ((12.0 * D2) + (10.0 * c12))));
            T5 = 0.2 * ((3.0 * D4) + (12.0 * c1 * D3) + (6.0 * D2 * D2) + (15.0 * c12 * ((2.0 * D2) + c12)));
        }
    }

    // Elements at epoch.
    public double E0 { get; }
    public double I0 { get; }
    public double Omega0 { get; }
    public double M0 { get; }
    public double Node0 { get; }
    public double BStar { get; }
    public double N0 { get; }

    // Functions of the inclination.
    public double SinI0 { get; }
    public double CosI0 { get; }
    public double ThreeTheta2Minus1 { get; }
    public double OneMinusTheta2 { get; }
    public double SevenTheta2Minus1 { get; }

    // Secular rates, rad/min.
    public double MDot { get; }
    public double OmegaDot { get; }
    public double NodeDot { get; }

    // Drag.
    public bool IsDeepSpace { get; }
    public bool HasSimpleDrag { get; }
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
    public double OmegaDrag { get; }
    public double MDrag { get; }
    public double NodeDrag { get; }
    public double DeltaM0 { get; }
    public double SinM0 { get; }

    // Long-period coefficients.
    public double ALong { get; }
    public double LLong { get; }

    /// <summary>Coefficient of the long-period term in a_yN.</summary>
    public static double LongPeriodA(double sinI, double j3OverJ2) => -0.5 * j3OverJ2 * sinI;

    /// <summary>Coefficient of the long-period term in the mean longitude; kept finite at 180 degrees as the paper does.</summary>
    public static double LongPeriodL(double sinI, double cosI, double j3OverJ2)
    {
        double onePlusCosI = Math.Abs(cosI + 1.0) > 1.5e-12 ? 1.0 + cosI : 1.5e-12;
        return -0.25 * j3OverJ2 * sinI * (3.0 + (5.0 * cosI)) / onePlusCosI;
    }
}
