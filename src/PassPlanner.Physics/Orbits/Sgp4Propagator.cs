using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// SGP4 and SDP4: Spacetrack Report #3 (Hoots and Roehrich, 1980) with the corrections of Vallado, Crawford, Hujsak and
/// Kelso, AIAA 2006-6753, improved mode. One object for one element set, immutable: any number of threads may share
/// it, and a propagation allocates nothing. Names follow the report where it has them.
/// </summary>
public sealed class Sgp4Propagator
{
    private const double DeepSpacePeriodMin = 225;
    private const double LeastDenominator = 1.5e-12;
    private const double TwoPi = 2 * Math.PI;

    private readonly GravityModel gravity;
    private readonly MeanElements epoch;
    private readonly double bStar;
    private readonly SecularRates secular;
    private readonly DeepSpaceTerms? deepSpace;
    private readonly DragTerms drag;
    private readonly PlaneTerms plane;

    /// <summary>Works out everything that does not depend on time.</summary>
    /// <param name="elementSet">Element set.</param>
    /// <param name="gravity">Gravity constants; WGS-72 when left out, as element sets are made for it.</param>
    public Sgp4Propagator(ElementSet elementSet, GravityModel? gravity = null)
    {
        ElementSet = elementSet;
        this.gravity = gravity ?? GravityModel.Wgs72;
        bStar = elementSet.BStarPerEarthRadius;
        epoch = new MeanElements
        {
            Eccentricity = elementSet.Eccentricity,
            InclinationRad = double.DegreesToRadians(elementSet.InclinationDeg),
            NodeRad = double.DegreesToRadians(elementSet.RightAscensionOfNodeDeg),
            PerigeeRad = double.DegreesToRadians(elementSet.ArgumentOfPerigeeDeg),
            AnomalyRad = double.DegreesToRadians(elementSet.MeanAnomalyDeg),
        };
        double cosI = Math.Cos(epoch.InclinationRad);
        epoch.MotionRadPerMin = BrouwerMotion(elementSet.MeanMotionRevPerDay * TwoPi / 1440, cosI);
        plane = new PlaneTerms(this.gravity, epoch.InclinationRad);
        double semiMajorAxis = Math.Pow(this.gravity.Ke / epoch.MotionRadPerMin, 2.0 / 3);
        secular = Secular(semiMajorAxis, cosI);
        drag = new DragTerms(this.gravity, epoch, bStar, semiMajorAxis);
        IsDeepSpace = TwoPi / epoch.MotionRadPerMin >= DeepSpacePeriodMin;
        if (IsDeepSpace)
        {
            drag = drag with { IsSimple = true };
            deepSpace = new DeepSpaceTerms(this.gravity, elementSet.EpochUtc, epoch, secular);
        }
    }

    /// <summary>Element set.</summary>
    public ElementSet ElementSet { get; }

    /// <summary>Whether the deep-space theory is used: a period of 225 minutes or more.</summary>
    public bool IsDeepSpace { get; }

    /// <summary>Position and velocity at a time.</summary>
    /// <param name="minutesSinceEpoch">Minutes since the epoch of the element set; any sign.</param>
    /// <param name="state">The state, TEME, km and km/s; the default value after a failure.</param>
    public Sgp4Status TryPropagate(double minutesSinceEpoch, out TemeState state)
    {
        state = default;
        double t = minutesSinceEpoch;
        MeanElements elements = epoch;
        (double tempA, double tempE, double tempL) = AddSecular(t, ref elements);
        if (elements.MotionRadPerMin <= 0)
        {
            return Sgp4Status.MeanMotionNotPositive;
        }

        double a = Math.Pow(gravity.Ke / elements.MotionRadPerMin, 2.0 / 3) * tempA * tempA;
        elements.MotionRadPerMin = gravity.Ke / Math.Pow(a, 1.5);
        elements.Eccentricity -= tempE;
        if (elements.Eccentricity is >= 1 or < -0.001)
        {
            return Sgp4Status.MeanEccentricityOutOfRange;
        }

        elements.Eccentricity = Math.Max(elements.Eccentricity, 1e-6);
        elements.AnomalyRad += epoch.MotionRadPerMin * tempL;
        WrapAngles(ref elements);

        PlaneTerms terms = plane;
        if (deepSpace is not null)
        {
            deepSpace.AddPeriodics(t, ref elements);
            if (elements.InclinationRad < 0)
            {
                elements.InclinationRad = -elements.InclinationRad;
                elements.NodeRad += Math.PI;
                elements.PerigeeRad -= Math.PI;
            }

            if (elements.Eccentricity is < 0 or > 1)
            {
                return Sgp4Status.PerturbedEccentricityOutOfRange;
            }

            terms = new PlaneTerms(gravity, elements.InclinationRad);
        }

        return ToState(a, elements, terms, out state);
    }

