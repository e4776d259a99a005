using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Noise;

/// <summary>
/// Noise that the sky sends into an antenna (ITU-R P.618-14, section 3, equation 69), with the galactic background
/// behind the atmosphere in place of the constant 2.7 K, which matters below about 2 GHz.
/// </summary>
public static class SkyNoise
{
    /// <summary>Mean radiating temperature of the atmosphere, K, when the surface temperature is not used (P.618-14, section 3).</summary>
    public const double MeanRadiatingTemperatureK = 275;

    /// <summary>Cosmic background, K.</summary>
    public const double CosmicBackgroundK = 2.7;

    private const double QuietSkyK = 23.9;
    private const double QuietSkyFrequencyHz = 408e6;
    private const double GalacticExponent = -2.75;

    /// <summary>
    /// Brightness of a quiet region of the sky, K, the cosmic background included: 23.9 K at 408 MHz near the south
    /// celestial pole (R. M. Price, Australian Journal of Physics 22, 1969), scaled as f^-2.75 (scaling law of ITU-R P.372)
    /// after the background is taken off. The galactic plane is several times as bright.
    /// </summary>
    /// <param name="frequencyHz">Frequency, Hz, above 0.</param>
    public static double BackgroundK(double frequencyHz) =>
        CosmicBackgroundK + ((QuietSkyK - CosmicBackgroundK) * Math.Pow(frequencyHz / QuietSkyFrequencyHz, GalacticExponent));

    /// <summary>Noise temperature of the sky, K, behind an atmosphere that attenuates: Tmr (1 - t) + Tbackground t, t = 10^(-A/10).</summary>
    /// <param name="attenuationDb">Attenuation by gas, cloud and rain, without scintillation, dB, at least 0.</param>
    /// <param name="backgroundK">Temperature behind the atmosphere, K: <see cref="BackgroundK"/>, or <see cref="CosmicBackgroundK"/> as the Recommendation has it.</param>
    /// <param name="meanRadiatingTemperatureK">Mean radiating temperature of the atmosphere, K; 37.34 + 0.81 times the surface temperature, or 275.</param>
    public static double TemperatureK(
        double attenuationDb, double backgroundK, double meanRadiatingTemperatureK = MeanRadiatingTemperatureK)
    {
        double transmitted = Decibel.ToRatio(-attenuationDb);
        return (meanRadiatingTemperatureK * (1 - transmitted)) + (backgroundK * transmitted);
    }
}
