using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>An antenna pattern: its kind, and the members that this kind takes.</summary>
public sealed record PatternDocument
{
    /// <summary>Kind of antenna.</summary>
    [Choice("isotropic", "halfWaveDipole", "gaussianBeam", "taperedAperture", "measured", Required = true)]
    public string? Kind { get; init; }

    /// <summary>Peak gain, ohmic loss included (isotropic, halfWaveDipole, gaussianBeam).</summary>
    [Quantity(-60, 100, "dBi")]
    public double? GainDbi { get; init; }

    /// <summary>Full width between the half-power directions (gaussianBeam; taperedAperture instead of edgeTaperDb).</summary>
    [Quantity(0.001, 180, "degrees")]
    public double? HalfPowerBeamwidthDeg { get; init; }

    /// <summary>Gain below which the pattern does not fall (gaussianBeam); 30 dB below the peak when left out.</summary>
    [Quantity(-100, 100, "dBi")]
    public double? FloorDbi { get; init; }

    /// <summary>Diameter of the aperture (taperedAperture).</summary>
    [Quantity(0, 100, "m", AboveMinimum = true)]
    public double? DiameterM { get; init; }

    /// <summary>Illumination at the edge below that in the middle (taperedAperture); 11 when left out.</summary>
    [Quantity(0, 60, "dB")]
    public double? EdgeTaperDb { get; init; }

    /// <summary>Exponent n of the parabola on its pedestal, 1 or 2 (taperedAperture); 1 when left out.</summary>
    [Quantity(1, 2, "")]
    public int? PedestalExponent { get; init; }

    /// <summary>Frequency at which halfPowerBeamwidthDeg was measured (taperedAperture).</summary>
    [Quantity(3e7, 3e11, "Hz")]
    public double? HalfPowerBeamwidthFrequencyHz { get; init; }

    /// <summary>Aperture efficiency in all but surface error (taperedAperture); that of taper and blockage when left out.</summary>
    [Quantity(0, 1, "", AboveMinimum = true)]
    public double? Efficiency { get; init; }

    /// <summary>Gain over directivity (halfWaveDipole, gaussianBeam of which gain or width is left out, taperedAperture without efficiency); 1 when left out.</summary>
    [Quantity(0, 1, "", AboveMinimum = true)]
    public double? OhmicEfficiency { get; init; }

    /// <summary>Diameter of the central blockage (taperedAperture); 0 when left out.</summary>
    [Quantity(0, 100, "m")]
    public double? BlockageDiameterM { get; init; }

    /// <summary>Surface error, rms of half the path length (taperedAperture); 0 when left out.</summary>
    [Quantity(0, 100, "mm")]
    public double? SurfaceErrorRmsMm { get; init; }

    /// <summary>Measured cuts (measured).</summary>
    [List(1, 360)]
    public IReadOnlyList<CutDocument>? Cuts { get; init; }
}
