using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>Polarisation of an antenna.</summary>
public sealed record PolarisationDocument
{
    /// <summary>Kind.</summary>
    [Choice("rightCircular", "leftCircular", "linear", "elliptical", Required = true)]
    public string? Kind { get; init; }

    /// <summary>Axial ratio (rightCircular, leftCircular, elliptical); 0 for the circular kinds when left out.</summary>
    [Quantity(0, 60, "dB")]
    public double? AxialRatioDb { get; init; }

    /// <summary>Sense of rotation (elliptical).</summary>
    [Choice("right", "left")]
    public string? Sense { get; init; }

    /// <summary>Tilt of the plane or of the major axis (linear, elliptical); unknown when left out.</summary>
    [Quantity(-180, 180, "degrees")]
    public double? TiltDeg { get; init; }
}
