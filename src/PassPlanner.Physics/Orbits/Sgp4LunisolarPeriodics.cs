namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Long-period effects of the Sun and the Moon on the mean elements (the routine DPPER of AIAA 2006-6753, in its
/// improved mode: the choice of Lyddane's form rests on the perturbed inclination).
/// </summary>
internal sealed class Sgp4LunisolarPeriodics
{
    /// <summary>Below this inclination Lyddane's form avoids the division by its sine, rad.</summary>
    private const double LyddaneInclination = 0.2;

    private readonly Body sun;
    private readonly Body moon;

    public Sgp4LunisolarPeriodics(Sgp4NearEarthConstants c, in Sgp4ThirdBody sun, in Sgp4ThirdBody moon)
    {
        this.sun = new Body(sun, c.E0 * c.E0);
        this.moon = new Body(moon, c.E0 * c.E0);
    }

    /// <summary>Adds the periodic effects at a time to eccentricity, inclination, node, perigee and mean anomaly.</summary>
    /// <param name="minutesSinceEpoch">Time since epoch, min.</param>
    /// <param name="e">Eccentricity.</param>
    /// <param name="i">Inclination, rad.</param>
    /// <param name="node">Right ascension of the node, rad.</param>
    /// <param name="omega">Argument of perigee, rad.</param>
    /// <param name="m">Mean anomaly, rad.</param>
    public void Apply(double minutesSinceEpoch, ref double e, ref double i, ref double node, ref double omega, ref double m)
    {
        double deltaE = 0, deltaI = 0, deltaL = 0, deltaG = 0, deltaH = 0;
        sun.AddTo(minutesSinceEpoch, ref deltaE, ref deltaI, ref deltaL, ref deltaG, ref deltaH);
        moon.AddTo(minutesSinceEpoch, ref deltaE, ref deltaI, ref deltaL, ref deltaG, ref deltaH);
        e += deltaE;
        i += deltaI;
        (double sinI, double cosI) = Math.SinCos(i);
        if (i >= LyddaneInclination)
        {
            double deltaNode = deltaH / sinI;
            omega += deltaG - (cosI * deltaNode);
            node += deltaNode;
            m += deltaL;
            return;
        }

        (double sinNode, double cosNode) = Math.SinCos(node);
        double alpha = (sinI * sinNode) + (deltaH * cosNode) + (deltaI * cosI * sinNode);
        double beta = (sinI * cosNode) - (deltaH * sinNode) + (deltaI * cosI * cosNode);
        double oldNode = node % (2.0 * Math.PI);
        double longitude = m + omega + (cosI * oldNode) + deltaL + deltaG - (deltaI * oldNode * sinI);
        node = Math.Atan2(alpha, beta);
        if (Math.Abs(oldNode - node) > Math.PI)
        {
            node += node < oldNode ? 2.0 * Math.PI : -2.0 * Math.PI;
        }

        m += deltaL;
        omega = longitude - m - (cosI * node);
    }

    /// <summary>Amplitudes of one body's effects on e, i, mean anomaly (L), perigee (G) and node (H).</summary>
    private readonly struct Body
    {
        private readonly double m0, n, eccentricity;
        private readonly double e2, e3, i2, i3, l2, l3, l4, g2, g3, g4, h2, h3;

        public Body(in Sgp4ThirdBody b, double orbitE2)
        {
            m0 = b.MeanAnomaly0;
            n = b.MeanMotion;
            eccentricity = b.Eccentricity;
            e2 = 2.0 * b.S1 * b.S6;
            e3 = 2.0 * b.S1 * b.S7;
            i2 = 2.0 * b.S2 * b.Z12;
            i3 = 2.0 * b.S2 * (b.Z13 - b.Z11);
            l2 = -2.0 * b.S3 * b.Z2;
            l3 = -2.0 * b.S3 * (b.Z3 - b.Z1);
            l4 = -2.0 * b.S3 * (-21.0 - (9.0 * orbitE2)) * b.Eccentricity;
            g2 = 2.0 * b.S4 * b.Z32;
            g3 = 2.0 * b.S4 * (b.Z33 - b.Z31);
            g4 = -18.0 * b.S4 * b.Eccentricity;
            h2 = -2.0 * b.S2 * b.Z22;
            h3 = -2.0 * b.S2 * (b.Z23 - b.Z21);
        }

        public void AddTo(double minutes, ref double deltaE, ref double deltaI, ref double deltaL, ref double deltaG, ref double deltaH)
        {
            double meanAnomaly = m0 + (n * minutes);
            double f = meanAnomaly + (2.0 * eccentricity * Math.Sin(meanAnomaly));
            (double sinF, double cosF) = Math.SinCos(f);
            double f2 = (0.5 * sinF * sinF) - 0.25;
            double f3 = -0.5 * sinF * cosF;
            deltaE += (e2 * f2) + (e3 * f3);
            deltaI += (i2 * f2) + (i3 * f3);
            deltaL += (l2 * f2) + (l3 * f3) + (l4 * sinF);
            deltaG += (g2 * f2) + (g3 * f3) + (g4 * sinF);
            deltaH += (h2 * f2) + (h3 * f3);
        }
    }
}
