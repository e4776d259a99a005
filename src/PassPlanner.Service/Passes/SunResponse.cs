namespace PassPlanner.Service.Passes;

/// <summary>Where the station sees the Sun, without refraction.</summary>
public sealed record SunResponse
{
    /// <summary>Azimuth, degrees.</summary>
    public required double AzimuthDeg { get; init; }

    /// <summary>Elevation, degrees.</summary>
    public required double ElevationDeg { get; init; }
}
