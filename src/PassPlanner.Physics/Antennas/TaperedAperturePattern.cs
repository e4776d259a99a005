using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// The far field of a round tapered aperture in closed form (<see cref="TaperedApertureModel"/>), by scalar aperture
/// theory without an obliquity factor: good for the main beam and the first sidelobes of apertures of several
/// wavelengths. From 90 degrees on it is <see cref="BackGainDbi"/>.
/// </summary>
public sealed class TaperedAperturePattern : AntennaPattern
{
    /// <summary>Gain behind the aperture plane (90 degrees and beyond), dBi: a round figure for what spills past the edge, half a percent of the power.</summary>
    public const double BackGainDbi = -20;

    private readonly ApertureTaper taper;
    private readonly double blockedRadius;
    private readonly double uPerSine;
    private readonly double fieldOnAxis;

    /// <summary>The pattern of an aperture at a frequency.</summary>
    /// <param name="model">The aperture.</param>
    /// <param name="frequencyHz">Frequency, Hz, 30 MHz to 350 GHz, at which the aperture is at least one wavelength wide.</param>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is out of range or the aperture narrower than a wavelength.</exception>
    public TaperedAperturePattern(TaperedApertureModel model, double frequencyHz)
    {
        double wavelengthM = Wavelength.InM(Wavelength.CheckFrequency(frequencyHz));
        RangeCheck.Within(model.DiameterM, Math.Round(wavelengthM, 6), 100, "diameterM", "m (a wavelength or more)");
        taper = model.Taper;
        blockedRadius = model.BlockedRadius;
        uPerSine = Math.PI * model.DiameterM / wavelengthM;
        fieldOnAxis = taper.Field(0, blockedRadius);
        AngularScaleRad = wavelengthM / model.DiameterM;
        double ruzeDb = RuzeLoss.Db(model.SurfaceErrorRmsMm, frequencyHz);
        PeakGainDbi = Decibel.FromRatio(model.Efficiency * uPerSine * uPerSine) - ruzeDb;
        OhmicEfficiency = model.OhmicEfficiency * Decibel.ToRatio(-ruzeDb);
    }

    /// <inheritdoc/>
    public override double PeakGainDbi { get; }

    /// <inheritdoc/>
    public override bool IsRotationallySymmetric => true;

    /// <inheritdoc/>
    public override double OhmicEfficiency { get; }

    /// <inheritdoc/>
    public override double AngularScaleRad { get; }

    /// <inheritdoc/>
    internal override IReadOnlyList<double> KinkAnglesRad => [Math.PI / 2];

    /// <inheritdoc/>
    protected override double EvaluateDbi(double offAxisRad, double phiRad) =>
        offAxisRad < Math.PI / 2
            ? ForwardGainDbi(Math.Sin(offAxisRad))
            : BackGainDbi;

    private double ForwardGainDbi(double sine)
    {
        double relative = taper.Field(uPerSine * sine, blockedRadius) / fieldOnAxis;
        return PeakGainDbi + Decibel.FromRatio(relative * relative);
    }
}