    /// <summary>Mean motion of Brouwer from that of Kozai, which element sets carry, rad/min (section 5 of the report).</summary>
    private double BrouwerMotion(double kozai, double cosI)
    {
        double betaSquared = 1 - (epoch.Eccentricity * epoch.Eccentricity);
        double a1 = Math.Pow(gravity.Ke / kozai, 2.0 / 3);
        double d1 = 0.75 * gravity.J2 * ((3 * cosI * cosI) - 1) / (Math.Sqrt(betaSquared) * betaSquared);
        double delta1 = d1 / (a1 * a1);
        double a0 = a1 * (1 - (delta1 * delta1) - (delta1 * ((1.0 / 3) + (134 * delta1 * delta1 / 81))));
        return kozai / (1 + (d1 / (a0 * a0)));
    }

    private SecularRates Secular(double semiMajorAxis, double cosI)
    {
        double betaSquared = 1 - (epoch.Eccentricity * epoch.Eccentricity);
        double beta = Math.Sqrt(betaSquared);
        double theta2 = cosI * cosI;
        double theta4 = theta2 * theta2;
        double p = semiMajorAxis * betaSquared;
        double inverseP2 = 1 / (p * p);
        double n = epoch.MotionRadPerMin;
        double temp1 = 1.5 * gravity.J2 * inverseP2 * n;
        double temp2 = 0.5 * temp1 * gravity.J2 * inverseP2;
        double temp3 = -0.46875 * gravity.J4 * inverseP2 * inverseP2 * n;
        return new SecularRates(
            n + (0.5 * temp1 * beta * ((3 * theta2) - 1)) + (0.0625 * temp2 * beta * (13 - (78 * theta2) + (137 * theta4))),
            (-0.5 * temp1 * (1 - (5 * theta2))) + (0.0625 * temp2 * (7 - (114 * theta2) + (395 * theta4))) + (temp3 * (3 - (36 * theta2) + (49 * theta4))),
            (-temp1 * cosI) + (((0.5 * temp2 * (4 - (19 * theta2))) + (2 * temp3 * (3 - (7 * theta2)))) * cosI));
    }

    /// <summary>Secular effects of gravity, drag, the Moon, the Sun and resonance; answers the drag factors of a, e and L.</summary>
    private (double TempA, double TempE, double TempL) AddSecular(double t, ref MeanElements elements)
    {
        double anomaly = epoch.AnomalyRad + (secular.AnomalyRadPerMin * t);
        double perigee = epoch.PerigeeRad + (secular.PerigeeRadPerMin * t);
        double t2 = t * t;
        elements.NodeRad = epoch.NodeRad + (secular.NodeRadPerMin * t) + (drag.NodeFactor * t2);
        double tempA = 1 - (drag.C1 * t);
        double tempE = bStar * drag.C4 * t;
        double tempL = drag.T2 * t2;
        if (!drag.IsSimple)
        {
            double cubed = 1 + (drag.Eta * Math.Cos(anomaly));
            cubed = cubed * cubed * cubed;
            double shift = (drag.PerigeeFactor * t) + (drag.AnomalyFactor * (cubed - drag.AnomalyAtEpochCubed));
            anomaly += shift;
            perigee -= shift;
            double t3 = t2 * t;
            double t4 = t3 * t;
            tempA -= (drag.D2 * t2) + (drag.D3 * t3) + (drag.D4 * t4);
            tempE += bStar * drag.C5 * (Math.Sin(anomaly) - drag.SinAnomalyAtEpoch);
            tempL += (drag.T3 * t3) + (t4 * (drag.T4 + (t * drag.T5)));
        }

        elements.AnomalyRad = anomaly;
        elements.PerigeeRad = perigee;
        deepSpace?.AddSecular(t, ref elements);
        return (tempA, tempE, tempL);
    }

    private static void WrapAngles(ref MeanElements elements)
    {
        double longitude = elements.AnomalyRad + elements.PerigeeRad + elements.NodeRad;
        elements.NodeRad %= TwoPi;
        elements.PerigeeRad %= TwoPi;
        longitude %= TwoPi;
        elements.AnomalyRad = (longitude - elements.PerigeeRad - elements.NodeRad) % TwoPi;
    }

