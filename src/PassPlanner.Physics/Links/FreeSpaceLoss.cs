namespace PassPlanner.Physics.Links;

/// <summary>Free-space basic transmission loss between isotropic antennas (ITU-R P.525, section 2.2, point-to-point links): 20 log10(4 pi d / lambda).</summary>
public static class FreeSpaceLoss
{
    /// <summary>Loss, dB.</summary>
    /// <param name="slantRangeKm">Distance, km, above 0.</param>
    /// <param name="frequencyHz">Frequency, Hz, above 0.</param>
    public static double Db(double slantRangeKm, double frequencyHz) =>
        20 * Math.Log10(4 * Math.PI * 1000 * slantRangeKm / Wavelength.InM(frequencyHz));
}
