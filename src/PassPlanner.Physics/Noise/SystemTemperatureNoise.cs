using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Noise;

/// <summary>Kind <c>systemTemperature</c>: one temperature, sky, line and receiver all inside.</summary>
public sealed record SystemTemperatureNoise : SystemNoise
{
    /// <summary>One temperature.</summary>
    /// <param name="systemNoiseTemperatureK">System noise temperature at the antenna's terminal, K, above 0 and at most 1,000,000.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is out of range.</exception>
    public SystemTemperatureNoise(double systemNoiseTemperatureK) =>
        SystemNoiseTemperatureK = RangeCheck.AboveZero(systemNoiseTemperatureK, 1e6, nameof(systemNoiseTemperatureK), "K");

    /// <summary>System noise temperature at the antenna's terminal, K.</summary>
    public double SystemNoiseTemperatureK { get; }

    /// <inheritdoc/>
    public override bool FollowsSky => false;

    /// <inheritdoc/>
    public override double TemperatureK(double peakGainDbi, double skyTemperatureK, double lineLossDb) => SystemNoiseTemperatureK;
}
