using System.Collections.Concurrent;
using PassPlanner.Physics.Antennas;

namespace PassPlanner.Planning.Links;

/// <summary>
/// Gains that take milliseconds to work out and are the same for many links: the table of a dish at one frequency, the
/// percentile of a pattern over the sphere. Each is made once. Safe to use from many threads.
/// </summary>
public sealed class GainTables
{
    private readonly ConcurrentDictionary<(PatternModel Pattern, double FrequencyHz, double JitterRmsDeg), Lazy<GroundGain>> ground = new();
    private readonly ConcurrentDictionary<(PatternModel Pattern, double FrequencyHz, double Percentile), Lazy<double>> percentiles = new();

    /// <summary>Gain of a ground antenna, mean over its jitter.</summary>
    /// <param name="pattern">Pattern, free of frequency.</param>
    /// <param name="frequencyHz">Frequency, Hz.</param>
    /// <param name="jitterRmsDeg">Rms of the jitter's angle on the sky, degrees.</param>
    public GroundGain Ground(PatternModel pattern, double frequencyHz, double jitterRmsDeg) => ground.GetOrAdd(
        (pattern, frequencyHz, jitterRmsDeg),
        key => new Lazy<GroundGain>(() => new GroundGain(key.Pattern.At(key.FrequencyHz), double.DegreesToRadians(key.JitterRmsDeg)))).Value;

    /// <summary>Gain that a percentage of all directions lie below, dBi.</summary>
    /// <param name="pattern">Pattern, free of frequency.</param>
    /// <param name="frequencyHz">Frequency, Hz.</param>
    /// <param name="percentile">Percentile, above 0 and below 100.</param>
    public double AtPercentileDbi(PatternModel pattern, double frequencyHz, double percentile) => percentiles.GetOrAdd(
        (pattern, frequencyHz, percentile),
        key => new Lazy<double>(() => SphereStatistics.GainAtPercentileDbi(key.Pattern.At(key.FrequencyHz), key.Percentile))).Value;
}
