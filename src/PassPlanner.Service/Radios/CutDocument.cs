using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>A measured cut of a pattern: gain against the angle from the boresight.</summary>
public sealed record CutDocument
{
    /// <summary>Plane of the cut, turned about the boresight; 0 when left out.</summary>
    [Quantity(0, 360, "degrees", BelowMaximum = true)]
    public double? PhiDeg { get; init; }

    /// <summary>Angles from the boresight, rising.</summary>
    [Quantity(0, 180, "degrees", Required = true)]
    public IReadOnlyList<double>? AngleDeg { get; init; }

    /// <summary>Gain at each angle.</summary>
    [Quantity(-100, 100, "dBi", Required = true)]
    public IReadOnlyList<double>? GainDbi { get; init; }
}
