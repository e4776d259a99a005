namespace PassPlanner.Physics.Orbits;

/// <summary>
/// What SDP4 adds for periods of 225 minutes and more: secular rates by Sun and Moon, resonance with the Earth's
/// rotation, and the lunisolar periodics (the routines DSINIT and DSPACE of AIAA 2006-6753). Angles in rad, time in min.
/// </summary>
internal sealed class Sgp4DeepSpace
{
    /// <summary>Rotation of the Earth, rad/min.</summary>
    public const double EarthRotation = 4.37526908801129966e-3;

    /// <summary>Within three degrees of the equator the node's rate by Sun and Moon is left out, rad.</summary>
    private const double EquatorialInclination = 5.2359877e-2;

    private readonly double eDot;
    private readonly double iDot;
    private readonly double mDot;
    private readonly double omegaDot;
    private readonly double nodeDot;
    private readonly double siderealTime0;
    private readonly Sgp4Resonance? resonance;

    /// <summary>Computes the deep-space constants.</summary>
    /// <param name="c">The near-earth constants of the set.</param>
    /// <param name="gravity">Gravity model.</param>
    /// <param name="days1950">Epoch in days since 1950 January 0.0 UTC.</param>
    /// <param name="siderealTime0">Greenwich sidereal time at epoch, rad.</param>
    public Sgp4DeepSpace(Sgp4NearEarthConstants c, GravityModel gravity, double days1950, double siderealTime0)
    {
        this.siderealTime0 = siderealTime0;
        double days1900 = days1950 + 18261.5;
        var sun = Sgp4ThirdBody.Sun(c, days1900);
        var moon = Sgp4ThirdBody.Moon(c, days1900);
        Periodics = new Sgp4LunisolarPeriodics(c, sun, moon);

        bool equatorial = c.I0 < EquatorialInclination || c.I0 > Math.PI - EquatorialInclination;
        foreach (Sgp4ThirdBody b in (ReadOnlySpan<Sgp4ThirdBody>)[sun, moon])
        {
            double n = b.MeanMotion;
            eDot += b.S1 * n * b.S5;
            iDot += b.S2 * n * (b.Z11 + b.Z13);
            mDot -= n * b.S3 * (b.Z1 + b.Z3 - 14.0 - (6.0 * c.E0 * c.E0));
            double g = b.S4 * n * (b.Z31 + b.Z33 - 6.0);
            double nodeTimesSinI = equatorial ? 0.0 : -n * b.S2 * (b.Z21 + b.Z23);
            double node = c.SinI0 != 0.0 ? nodeTimesSinI / c.SinI0 : 0.0;
            nodeDot += node;
            omegaDot += g - (c.CosI0 * node);
        }

        resonance = Sgp4Resonance.TryCreate(c, gravity, siderealTime0 % (2.0 * Math.PI), mDot, omegaDot, nodeDot);
    }

    /// <summary>The periodic effects of Sun and Moon.</summary>
    public Sgp4LunisolarPeriodics Periodics { get; }

    /// <summary>Adds the secular effects, and replaces mean anomaly and mean motion where the orbit is in resonance.</summary>
    /// <param name="minutes">Time since epoch, min.</param>
    /// <param name="sweep">Where the integrator stands; left where it ends.</param>
    /// <param name="e">Eccentricity.</param>
    /// <param name="i">Inclination, rad.</param>
    /// <param name="node">Node, rad.</param>
    /// <param name="omega">Argument of perigee, rad.</param>
    /// <param name="m">Mean anomaly, rad.</param>
    /// <param name="n">Mean motion, rad/min.</param>
    public void ApplySecular(
        double minutes, ref Sgp4Sweep sweep, ref double e, ref double i, ref double node, ref double omega, ref double m, ref double n)
    {
        e += eDot * minutes;
        i += iDot * minutes;
        omega += omegaDot * minutes;
        node += nodeDot * minutes;
        m += mDot * minutes;
        if (resonance is not null)
        {
            double theta = (siderealTime0 + (minutes * EarthRotation)) % (2.0 * Math.PI);
            double longitude = resonance.Integrate(minutes, ref sweep, out n);
            m = resonance.IsHalfDay
                ? longitude - (2.0 * node) + (2.0 * theta)
                : longitude - node - omega + theta;
        }
    }
}