    /// <summary>Long-period terms, Kepler's equation, short-period terms, and the orientation vectors.</summary>
    private Sgp4Status ToState(double a, in MeanElements elements, in PlaneTerms terms, out TemeState state)
    {
        state = default;
        double e = elements.Eccentricity;
        double inverseP = 1 / (a * (1 - (e * e)));
        double axn = e * Math.Cos(elements.PerigeeRad);
        double ayn = (e * Math.Sin(elements.PerigeeRad)) + (inverseP * terms.AyFactor);
        double longitude = elements.AnomalyRad + elements.PerigeeRad + elements.NodeRad + (inverseP * terms.LongitudeFactor * axn);
        (double sinE, double cosE) = SolveKepler((longitude - elements.NodeRad) % TwoPi, axn, ayn);

        double eCosE = (axn * cosE) + (ayn * sinE);
        double eSinE = (axn * sinE) - (ayn * cosE);
        double el2 = (axn * axn) + (ayn * ayn);
        double pl = a * (1 - el2);
        if (pl < 0)
        {
            return Sgp4Status.SemiLatusRectumNegative;
        }

        double r = a * (1 - eCosE);
        double rDot = Math.Sqrt(a) * eSinE / r;
        double rfDot = Math.Sqrt(pl) / r;
        double betaL = Math.Sqrt(1 - el2);
        double part = eSinE / (1 + betaL);
        double sinU = a / r * (sinE - ayn - (axn * part));
        double cosU = a / r * (cosE - axn + (ayn * part));
        double u = Math.Atan2(sinU, cosU);
        double sin2U = 2 * cosU * sinU;
        double cos2U = 1 - (2 * sinU * sinU);
        double temp1 = 0.5 * gravity.J2 / pl;
        double temp2 = temp1 / pl;
        double n = elements.MotionRadPerMin;

        double radius = (r * (1 - (1.5 * temp2 * betaL * terms.ThreeThetaSquaredLess1))) + (0.5 * temp1 * terms.OneLessThetaSquared * cos2U);
        u -= 0.25 * temp2 * terms.SevenThetaSquaredLess1 * sin2U;
        double node = elements.NodeRad + (1.5 * temp2 * terms.CosI * sin2U);
        double inclination = elements.InclinationRad + (1.5 * temp2 * terms.CosI * terms.SinI * cos2U);
        double radiusDot = rDot - (n * temp1 * terms.OneLessThetaSquared * sin2U / gravity.Ke);
        double radiusFDot = rfDot + (n * temp1 * ((terms.OneLessThetaSquared * cos2U) + (1.5 * terms.ThreeThetaSquaredLess1)) / gravity.Ke);
        if (radius < 1)
        {
            return Sgp4Status.Decayed;
        }

        state = Orient(radius, radiusDot, radiusFDot, u, node, inclination);
        return Sgp4Status.Ok;
    }

    /// <summary>Sine and cosine of the eccentric longitude less the node, by Newton's method with a bound on each step.</summary>
    private static (double Sin, double Cos) SolveKepler(double u, double axn, double ayn)
    {
        const int iterations = 10;
        const double tolerance = 1e-12;
        const double longestStep = 0.95;
        double eccentric = u;
        (double sin, double cos) = (0, 0);
        double step = double.MaxValue;
        for (int i = 0; i < iterations && Math.Abs(step) >= tolerance; i++)
        {
            (sin, cos) = Math.SinCos(eccentric);
            step = (u - (ayn * cos) + (axn * sin) - eccentric) / (1 - (cos * axn) - (sin * ayn));
            step = Math.Clamp(step, -longestStep, longestStep);
            eccentric += step;
        }

        return (sin, cos);
    }

    private TemeState Orient(double radius, double radiusDot, double radiusFDot, double u, double node, double inclination)
    {
        (double sinU, double cosU) = Math.SinCos(u);
        (double sinNode, double cosNode) = Math.SinCos(node);
        (double sinI, double cosI) = Math.SinCos(inclination);
        double mx = -sinNode * cosI;
        double my = cosNode * cosI;
        var along = new Vector3D((mx * sinU) + (cosNode * cosU), (my * sinU) + (sinNode * cosU), sinI * sinU);
        var across = new Vector3D((mx * cosU) - (cosNode * sinU), (my * cosU) - (sinNode * sinU), sinI * cosU);
        return new TemeState(
            along * (radius * gravity.EarthRadiusKm),
            ((along * radiusDot) + (across * radiusFDot)) * gravity.VelocityUnitKmPerS);
    }

    /// <summary>Functions of the inclination.</summary>
    private readonly struct PlaneTerms
    {
        public PlaneTerms(GravityModel gravity, double inclinationRad)
        {
            (SinI, CosI) = Math.SinCos(inclinationRad);
            double theta2 = CosI * CosI;
            ThreeThetaSquaredLess1 = (3 * theta2) - 1;
            OneLessThetaSquared = 1 - theta2;
            SevenThetaSquaredLess1 = (7 * theta2) - 1;
            AyFactor = -0.5 * gravity.J3OverJ2 * SinI;

            // 1 + cos i is 0 for a retrograde equatorial orbit.
            double denominator = Math.Abs(CosI + 1) > LeastDenominator ? 1 + CosI : LeastDenominator;
            LongitudeFactor = -0.25 * gravity.J3OverJ2 * SinI * (3 + (5 * CosI)) / denominator;
        }

        public double SinI { get; }

        public double CosI { get; }

        public double ThreeThetaSquaredLess1 { get; }

        public double OneLessThetaSquared { get; }

        public double SevenThetaSquaredLess1 { get; }

        public double AyFactor { get; }

        public double LongitudeFactor { get; }
    }
}
