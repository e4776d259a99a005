using MathNet.Numerics.Integration;
using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// Points and weights for the mean over a normal jitter in two axes, in polar coordinates about the mean pointing:
/// Gauss-Legendre in the radius to 5.5 rms angles (all but 7e-14 of the probability), equal steps in the direction.
/// Only the half-plane on one side of the offset is kept; the other mirrors it.
/// </summary>
internal sealed class JitterQuadrature
{
    private const double RadiiInRms = 5.5;
    private readonly double[] along;
    private readonly double[] across;
    private readonly double[] weights;

    private JitterQuadrature(int radii, int directions)
    {
        var rule = new GaussLegendreRule(0, RadiiInRms, radii);
        int half = directions / 2;
        along = new double[radii * half];
        across = new double[radii * half];
        weights = new double[radii * half];
        for (int i = 0; i < weights.Length; i++)
        {
            double radius = rule.GetAbscissa(i / half);
            (double sine, double cosine) = Math.SinCos(Math.PI * ((i % half) + 0.5) / half);
            (along[i], across[i]) = (radius * cosine, radius * sine);
            weights[i] = rule.GetWeight(i / half) * radius * Math.Exp(-radius * radius);
        }

        double sum = weights.Sum();
        for (int i = 0; i < weights.Length; i++)
        {
            weights[i] /= sum;
        }
    }

    /// <summary>Good to 1e-6 dB for a Gaussian beam, offset and jitter up to its half-power width.</summary>
    public static JitterQuadrature Fine { get; } = new(radii: 32, directions: 24);

    /// <summary>For far lobes, where a mean is wanted but not its last tenth of a decibel.</summary>
    public static JitterQuadrature Coarse { get; } = new(radii: 12, directions: 12);

    /// <summary>Mean gain of a pattern that is the same for every phi, dBi.</summary>
    public double MeanDbi(Func<double, double> gainDbi, double offAxisRad, double jitterRmsRad)
    {
        double mean = 0;
        for (int i = 0; i < weights.Length; i++)
        {
            mean += weights[i] * Decibel.ToRatio(gainDbi(Angle(i, offAxisRad, jitterRmsRad)));
        }

        return Decibel.FromRatio(mean);
    }

    /// <summary>Mean gain of any pattern, dBi.</summary>
    public double MeanDbi(AntennaPattern pattern, double offAxisRad, double phiRad, double jitterRmsRad)
    {
        double mean = 0;
        for (int i = 0; i < weights.Length; i++)
        {
            double angle = Angle(i, offAxisRad, jitterRmsRad);
            double turn = Math.Atan2(jitterRmsRad * across[i], offAxisRad + (jitterRmsRad * along[i]));
            mean += weights[i] / 2 * (Decibel.ToRatio(pattern.GainDbi(angle, phiRad + turn)) + Decibel.ToRatio(pattern.GainDbi(angle, phiRad - turn)));
        }

        return Decibel.FromRatio(mean);
    }

    private double Angle(int point, double offAxisRad, double jitterRmsRad)
    {
        double x = offAxisRad + (jitterRmsRad * along[point]);
        double y = jitterRmsRad * across[point];
        return Math.Min(Math.PI, Math.Sqrt((x * x) + (y * y)));
    }
}
