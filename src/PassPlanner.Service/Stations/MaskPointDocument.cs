using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>One point of a horizon mask.</summary>
public sealed record MaskPointDocument
{
    /// <summary>Azimuth, clockwise from true north.</summary>
    [Quantity(0, 360, "degrees", BelowMaximum = true, Required = true)]
    public double? AzimuthDeg { get; init; }

    /// <summary>Elevation of the horizon there.</summary>
    [Quantity(-5, 90, "degrees", BelowMaximum = true, Required = true)]
    public double? ElevationDeg { get; init; }
}
