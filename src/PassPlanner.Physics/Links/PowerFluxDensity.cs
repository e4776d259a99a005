namespace PassPlanner.Physics.Links;

/// <summary>Power that passes through a square metre at a distance, in free space: EIRP / (4 pi d^2).</summary>
public static class PowerFluxDensity
{
    /// <summary>Power flux density of the whole carrier, dBW/m^2.</summary>
    /// <param name="eirpDbw">Radiated power towards the place, dBW.</param>
    /// <param name="slantRangeKm">Distance, km, above 0.</param>
    public static double DbWPerM2(double eirpDbw, double slantRangeKm) =>
        eirpDbw - (20 * Math.Log10(1000 * slantRangeKm)) - Decibel.FromRatio(4 * Math.PI);

    /// <summary>Power flux density in a reference bandwidth, dBW/m^2, of a flat spectrum; never more than the whole carrier.</summary>
    /// <param name="totalDbWPerM2">Power flux density of the whole carrier, dBW/m^2.</param>
    /// <param name="occupiedBandwidthHz">Bandwidth over which the carrier is spread, Hz, above 0.</param>
    /// <param name="referenceBandwidthHz">Reference bandwidth, Hz, above 0.</param>
    public static double InBandwidthDbWPerM2(double totalDbWPerM2, double occupiedBandwidthHz, double referenceBandwidthHz) =>
        totalDbWPerM2 + Decibel.FromRatio(Math.Min(1, referenceBandwidthHz / occupiedBandwidthHz));

    /// <summary>Effective area of an isotropic antenna, lambda^2 / 4 pi, dBm^2: flux density plus this is the power that it takes.</summary>
    /// <param name="frequencyHz">Frequency, Hz, above 0.</param>
    public static double IsotropicAreaDbM2(double frequencyHz) =>
        (20 * Math.Log10(Wavelength.InM(frequencyHz))) - Decibel.FromRatio(4 * Math.PI);
}
