using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Noise;

/// <summary>
/// Kind <c>gOverT</c>: the ratio at the peak of the pattern. Off the peak it falls as the pattern does; the temperature
/// is the one that the ratio and the pattern's peak gain imply.
/// </summary>
public sealed record GOverTNoise : SystemNoise
{
    /// <summary>One ratio.</summary>
    /// <param name="gOverTDbPerK">Peak gain over system noise temperature, dB/K, -60 to 80.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is out of range.</exception>
    public GOverTNoise(double gOverTDbPerK) =>
        GOverTDbPerK = RangeCheck.Within(gOverTDbPerK, -60, 80, nameof(gOverTDbPerK), "dB/K");

    /// <summary>Peak gain over system noise temperature, dB/K.</summary>
    public double GOverTDbPerK { get; }

    /// <inheritdoc/>
    public override bool FollowsSky => false;

    /// <inheritdoc/>
    public override double TemperatureK(double peakGainDbi, double skyTemperatureK, double lineLossDb) =>
        Decibel.ToRatio(peakGainDbi - GOverTDbPerK);
}
