using PassPlanner.Physics.Constants;

namespace PassPlanner.Physics.Links;

/// <summary>Wavelength in vacuum and the frequencies that the radio models accept.</summary>
public static class Wavelength
{
    /// <summary>Lowest frequency accepted, Hz (30 MHz: lower ones do not pass the ionosphere dependably).</summary>
    public const double LowestFrequencyHz = 30e6;

    /// <summary>Highest frequency accepted, Hz (350 GHz, the end of the attenuation models).</summary>
    public const double HighestFrequencyHz = 350e9;

    /// <summary>Wavelength in vacuum, m.</summary>
    /// <param name="frequencyHz">Frequency, Hz, above 0.</param>
    public static double InM(double frequencyHz) => PhysicalConstants.SpeedOfLightMPerS / frequencyHz;

    /// <summary>Refuses a frequency outside the accepted ones.</summary>
    /// <param name="frequencyHz">Frequency, Hz.</param>
    /// <returns>The same frequency.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The frequency lies outside 30 MHz to 350 GHz or is no number.</exception>
    public static double CheckFrequency(double frequencyHz) =>
        RangeCheck.Within(frequencyHz, LowestFrequencyHz, HighestFrequencyHz, nameof(frequencyHz), "Hz");
}
