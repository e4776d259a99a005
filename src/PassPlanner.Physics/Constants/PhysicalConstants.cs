namespace PassPlanner.Physics.Constants;

/// <summary>Constants of nature, CODATA 2018 and the SI.</summary>
public static class PhysicalConstants
{
    /// <summary>Speed of light in vacuum, m/s, exact. SI.</summary>
    public const double SpeedOfLightMPerS = 299792458.0;

    /// <summary>Speed of light in vacuum, km/s, exact. SI.</summary>
    public const double SpeedOfLightKmPerS = 299792.458;

    /// <summary>Boltzmann constant, J/K, exact. CODATA 2018.</summary>
    public const double BoltzmannJPerK = 1.380649e-23;

    /// <summary>Boltzmann constant, dBW/(K Hz): 10 log10 of 1.380649e-23, about -228.599.</summary>
    public static readonly double BoltzmannDbwPerKHz = 10 * Math.Log10(BoltzmannJPerK);
}
