namespace PassPlanner.Physics.Waveforms;

/// <summary>A modulation and code whose threshold is published or follows from theory; a bit rate makes a waveform of it.</summary>
/// <param name="Name">Name for people.</param>
/// <param name="RequiredEbN0Db">Ideal Eb/N0 per information bit at the error rate, dB, without implementation loss.</param>
/// <param name="ErrorCriterion">Error rate that the threshold holds for, such as BER 1e-6.</param>
/// <param name="SpectralEfficiencyBitPerSymbol">Information bits per transmitted symbol; none when the entry fixes no modulation.</param>
/// <param name="IsFromMemory">Whether the figure was not checked against its source: a guide, good to 0.3 dB or so.</param>
/// <param name="Source">Document, edition and table, or the method of computation.</param>
public sealed record PublishedWaveform(
    string Name,
    double RequiredEbN0Db,
    string ErrorCriterion,
    double? SpectralEfficiencyBitPerSymbol,
    bool IsFromMemory,
    string Source)
{
    /// <summary>The waveform at a bit rate.</summary>
    /// <param name="bitRateBps">Information bit rate, bit/s, above 0.</param>
    /// <param name="implementationLossDb">What the real modem loses against the ideal threshold, dB, 0 to 30; commonly 1 to 2.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is out of range.</exception>
    public Waveform At(double bitRateBps, double implementationLossDb) =>
        new(Name, bitRateBps, RequiredEbN0Db, implementationLossDb, source: $"{Source} ({ErrorCriterion})");
}
