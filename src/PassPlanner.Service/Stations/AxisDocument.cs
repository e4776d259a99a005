using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>Travel, rate and acceleration of one axis.</summary>
public sealed record AxisDocument
{
    /// <summary>Lower end of travel.</summary>
    [Quantity(-720, 720, "degrees")]
    public double? MinimumDeg { get; init; }

    /// <summary>Upper end of travel.</summary>
    [Quantity(-720, 720, "degrees")]
    public double? MaximumDeg { get; init; }

    /// <summary>Greatest rate.</summary>
    [Quantity(0, 100, "degrees/s", AboveMinimum = true)]
    public double? MaximumRateDegPerS { get; init; }

    /// <summary>Greatest acceleration.</summary>
    [Quantity(0, 1000, "degrees/s2", AboveMinimum = true)]
    public double? MaximumAccelerationDegPerS2 { get; init; }
}
