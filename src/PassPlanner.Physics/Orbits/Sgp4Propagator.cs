using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Propagation of one element set by SGP4, with its deep-space part SDP4 for periods of 225 minutes and more.
/// Written from Spacetrack Report #3 (Hoots and Roehrich, 1980) as revised in AIAA 2006-6753 (Vallado, Crawford,
/// Hujsak and Kelso), improved mode. The object is immutable: any number of threads may use it at once.
/// Agreement with the published verification set: 1e-6 km and 1e-9 km/s. The velocity is that of the theory,
/// which is not exactly the derivative of the position (by less than 0.1 m/s in ordinary low orbits).
/// </summary>
public sealed class Sgp4Propagator
{
    private const double TwoPi = 2.0 * Math.PI;
    private const int KeplerIterations = 10;
    private const double KeplerTolerance = 1.0e-12;

    private readonly GravityModel gravity;
    private readonly Sgp4NearEarthConstants c;
    private readonly Sgp4DeepSpace? deepSpace;

    /// <summary>Prepares the propagation of an element set with the WGS-72 constants that public sets are made with.</summary>
    /// <param name="elements">Mean elements; see <see cref="ElementSet"/> for units and ranges.</param>
    /// <exception cref="ArgumentOutOfRangeException">An element is not finite or outside its range.</exception>
    public Sgp4Propagator(ElementSet elements)
        : this(elements, GravityModel.Wgs72)
    {
    }

    /// <summary>Prepares the propagation of an element set that was made with another gravity model.</summary>
    /// <param name="elements">Mean elements; see <see cref="ElementSet"/> for units and ranges.</param>
    /// <param name="gravity">The model that the set was fitted with.</param>
    /// <exception cref="ArgumentOutOfRangeException">An element is not finite or outside its range.</exception>
    public Sgp4Propagator(ElementSet elements, GravityModel gravity)
    {
        ArgumentNullException.ThrowIfNull(elements);
        ArgumentNullException.ThrowIfNull(gravity);
        Check(elements);
        Elements = elements;
        this.gravity = gravity;
        c = new Sgp4NearEarthConstants(elements, gravity);
        if (c.IsDeepSpace)
        {
            JulianDateUt1 epoch = elements.EpochUtc.ToUt1(0.0);

            // One double on purpose: the published code rounds the epoch's Julian date so (to 40 microseconds), and the
            // published states of orbits that the Moon disturbs strongly show it (23333: 4 mm at perigee).
            double julianDate = epoch.Day + epoch.FractionOfDay;
            double days1950 = julianDate - 2433281.5;
            deepSpace = new Sgp4DeepSpace(c, gravity, days1950, EarthRotation.Gmst82Rad(epoch));
        }
    }

    /// <summary>The element set that is propagated.</summary>
    public ElementSet Elements { get; }

    /// <summary>Whether the deep-space part is in use: a period of 225 minutes or more.</summary>
    public bool IsDeepSpace => c.IsDeepSpace;

    /// <summary>Original mean motion n0'' (Brouwer), rad/min.</summary>
    public double MeanMotionRadPerMin => c.N0;

    /// <summary>State at a time.</summary>
    /// <param name="minutesSinceEpoch">Time since the epoch of the set, min; negative before it.</param>
    /// <param name="state">Position, km, and velocity, km/s, TEME; the default value when the status is not Ok.</param>
    /// <returns>Ok, or why there is no state.</returns>
    public Sgp4Status TryPropagate(double minutesSinceEpoch, out TemeState state)
    {
        Sgp4Sweep sweep = default;
        return TryPropagate(minutesSinceEpoch, ref sweep, out state);
    }

