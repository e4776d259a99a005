using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>Pointing errors of an antenna.</summary>
public sealed record PointingDocument
{
    /// <summary>Steady error, an angle on the sky in the worst direction; 0 when left out.</summary>
    [Quantity(0, 45, "degrees")]
    public double? BiasDeg { get; init; }

    /// <summary>Random error, rms of the angle on the sky over both axes; 0 when left out.</summary>
    [Quantity(0, 11, "degrees")]
    public double? JitterRmsDeg { get; init; }

    /// <summary>Time between two commanded directions; 0, continuous, when left out.</summary>
    [Quantity(0, 60, "s")]
    public double? UpdateIntervalS { get; init; }
}
