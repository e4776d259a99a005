using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// The same gain in every direction. Its directivity is 0 dBi; an entered gain below 0 is ohmic loss, one above 0 is
/// an assumption that no antenna meets over the whole sphere.
/// </summary>
public sealed class IsotropicPattern : AntennaPattern
{
    /// <summary>A pattern of one gain.</summary>
    /// <param name="gainDbi">Gain, dBi, -100 to 100.</param>
    /// <exception cref="ArgumentOutOfRangeException">The gain is out of range.</exception>
    public IsotropicPattern(double gainDbi = 0) =>
        PeakGainDbi = RangeCheck.Within(gainDbi, MinimumGainDbi, 100, nameof(gainDbi), "dBi");

    /// <inheritdoc/>
    public override double PeakGainDbi { get; }

    /// <inheritdoc/>
    public override bool IsRotationallySymmetric => true;

    /// <inheritdoc/>
    public override double OhmicEfficiency => Decibel.ToRatio(PeakGainDbi);

    /// <inheritdoc/>
    public override double AngularScaleRad => 1;

    /// <inheritdoc/>
    protected override double EvaluateDbi(double offAxisRad, double phiRad) => PeakGainDbi;
}