    /// <summary>State at a time, for a caller who steps through time; the same answer as without the sweep, sooner.</summary>
    /// <param name="minutesSinceEpoch">Time since the epoch of the set, min; negative before it.</param>
    /// <param name="sweep">State of the caller's sweep.</param>
    /// <param name="state">Position, km, and velocity, km/s, TEME; the default value when the status is not Ok.</param>
    /// <returns>Ok, or why there is no state.</returns>
    public Sgp4Status TryPropagate(double minutesSinceEpoch, ref Sgp4Sweep sweep, out TemeState state)
    {
        state = default;
        if (!ReferenceEquals(sweep.Owner, this))
        {
            sweep = new Sgp4Sweep { Owner = this };
        }

        Sgp4Status status = MeanElementsAt(minutesSinceEpoch, ref sweep, out MeanElements mean);
        return status != Sgp4Status.Ok ? status : ToState(mean, out state);
    }

    /// <summary>Secular effects of gravity and drag, then the long-period effects of Sun and Moon.</summary>
    private Sgp4Status MeanElementsAt(double t, ref Sgp4Sweep sweep, out MeanElements mean)
    {
        mean = default;
        double mDf = c.M0 + (c.MDot * t);
        double omega = c.Omega0 + (c.OmegaDot * t);
        double t2 = t * t;
        double node = c.Node0 + (c.NodeDot * t) + (c.NodeDrag * t2);
        double m = mDf;
        double aFactor = 1.0 - (c.C1 * t);
        double eDrag = c.BStar * c.C4 * t;
        double lDrag = c.T2 * t2;
        if (!c.HasSimpleDrag)
        {
            double deltaM = 1.0 + (c.Eta * Math.Cos(mDf));
            double shift = (c.OmegaDrag * t) + (c.MDrag * ((deltaM * deltaM * deltaM) - c.DeltaM0));
            m = mDf + shift;
            omega -= shift;
            double t3 = t2 * t;
            double t4 = t3 * t;
            aFactor -= (c.D2 * t2) + (c.D3 * t3) + (c.D4 * t4);
            eDrag += c.BStar * c.C5 * (Math.Sin(m) - c.SinM0);
            lDrag += (c.T3 * t3) + (t4 * (c.T4 + (t * c.T5)));
        }

        double n = c.N0;
        double e = c.E0;
        double i = c.I0;
        deepSpace?.ApplySecular(t, ref sweep, ref e, ref i, ref node, ref omega, ref m, ref n);
        if (n <= 0.0)
        {
            return Sgp4Status.MeanMotionNotPositive;
        }

        double aRoot = Math.Cbrt(gravity.RootMuPerMin / n) * aFactor;
        double a = aRoot * aRoot;
        n = gravity.RootMuPerMin / (a * Math.Sqrt(a));
        e -= eDrag;
        if (e is >= 1.0 or < -0.001 || !double.IsFinite(e))
        {
            return Sgp4Status.MeanEccentricityOutOfRange;
        }

        e = Math.Max(e, 1.0e-6);
        m += c.N0 * lDrag;
        double longitude = (m + omega + node) % TwoPi;
        node %= TwoPi;
        omega %= TwoPi;
        m = (longitude - omega - node) % TwoPi;
        if (deepSpace is not null)
        {
            deepSpace.Periodics.Apply(t, ref e, ref i, ref node, ref omega, ref m);
            if (i < 0.0)
            {
                i = -i;
                node += Math.PI;
                omega -= Math.PI;
            }

            if (e is < 0.0 or > 1.0)
            {
                return Sgp4Status.PerturbedEccentricityOutOfRange;
            }
        }

        mean = new MeanElements(a, n, e, i, node, omega, m);
        return Sgp4Status.Ok;
    }

