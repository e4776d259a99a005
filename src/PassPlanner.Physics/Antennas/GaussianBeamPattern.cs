using MathNet.Numerics.RootFinding;
using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// A beam whose gain falls by 12 (angle / half-power width)^2 dB from its peak down to a floor. Directivity is that of
/// the beam without its floor: the floor is an envelope for directions far off the beam, not radiated power.
/// </summary>
/// <remarks>
/// 12 dB is the rounded form of 40 log10 2 = 12.041 dB: at the edge of the entered width the gain is 3.000 dB below
/// the peak, and the exact half power (3.0103 dB) lies 0.17 percent further out.
/// </remarks>
public sealed class GaussianBeamPattern : AntennaPattern
{
    /// <summary>How far the default floor lies below the peak, dB.</summary>
    public const double DefaultFloorBelowPeakDb = 30;

    private const double NarrowestDeg = 0.001;
    private const double WidestDeg = 360;
    private readonly double dbPerRad2;

    /// <summary>
    /// A beam of a gain and a width. Left out, one follows from the other: the peak's directivity is found by
    /// integrating the beam over the sphere, and gain is directivity times ohmic efficiency. With both, the two stand as entered.
    /// </summary>
    /// <param name="gainDbi">Peak gain, dBi, -100 to 100.</param>
    /// <param name="halfPowerBeamwidthDeg">Full width between the points 3 dB below the peak, degrees, 0.001 to 360.</param>
    /// <param name="floorDbi">Lowest gain, dBi, -100 to the peak; left out, 30 dB below the peak.</param>
    /// <param name="ohmicEfficiency">Gain over directivity, above 0 and at most 1; left out, 1 (with both gain and width: what they imply).</param>
    /// <exception cref="ArgumentException">A value is out of range, neither gain nor width is given, or all three are.</exception>
    public GaussianBeamPattern(
        double? gainDbi = null,
        double? halfPowerBeamwidthDeg = null,
        double? floorDbi = null,
        double? ohmicEfficiency = null)
    {
        RangeCheck.WithinIfGiven(gainDbi, MinimumGainDbi, 100, nameof(gainDbi), "dBi");
        RangeCheck.WithinIfGiven(halfPowerBeamwidthDeg, NarrowestDeg, WidestDeg, nameof(halfPowerBeamwidthDeg), "degrees");
        RangeCheck.AboveZeroIfGiven(ohmicEfficiency, 1, nameof(ohmicEfficiency), "");
        if (gainDbi is not null && halfPowerBeamwidthDeg is not null && ohmicEfficiency is not null)
        {
            throw new ArgumentException("ohmicEfficiency must be left out when gainDbi and halfPowerBeamwidthDeg are both given", nameof(ohmicEfficiency));
        }

        double efficiency = ohmicEfficiency ?? 1;
        HalfPowerBeamwidthDeg = halfPowerBeamwidthDeg ?? WidthOfDirectivity(
            gainDbi ?? throw new ArgumentException("gainDbi or halfPowerBeamwidthDeg must be given", nameof(gainDbi)), efficiency);
        double directivity = DirectivityOfWidth(HalfPowerBeamwidthDeg);
        PeakGainDbi = gainDbi ?? Decibel.FromRatio(directivity * efficiency);
        OhmicEfficiency = Decibel.ToRatio(PeakGainDbi) / directivity;
        FloorDbi = RangeCheck.WithinIfGiven(floorDbi, MinimumGainDbi, PeakGainDbi, nameof(floorDbi), "dBi")
            ?? Math.Max(MinimumGainDbi, PeakGainDbi - DefaultFloorBelowPeakDb);
        dbPerRad2 = DbPerRad2(HalfPowerBeamwidthDeg);
    }

    /// <summary>Full width between the points 3 dB below the peak, degrees.</summary>
    public double HalfPowerBeamwidthDeg { get; }

    /// <summary>Lowest gain, dBi.</summary>
    public double FloorDbi { get; }

    /// <inheritdoc/>
    public override double PeakGainDbi { get; }

    /// <inheritdoc/>
    public override bool IsRotationallySymmetric => true;

    /// <summary>Gain over the directivity of the beam; above 1 when the entered gain is more than the entered width allows.</summary>
    public override double OhmicEfficiency { get; }

    /// <inheritdoc/>
    public override double AngularScaleRad => double.DegreesToRadians(HalfPowerBeamwidthDeg);

    /// <summary>
    /// Mean gain over pointing jitter, dBi, in closed form: with the beam exp(-k b^2) at an offset b and the jitter's
    /// rms angle j on the sky, exp(-k b^2 / (1 + k j^2)) / (1 + k j^2); never below the floor.
    /// </summary>
    /// <param name="offAxisRad">Offset of the mean pointing, rad, 0 to pi.</param>
    /// <param name="jitterRmsRad">Rms of the jitter's angle on the sky, both axes together, rad, at least 0 and small against 1.</param>
    public double MeanGainDbi(double offAxisRad, double jitterRmsRad)
    {
        double spread = 1 + (dbPerRad2 * Math.Log(10) / 10 * jitterRmsRad * jitterRmsRad);
        return Math.Max(FloorDbi, PeakGainDbi - (dbPerRad2 * offAxisRad * offAxisRad / spread) - Decibel.FromRatio(spread));
    }

    /// <inheritdoc/>
    internal override double RadiatedGainDbi(double offAxisRad, double phiRad) =>
        PeakGainDbi - (dbPerRad2 * offAxisRad * offAxisRad);

    /// <inheritdoc/>
    protected override double EvaluateDbi(double offAxisRad, double phiRad) =>
        Math.Max(FloorDbi, PeakGainDbi - (dbPerRad2 * offAxisRad * offAxisRad));

    private static double DbPerRad2(double halfPowerBeamwidthDeg)
    {
        double widthRad = double.DegreesToRadians(halfPowerBeamwidthDeg);
        return 12 / (widthRad * widthRad);
    }

    private static double DirectivityOfWidth(double halfPowerBeamwidthDeg)
    {
        double dbPerRad2 = DbPerRad2(halfPowerBeamwidthDeg);
        return 4 * Math.PI / SphereIntegral.OfSymmetric(
            offAxisRad => Decibel.ToRatio(-dbPerRad2 * offAxisRad * offAxisRad),
            double.DegreesToRadians(halfPowerBeamwidthDeg),
            []);
    }

    private static double WidthOfDirectivity(double gainDbi, double efficiency)
    {
        double directivity = Decibel.ToRatio(gainDbi) / efficiency;
        double least = DirectivityOfWidth(WidestDeg);
        if (directivity < least)
        {
            throw new ArgumentException(
                $"halfPowerBeamwidthDeg must be given: no beam has a directivity below {Decibel.FromRatio(least):F2} dBi, which gainDbi would need", nameof(gainDbi));
        }

        return Brent.FindRoot(
            widthDeg => Math.Log(DirectivityOfWidth(widthDeg) / directivity), NarrowestDeg, WidestDeg, 1e-9, 200);
    }
}
