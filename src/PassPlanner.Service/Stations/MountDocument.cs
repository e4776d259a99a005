using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>A mount and the limits of its axes.</summary>
public sealed record MountDocument
{
    /// <summary>Arrangement of the axes.</summary>
    [Choice("azimuthElevation", "overTheTop", "xY", "fixed", Required = true)]
    public string? Kind { get; init; }

    /// <summary>Azimuth axis.</summary>
    [Part]
    public AxisDocument? Azimuth { get; init; }

    /// <summary>Elevation axis.</summary>
    [Part]
    public AxisDocument? Elevation { get; init; }

    /// <summary>X axis of an X-Y mount.</summary>
    [Part]
    public AxisDocument? X { get; init; }

    /// <summary>Y axis of an X-Y mount.</summary>
    [Part]
    public AxisDocument? Y { get; init; }

    /// <summary>Azimuth of the boresight of a fixed mount; 0 when left out.</summary>
    [Quantity(0, 360, "degrees", BelowMaximum = true)]
    public double? FixedAzimuthDeg { get; init; }

    /// <summary>Elevation of the boresight of a fixed mount; 90, straight up, when left out.</summary>
    [Quantity(0, 90, "degrees")]
    public double? FixedElevationDeg { get; init; }
}
