namespace PassPlanner.Service.Waveforms;

/// <summary>A waveform of the library: a threshold that a bit rate makes a waveform of.</summary>
public sealed record WaveformResponse
{
    /// <summary>Identifier.</summary>
    public required string Id { get; init; }

    /// <summary>Name.</summary>
    public required string Name { get; init; }

    /// <summary>Eb/N0 needed, dB, without implementation loss.</summary>
    public required double RequiredEbN0Db { get; init; }

    /// <summary>Error rate at that threshold; left out when it is not stated.</summary>
    public string? ErrorCriterion { get; init; }

    /// <summary>Information bits for each symbol sent; left out when no modulation is fixed.</summary>
    public double? SpectralEfficiencyBitPerSymbol { get; init; }

    /// <summary>Information bit rate, bit/s; left out for published thresholds.</summary>
    public double? BitRateBps { get; init; }

    /// <summary>Implementation loss, dB; left out for published thresholds.</summary>
    public double? ImplementationLossDb { get; init; }

    /// <summary>Share of the information bits that carry the user's bytes.</summary>
    public required double FrameEfficiency { get; init; }

    /// <summary>Where the figures come from.</summary>
    public required string Source { get; init; }

    /// <summary>Whether it is published, as against the operator's own.</summary>
    public required bool IsPublished { get; init; }

    /// <summary>Whether the figure was not checked against its source: a guide, good to 0.3 dB or so.</summary>
    public required bool IsFromMemory { get; init; }
}
