namespace PassPlanner.Service.Passes;

/// <summary>Where to point and which frequency to expect, as columns.</summary>
public sealed record PointingResponse
{
    /// <summary>Instant of the first sample.</summary>
    public required string StartUtc { get; init; }

    /// <summary>Time between samples, s.</summary>
    public required int StepS { get; init; }

    /// <summary>Azimuth, degrees.</summary>
    public required double[] AzimuthDeg { get; init; }

    /// <summary>Elevation as seen through the air, degrees: the one to point at.</summary>
    public required double[] ApparentElevationDeg { get; init; }

    /// <summary>Downlink: the frequency to receive at. Uplink: the frequency to send at so that the spacecraft hears its own, Hz.</summary>
    public required double[] FrequencyHz { get; init; }

    /// <summary>Usual cautions about moving antennas and transmitted power.</summary>
    public required string Caution { get; init; }
}
