using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// A thin half-wave dipole in free space, its wire along phi = 0 (antenna +x), so that the boresight lies in the
/// plane of greatest gain: cos^2((pi/2) cos g) / sin^2 g, g being the angle to the wire
/// (Balanis, Antenna Theory, 4th edition, equation 4-84).
/// </summary>
public sealed class HalfWaveDipolePattern : AntennaPattern
{
    /// <summary>
    /// Directivity as a ratio, 4 / Cin(2 pi) with Cin(2 pi) = 2.437653393 (Balanis, equation 4-91): 1.6409, 2.151 dBi.
    /// The textbook 1.643 comes of Cin(2 pi) taken as 2.435.
    /// </summary>
    public const double Directivity = 4 / 2.4376533930;

    /// <summary>A half-wave dipole with or without ohmic loss.</summary>
    /// <param name="gainDbi">Peak gain, dBi, -100 to 2.16 (the textbook figures 2.15 and 1.643 among them); left out, it follows from the efficiency.</param>
    /// <param name="ohmicEfficiency">Gain over directivity, above 0 and at most 1; left out, it follows from the gain, else 1.</param>
    /// <exception cref="ArgumentException">Both are given, or one is out of range.</exception>
    public HalfWaveDipolePattern(double? gainDbi = null, double? ohmicEfficiency = null)
    {
        if (gainDbi is not null && ohmicEfficiency is not null)
        {
            throw new ArgumentException("ohmicEfficiency must be left out when gainDbi is given: one follows from the other", nameof(ohmicEfficiency));
        }

        double directivityDbi = Decibel.FromRatio(Directivity);
        double? gain = RangeCheck.WithinIfGiven(gainDbi, MinimumGainDbi, Math.Round(directivityDbi, 2, MidpointRounding.ToPositiveInfinity), nameof(gainDbi), "dBi");
        OhmicEfficiency = gain is { } entered
            ? Decibel.ToRatio(entered - directivityDbi)
            : RangeCheck.AboveZeroIfGiven(ohmicEfficiency, 1, nameof(ohmicEfficiency), "") ?? 1;
        PeakGainDbi = gain ?? directivityDbi + Decibel.FromRatio(OhmicEfficiency);
    }

    /// <inheritdoc/>
    public override double PeakGainDbi { get; }

    /// <inheritdoc/>
    public override bool IsRotationallySymmetric => false;

    /// <inheritdoc/>
    public override double OhmicEfficiency { get; }

    /// <inheritdoc/>
    public override double AngularScaleRad => 0.5;

    /// <inheritdoc/>
    protected override double EvaluateDbi(double offAxisRad, double phiRad)
    {
        double cosToWire = Math.Sin(offAxisRad) * Math.Cos(phiRad);
        double sinSquared = 1 - (cosToWire * cosToWire);
        if (sinSquared < 1e-12)
        {
            return MinimumGainDbi;
        }

        double field = Math.Cos(Math.PI / 2 * cosToWire);
        return PeakGainDbi + Decibel.FromRatio(field * field / sinSquared);
    }
}
