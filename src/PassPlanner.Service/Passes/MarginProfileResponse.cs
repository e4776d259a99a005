namespace PassPlanner.Service.Passes;

/// <summary>The margin of the most robust waveform along a pass, for drawing.</summary>
public sealed record MarginProfileResponse
{
    /// <summary>Instant of the first sample: the first whole second of the pass.</summary>
    public required string StartUtc { get; init; }

    /// <summary>Time between samples, s.</summary>
    public required int StepS { get; init; }

    /// <summary>Margin asked for, dB.</summary>
    public required double RequiredMarginDb { get; init; }

    /// <summary>Margin, dB.</summary>
    public required IReadOnlyList<double> MarginDb { get; init; }

    /// <summary>1 where the second is usable, else 0.</summary>
    public required IReadOnlyList<int> Usable { get; init; }
}