    /// <summary>Long-period effects of J3, Kepler's equation, short-period effects of J2, and the vectors.</summary>
    private Sgp4Status ToState(in MeanElements mean, out TemeState state)
    {
        state = default;
        InclinationTerms inclination = deepSpace is null
            ? new InclinationTerms(c)
            : new InclinationTerms(mean.I, gravity.J3OverJ2);

        // Long-period periodics.
        (double sinOmega, double cosOmega) = Math.SinCos(mean.Omega);
        double pInverse = 1.0 / (mean.A * (1.0 - (mean.E * mean.E)));
        double axN = mean.E * cosOmega;
        double ayN = (mean.E * sinOmega) + (pInverse * inclination.ALong);
        double longitude = mean.M + mean.Omega + mean.Node + (pInverse * inclination.LLong * axN);

        // Kepler's equation for E + omega.
        double u = (longitude - mean.Node) % TwoPi;
        (double sinE, double cosE) = SolveKepler(u, axN, ayN);

        // Preliminary quantities for the short-period periodics.
        double eCosE = (axN * cosE) + (ayN * sinE);
        double eSinE = (axN * sinE) - (ayN * cosE);
        double e2 = (axN * axN) + (ayN * ayN);
        double p = mean.A * (1.0 - e2);
        if (p < 0.0)
        {
            return Sgp4Status.SemiLatusRectumNegative;
        }

        double r = mean.A * (1.0 - eCosE);
        double rDot = Math.Sqrt(mean.A) * eSinE / r;
        double rVDot = Math.Sqrt(p) / r;
        double beta = Math.Sqrt(1.0 - e2);
        double fraction = eSinE / (1.0 + beta);
        double sinU = mean.A / r * (sinE - ayN - (axN * fraction));
        double cosU = mean.A / r * (cosE - axN + (ayN * fraction));
        double uNorm = 1.0 / Math.Sqrt((sinU * sinU) + (cosU * cosU));
        double sin2U = 2.0 * cosU * sinU;
        double cos2U = 1.0 - (2.0 * sinU * sinU);
        double k2 = 0.5 * gravity.J2 / p;
        double k2OverP = k2 / p;

        // Short-period periodics of J2.
        double rk = (r * (1.0 - (1.5 * k2OverP * beta * inclination.ThreeTheta2Minus1)))
            + (0.5 * k2 * inclination.OneMinusTheta2 * cos2U);
        double deltaU = -0.25 * k2OverP * inclination.SevenTheta2Minus1 * sin2U;
        double deltaNode = 1.5 * k2OverP * inclination.CosI * sin2U;
        double deltaI = 1.5 * k2OverP * inclination.CosI * inclination.SinI * cos2U;
        double rkDot = rDot - (mean.N * k2 * inclination.OneMinusTheta2 * sin2U / gravity.RootMuPerMin);
        double rVkDot = rVDot + (mean.N * k2
            * ((inclination.OneMinusTheta2 * cos2U) + (1.5 * inclination.ThreeTheta2Minus1)) / gravity.RootMuPerMin);
        if (!(rk >= 1.0))
        {
            return Sgp4Status.Decayed;
        }

        // Unit vectors along and across the radius, from the corrected angles.
        (double sinUk, double cosUk) = Turn(sinU * uNorm, cosU * uNorm, deltaU);
        (double sinIk, double cosIk) = Turn(inclination.SinI, inclination.CosI, deltaI);
        (double sinNode, double cosNode) = Math.SinCos(mean.Node + deltaNode);
        double mx = -sinNode * cosIk;
        double my = cosNode * cosIk;
        var radial = new Vector3D((mx * sinUk) + (cosNode * cosUk), (my * sinUk) + (sinNode * cosUk), sinIk * sinUk);
        var transverse = new Vector3D((mx * cosUk) - (cosNode * sinUk), (my * cosUk) - (sinNode * sinUk), sinIk * cosUk);
        double speed = gravity.CanonicalSpeedKmPerS;
        state = new TemeState(
            radial * (rk * gravity.EarthRadiusKm),
            (radial * (rkDot * speed)) + (transverse * (rVkDot * speed)));
        return Sgp4Status.Ok;
    }

    private static (double Sin, double Cos) SolveKepler(double u, double axN, double ayN)
    {
        double angle = u;
        double correction = double.MaxValue;
        double sin = 0.0, cos = 1.0;
        for (int k = 0; k < KeplerIterations && Math.Abs(correction) >= KeplerTolerance; k++)
        {
            (sin, cos) = Math.SinCos(angle);
            double derivative = 1.0 - (cos * axN) - (sin * ayN);
            correction = (u - (ayN * cos) + (axN * sin) - angle) / derivative;
            correction = Math.Clamp(correction, -0.95, 0.95);
            angle += correction;
        }

        return (sin, cos);
    }

