using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>Recorder of a spacecraft; kept with the profile, used by plans.</summary>
public sealed record RecorderDocument
{
    /// <summary>Capacity.</summary>
    [Quantity(0, 1e18, "bytes", AboveMinimum = true, Required = true)]
    public double? CapacityBytes { get; init; }

    /// <summary>Rate at which data are generated; 0 when left out.</summary>
    [Quantity(0, 1e12, "bytes/s")]
    public double? GeneratedBytesPerS { get; init; }

    /// <summary>Bytes stored at the start; 0 when left out.</summary>
    [Quantity(0, 1e18, "bytes")]
    public double? StoredBytes { get; init; }
}
