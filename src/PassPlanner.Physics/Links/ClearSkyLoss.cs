namespace PassPlanner.Physics.Links;

/// <summary>A loss entered for the zenith and spread over elevation as through a flat layer.</summary>
public static class ClearSkyLoss
{
    /// <summary>Elevation below which the loss no longer grows, degrees: the flat layer would make it endless.</summary>
    public const double LowestElevationDeg = 1;

    /// <summary>Loss on the slant path, dB: zenith loss / sin(max(elevation, 1 degree)).</summary>
    /// <param name="zenithLossDb">Loss at the zenith, dB, at least 0.</param>
    /// <param name="elevationDeg">Elevation, degrees, -90 to 90.</param>
    public static double Db(double zenithLossDb, double elevationDeg) =>
        zenithLossDb / Math.Sin(double.DegreesToRadians(Math.Max(elevationDeg, LowestElevationDeg)));
}
