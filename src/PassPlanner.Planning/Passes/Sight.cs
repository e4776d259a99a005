namespace PassPlanner.Planning.Passes;

/// <summary>The line of sight from a station to a spacecraft, as far as the search needs it.</summary>
/// <param name="EastKm">Component to the east, km.</param>
/// <param name="NorthKm">Component to the north, km.</param>
/// <param name="UpKm">Height above the station's level, km.</param>
/// <param name="RangeKm">Length, km.</param>
/// <param name="UpRateKmPerS">Rate of the height above the level, km/s.</param>
/// <param name="RangeRateKmPerS">Rate of the length, km/s.</param>
internal readonly record struct Sight(
    double EastKm, double NorthKm, double UpKm, double RangeKm, double UpRateKmPerS, double RangeRateKmPerS)
{
    public double SinElevation => UpKm / RangeKm;

    /// <summary>Rate of the sine of the elevation, 1/s.</summary>
    public double SinElevationRate => (UpRateKmPerS - (SinElevation * RangeRateKmPerS)) / RangeKm;

    /// <summary>Azimuth, degrees, 0 to below 360.</summary>
    public double AzimuthDeg
    {
        get
        {
            double azimuthDeg = Math.Atan2(EastKm, NorthKm) * (180.0 / Math.PI);
            return azimuthDeg >= 0.0 ? azimuthDeg : Math.Max(0.0, Math.Min(azimuthDeg + 360.0, Math.BitDecrement(360.0)));
        }
    }
}
