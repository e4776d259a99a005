using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>A question about an antenna pattern.</summary>
public sealed record PatternQuestion
{
    /// <summary>Pattern.</summary>
    [Part(Required = true)]
    public PatternDocument? Pattern { get; init; }

    /// <summary>Frequency.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? FrequencyHz { get; init; }

    /// <summary>Plane of the cut, turned about the boresight; 0 when left out.</summary>
    [Quantity(-360, 360, "degrees")]
    public double? PhiDeg { get; init; }

    /// <summary>Angles from the boresight; negative ones lie on the other side; none when left out.</summary>
    [Quantity(-180, 180, "degrees")]
    public IReadOnlyList<double>? AngleDeg { get; init; }
}