    /// <summary>Sine and cosine of an angle turned by a small correction, without the angle itself; exact to rounding.</summary>
    private static (double Sin, double Cos) Turn(double sin, double cos, double delta)
    {
        double sinDelta, cosDelta;
        if (Math.Abs(delta) < 0.005)
        {
            double d2 = delta * delta;
            sinDelta = delta * (1.0 - (d2 / 6.0 * (1.0 - (d2 / 20.0))));
            cosDelta = 1.0 - (d2 / 2.0 * (1.0 - (d2 / 12.0 * (1.0 - (d2 / 30.0)))));
        }
        else
        {
            (sinDelta, cosDelta) = Math.SinCos(delta);
        }

        return ((sin * cosDelta) + (cos * sinDelta), (cos * cosDelta) - (sin * sinDelta));
    }

    private static void Check(ElementSet elements)
    {
        Require(elements.MeanMotionRevPerDay is > 0.0 and <= 20.0, nameof(elements.MeanMotionRevPerDay), elements.MeanMotionRevPerDay, "rev/day, above 0 and at most 20");
        Require(elements.Eccentricity is >= 0.0 and < 1.0, nameof(elements.Eccentricity), elements.Eccentricity, "at least 0 and below 1");
        Require(elements.InclinationDeg is >= 0.0 and <= 180.0, nameof(elements.InclinationDeg), elements.InclinationDeg, "degrees, 0 to 180");
        Require(double.IsFinite(elements.RightAscensionOfNodeDeg), nameof(elements.RightAscensionOfNodeDeg), elements.RightAscensionOfNodeDeg, "degrees, finite");
        Require(double.IsFinite(elements.ArgumentOfPerigeeDeg), nameof(elements.ArgumentOfPerigeeDeg), elements.ArgumentOfPerigeeDeg, "degrees, finite");
        Require(double.IsFinite(elements.MeanAnomalyDeg), nameof(elements.MeanAnomalyDeg), elements.MeanAnomalyDeg, "degrees, finite");
        Require(double.IsFinite(elements.BStarPerEarthRadius), nameof(elements.BStarPerEarthRadius), elements.BStarPerEarthRadius, "per Earth radius, finite");
    }

    private static void Require(bool holds, string name, double value, string range)
    {
        if (!holds)
        {
            throw new ArgumentOutOfRangeException(name, value, $"{name} must be {range}.");
        }
    }

    /// <summary>Mean elements at a time: Earth radii, rad/min, rad.</summary>
    private readonly record struct MeanElements(double A, double N, double E, double I, double Node, double Omega, double M);

    /// <summary>Functions of the inclination: constant near the Earth, perturbed by Sun and Moon in deep space.</summary>
    private readonly struct InclinationTerms
    {
        public readonly double SinI, CosI, ThreeTheta2Minus1, OneMinusTheta2, SevenTheta2Minus1, ALong, LLong;

        public InclinationTerms(Sgp4NearEarthConstants c)
        {
            SinI = c.SinI0;
            CosI = c.CosI0;
            ThreeTheta2Minus1 = c.ThreeTheta2Minus1;
            OneMinusTheta2 = c.OneMinusTheta2;
            SevenTheta2Minus1 = c.SevenTheta2Minus1;
            ALong = c.ALong;
            LLong = c.LLong;
        }

        public InclinationTerms(double i, double j3OverJ2)
        {
            (SinI, CosI) = Math.SinCos(i);
            double theta2 = CosI * CosI;
            ThreeTheta2Minus1 = (3.0 * theta2) - 1.0;
            OneMinusTheta2 = 1.0 - theta2;
            SevenTheta2Minus1 = (7.0 * theta2) - 1.0;
            ALong = Sgp4NearEarthConstants.LongPeriodA(SinI, j3OverJ2);
            LLong = Sgp4NearEarthConstants.LongPeriodL(SinI, CosI, j3OverJ2);
        }
    }
}
