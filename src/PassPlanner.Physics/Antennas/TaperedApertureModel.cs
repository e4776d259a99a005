using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// Kind <c>taperedAperture</c>: a dish, or any round aperture, lit by a parabola to the power n on a pedestal.
/// </summary>
public sealed record TaperedApertureModel : PatternModel
{
    /// <summary>Edge taper when none is entered, dB: the usual compromise between even lighting and spillover.</summary>
    public const double DefaultEdgeTaperDb = 11;

    /// <summary>A round aperture.</summary>
    /// <param name="diameterM">Diameter, m, above 0 and at most 100.</param>
    /// <param name="edgeTaperDb">How far the field at the edge lies below that of the middle, dB, 0 to 60; left out, it is fitted to the beamwidth, else 11.</param>
    /// <param name="pedestalExponent">Exponent n of the parabola, 1 or 2.</param>
    /// <param name="efficiency">
    /// Total efficiency: gain = efficiency (pi D / lambda)^2. It holds taper, spillover, blockage and ohmic loss; the
    /// surface error is on top. At most what taper and blockage alone leave. Left out, taper x blockage x ohmic efficiency.
    /// </param>
    /// <param name="ohmicEfficiency">Ohmic efficiency, above 0 and at most 1, when no total efficiency is given; left out, 1.</param>
    /// <param name="blockageDiameterM">Diameter of the blocked middle, m, 0 to half the diameter; it shapes the pattern in any case.</param>
    /// <param name="surfaceErrorRmsMm">Rms of half the path error, mm, 0 to 100 (<see cref="RuzeLoss"/>).</param>
    /// <param name="halfPowerBeamwidthDeg">Half-power width to which the taper is fitted, degrees, with the frequency at which it was measured.</param>
    /// <param name="halfPowerBeamwidthFrequencyHz">Frequency of that width, Hz.</param>
    /// <exception cref="ArgumentException">A value is out of range, or two members contradict each other.</exception>
    public TaperedApertureModel(
        double diameterM,
        double? edgeTaperDb = null,
        int pedestalExponent = 1,
        double? efficiency = null,
        double? ohmicEfficiency = null,
        double blockageDiameterM = 0,
        double surfaceErrorRmsMm = 0,
        double? halfPowerBeamwidthDeg = null,
        double? halfPowerBeamwidthFrequencyHz = null)
    {
        DiameterM = RangeCheck.AboveZero(diameterM, 100, nameof(diameterM), "m");
        PedestalExponent = pedestalExponent is 1 or 2
            ? pedestalExponent
            : throw RangeCheck.Refusal(pedestalExponent, nameof(pedestalExponent), "", "1 or 2");
        BlockageDiameterM = RangeCheck.Within(blockageDiameterM, 0, diameterM / 2, nameof(blockageDiameterM), "m");
        SurfaceErrorRmsMm = RangeCheck.Within(surfaceErrorRmsMm, 0, 100, nameof(surfaceErrorRmsMm), "mm");
        if (halfPowerBeamwidthDeg is null != halfPowerBeamwidthFrequencyHz is null || (halfPowerBeamwidthDeg is not null && edgeTaperDb is not null))
        {
            throw new ArgumentException(
                "halfPowerBeamwidthDeg goes with halfPowerBeamwidthFrequencyHz and without edgeTaperDb", nameof(halfPowerBeamwidthDeg));
        }

        EdgeTaperDb = RangeCheck.WithinIfGiven(edgeTaperDb, 0, TaperFit.DeepestTaperDb, nameof(edgeTaperDb), "dB")
            ?? (halfPowerBeamwidthDeg is { } widthDeg && halfPowerBeamwidthFrequencyHz is { } widthHz
                ? TaperFit.FromHalfPowerBeamwidth(pedestalExponent, diameterM, widthHz, widthDeg)
                : DefaultEdgeTaperDb);
        ApertureTaper taper = Taper;
        double greatest = taper.Efficiency * taper.BlockageEfficiency(BlockedRadius);
        if (efficiency is not null && ohmicEfficiency is not null)
        {
            throw new ArgumentException("ohmicEfficiency must be left out when efficiency is given: it is part of it", nameof(ohmicEfficiency));
        }

        OhmicEfficiency = efficiency is { } total
            ? RangeCheck.AboveZero(total, Math.Round(greatest, 4, MidpointRounding.ToPositiveInfinity), nameof(efficiency), "(what taper and blockage leave)") / greatest
            : RangeCheck.AboveZeroIfGiven(ohmicEfficiency, 1, nameof(ohmicEfficiency), "") ?? 1;
        Efficiency = efficiency ?? greatest * OhmicEfficiency;
    }

    /// <summary>Diameter, m.</summary>
    public double DiameterM { get; }

    /// <summary>How far the field at the edge lies below that of the middle, dB.</summary>
    public double EdgeTaperDb { get; }

    /// <summary>Exponent n of the parabola, 1 or 2.</summary>
    public int PedestalExponent { get; }

    /// <summary>Gain over (pi D / lambda)^2, the surface error not included.</summary>
    public double Efficiency { get; }

    /// <summary>The part of the efficiency that taper and blockage do not explain: ohmic loss and, in an entered efficiency, spillover.</summary>
    public double OhmicEfficiency { get; }

    /// <summary>Diameter of the blocked middle, m.</summary>
    public double BlockageDiameterM { get; }

    /// <summary>Rms of half the path error, mm.</summary>
    public double SurfaceErrorRmsMm { get; }

    internal ApertureTaper Taper => new(EdgeTaperDb, PedestalExponent);

    internal double BlockedRadius => BlockageDiameterM / DiameterM;

    /// <inheritdoc/>
    public override AntennaPattern At(double frequencyHz) => new TaperedAperturePattern(this, frequencyHz);
}
