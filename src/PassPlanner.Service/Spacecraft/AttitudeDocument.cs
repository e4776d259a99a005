using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>Attitude law of a spacecraft.</summary>
public sealed record AttitudeDocument
{
    /// <summary>Kind: body +Z to the Earth's centre (nadir), to the station, held in inertial space, or not controlled.</summary>
    [Choice("nadir", "stationTracking", "inertial", "uncontrolled", Required = true)]
    public string? Kind { get; init; }

    /// <summary>Rotation from inertial (TEME) to body axes, scalar last (inertial).</summary>
    [Quantity(-1, 1, "", Count = 4)]
    public IReadOnlyList<double>? Quaternion { get; init; }

    /// <summary>Percentile of the gain over all directions that is used (uncontrolled): this share of the sphere has less; 10 when left out.</summary>
    [Quantity(0, 100, "percent", AboveMinimum = true, BelowMaximum = true)]
    public double? Percentile { get; init; }
}
