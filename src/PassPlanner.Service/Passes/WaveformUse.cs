namespace PassPlanner.Service.Passes;

/// <summary>A waveform of the pass's radio.</summary>
public sealed record WaveformUse
{
    /// <summary>Index in the timeline.</summary>
    public required int Index { get; init; }

    /// <summary>Name.</summary>
    public required string Name { get; init; }

    /// <summary>Information bit rate, bit/s.</summary>
    public required double BitRateBps { get; init; }

    /// <summary>Eb/N0 needed, dB.</summary>
    public required double RequiredEbN0Db { get; init; }

    /// <summary>Implementation loss, dB.</summary>
    public required double ImplementationLossDb { get; init; }
}
