using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// The mean gain of an antenna whose pointing jitters: normal in each of two axes across the boresight, both with the
/// same deviation, so that the angle's rms over both is <c>jitterRmsRad</c> (per axis, that over the square root of 2).
/// </summary>
/// <remarks>
/// A Gaussian beam has a closed form. Otherwise the mean of the power is taken by quadrature over both axes, the sky
/// being taken as flat across the jitter (the distance from the boresight then has a Rice distribution). Against the
/// closed form it is good to 1e-6 dB for offset and jitter up to the half-power width.
/// </remarks>
public sealed class JitterAveragedPattern : AntennaPattern
{
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

    /// <inheritdoc/>
    protected override double EvaluateDbi(double offAxisRad, double phiRad) => (pattern, jitterRmsRad) switch
    {
        (_, 0) => pattern.GainDbi(offAxisRad, phiRad),
        (GaussianBeamPattern beam, _) => beam.MeanGainDbi(offAxisRad, jitterRmsRad),
        _ => JitterQuadrature.Fine.MeanDbi(pattern, offAxisRad, phiRad, jitterRmsRad),
    };
}
