using MathNet.Numerics.Integration;
using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// The mean gain of an antenna whose pointing jitters: normal in each of two axes across the boresight, both with the
/// same deviation, so that the angle's rms over both is <c>jitterRmsRad</c> (per axis, that over the square root of 2).
/// </summary>
/// <remarks>
/// A Gaussian beam has a closed form. Otherwise the mean of the power is taken by quadrature in polar coordinates about
/// the mean pointing: Gauss-Legendre in the radius to 5.5 rms angles (all but 7e-14 of the probability), equal steps in
/// the direction. The sky is taken as flat across the jitter. The distance from the boresight then has a Rice
/// distribution. Against the closed form it is good to 1e-6 dB for jitter up to the half-power width.
/// </remarks>
public sealed class JitterAveragedPattern : AntennaPattern
{
    private const double RadiiInRms = 5.5;
    private const int Directions = 16;
    private static readonly GaussLegendreRule RadiusRule = new(0, RadiiInRms, 32);

    private readonly AntennaPattern pattern;
    private readonly double jitterRmsRad;

    /// <summary>The mean over jitter of a pattern.</summary>
    /// <param name="pattern">The pattern without jitter.</param>
    /// <param name="jitterRmsRad">Rms of the jitter's angle on the sky, both axes together, rad, 0 to 0.2.</param>
    /// <exception cref="ArgumentOutOfRangeException">The jitter is out of range.</exception>
    public JitterAveragedPattern(AntennaPattern pattern, double jitterRmsRad)
    {
        this.pattern = pattern;
        this.jitterRmsRad = RangeCheck.Within(jitterRmsRad, 0, 0.2, nameof(jitterRmsRad), "rad");
        PeakGainDbi = pattern.IsRotationallySymmetric ? GainDbi(0, 0) : pattern.PeakGainDbi;
    }

    /// <summary>Mean gain on the boresight of a symmetrical pattern, dBi; of another one, the peak without jitter.</summary>
    public override double PeakGainDbi { get; }

    /// <inheritdoc/>
    public override bool IsRotationallySymmetric => pattern.IsRotationallySymmetric;

    /// <inheritdoc/>
    public override double OhmicEfficiency => pattern.OhmicEfficiency;

    /// <inheritdoc/>
    public override double AngularScaleRad => pattern.AngularScaleRad;

    /// <inheritdoc/>
    internal override IReadOnlyList<double> KinkAnglesRad => pattern.KinkAnglesRad;

    /// <inheritdoc/>
    internal override IReadOnlyList<double> KinkPhisRad => pattern.KinkPhisRad;

    /// <summary>The mean by quadrature, whatever the pattern, dBi.</summary>
    /// <param name="gainDbi">Gain by off-axis angle and phi, dBi.</param>
    /// <param name="offAxisRad">Offset of the mean pointing, rad, 0 to pi.</param>
    /// <param name="phiRad">Direction of the offset, rad.</param>
    /// <param name="jitterRmsRad">Rms of the jitter's angle on the sky, rad.</param>
    public static double MeanByQuadratureDbi(Func<double, double, double> gainDbi, double offAxisRad, double phiRad, double jitterRmsRad)
    {
        double mean = 0;
        double probability = 0;
        for (int i = 0; i < RadiusRule.Order; i++)
        {
            double radius = RadiusRule.GetAbscissa(i);
            double weight = RadiusRule.GetWeight(i) * 2 * radius * Math.Exp(-radius * radius);
            double ring = 0;
            for (int k = 0; k < Directions; k++)
            {
                (double sine, double cosine) = Math.SinCos(2 * Math.PI * (k + 0.5) / Directions);
                double along = offAxisRad + (jitterRmsRad * radius * cosine);
                double across = jitterRmsRad * radius * sine;
                double angle = Math.Min(Math.PI, Math.Sqrt((along * along) + (across * across)));
                ring += Decibel.ToRatio(gainDbi(angle, phiRad + Math.Atan2(across, along)));
            }

            mean += weight * ring / Directions;
            probability += weight;
        }

        return Decibel.FromRatio(mean / probability);
    }

    /// <inheritdoc/>
    protected override double EvaluateDbi(double offAxisRad, double phiRad) => (pattern, jitterRmsRad) switch
    {
        (_, 0) => pattern.GainDbi(offAxisRad, phiRad),
        (GaussianBeamPattern beam, _) => beam.MeanGainDbi(offAxisRad, jitterRmsRad),
        _ => MeanByQuadratureDbi(pattern.GainDbi, offAxisRad, phiRad, jitterRmsRad),
    };
}
