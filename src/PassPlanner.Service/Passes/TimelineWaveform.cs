namespace PassPlanner.Service.Passes;

/// <summary>The margin of one waveform along a pass.</summary>
public sealed record TimelineWaveform
{
    /// <summary>Name.</summary>
    public required string Name { get; init; }

    /// <summary>Information bit rate, bit/s.</summary>
    public required double BitRateBps { get; init; }

    /// <summary>Margin asked for, dB.</summary>
    public required double RequiredMarginDb { get; init; }

    /// <summary>Margin, dB.</summary>
    public required double[] MarginDb { get; init; }
}
