namespace PassPlanner.Physics.Links;

/// <summary>The polarisation that an antenna sends or takes best.</summary>
public sealed record Polarisation
{
    /// <summary>Greatest axial ratio accepted for an ellipse, dB; beyond it the polarisation is linear.</summary>
    public const double GreatestAxialRatioDb = 60;

    private Polarisation(PolarisationKind kind, double? axialRatioDb, RotationSense? sense, double? tiltDeg)
    {
        (Kind, AxialRatioDb, Sense, TiltDeg) = (kind, axialRatioDb, sense, tiltDeg);
        if (axialRatioDb is { } ratioDb)
        {
            double ratio = Math.Pow(10, ratioDb / 20);
            double handed = 2 * ratio / (1 + (ratio * ratio));
            CircularPart = sense == RotationSense.Left ? -handed : handed;
            LinearPart = ((ratio * ratio) - 1) / (1 + (ratio * ratio));
        }
        else
        {
            LinearPart = 1;
        }
    }

    /// <summary>How it was described.</summary>
    public PolarisationKind Kind { get; }

    /// <summary>Major over minor axis of the ellipse, dB of the fields' ratio, 0 (circular) to 60; none for linear.</summary>
    public double? AxialRatioDb { get; }

    /// <summary>Sense of rotation; none for linear.</summary>
    public RotationSense? Sense { get; }

    /// <summary>Tilt of the major axis, degrees, in whatever reference both ends of a link share; none when not known.</summary>
    public double? TiltDeg { get; }

    /// <summary>sin 2x of the ellipticity angle x, positive for right-hand: the fourth Stokes parameter over the first.</summary>
    internal double CircularPart { get; }

    /// <summary>cos 2x of the ellipticity angle x, 0 (circular) to 1 (linear).</summary>
    internal double LinearPart { get; }

    /// <summary>Right-hand circular.</summary>
    /// <param name="axialRatioDb">Axial ratio, dB, 0 to 60.</param>
    /// <exception cref="ArgumentOutOfRangeException">The axial ratio is out of range.</exception>
    public static Polarisation RightCircular(double axialRatioDb = 0) =>
        new(PolarisationKind.RightCircular, CheckAxialRatio(axialRatioDb), RotationSense.Right, null);

    /// <summary>Left-hand circular.</summary>
    /// <param name="axialRatioDb">Axial ratio, dB, 0 to 60.</param>
    /// <exception cref="ArgumentOutOfRangeException">The axial ratio is out of range.</exception>
    public static Polarisation LeftCircular(double axialRatioDb = 0) =>
        new(PolarisationKind.LeftCircular, CheckAxialRatio(axialRatioDb), RotationSense.Left, null);

    /// <summary>Linear.</summary>
    /// <param name="tiltDeg">Tilt, degrees, -360 to 360; left out when not known.</param>
    /// <exception cref="ArgumentOutOfRangeException">The tilt is out of range.</exception>
    public static Polarisation Linear(double? tiltDeg = null) =>
        new(PolarisationKind.Linear, null, null, CheckTilt(tiltDeg));

    /// <summary>Elliptical.</summary>
    /// <param name="axialRatioDb">Axial ratio, dB, 0 to 60.</param>
    /// <param name="sense">Sense of rotation.</param>
    /// <param name="tiltDeg">Tilt of the major axis, degrees, -360 to 360; left out when not known.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is out of range.</exception>
    public static Polarisation Elliptical(double axialRatioDb, RotationSense sense, double? tiltDeg = null) =>
        new(PolarisationKind.Elliptical, CheckAxialRatio(axialRatioDb), sense, CheckTilt(tiltDeg));

    private static double CheckAxialRatio(double axialRatioDb) =>
        RangeCheck.Within(axialRatioDb, 0, GreatestAxialRatioDb, nameof(axialRatioDb), "dB");

    private static double? CheckTilt(double? tiltDeg) =>
        RangeCheck.WithinIfGiven(tiltDeg, -360, 360, nameof(tiltDeg), "degrees");
}
