using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>A waveform of a radio: modulation, coding and rate, and what it needs.</summary>
public sealed record WaveformDocument
{
    /// <summary>Name, such as QPSK 1/2.</summary>
    [Label(120, Required = true)]
    public string? Name { get; init; }

    /// <summary>Information bit rate.</summary>
    [Quantity(0, 1e11, "bit/s", AboveMinimum = true, Required = true)]
    public double? BitRateBps { get; init; }

    /// <summary>Eb/N0 needed by the ideal receiver.</summary>
    [Quantity(-2, 60, "dB", Required = true)]
    public double? RequiredEbN0Db { get; init; }

    /// <summary>Loss of the real modem; 0 when left out.</summary>
    [Quantity(0, 30, "dB")]
    public double? ImplementationLossDb { get; init; }

    /// <summary>Share of the information bits that carry the user's bytes; 1 when left out.</summary>
    [Quantity(0, 1, "", AboveMinimum = true)]
    public double? FrameEfficiency { get; init; }

    /// <summary>Occupied bandwidth.</summary>
    [Quantity(0, 1e11, "Hz", AboveMinimum = true)]
    public double? OccupiedBandwidthHz { get; init; }

    /// <summary>Where the figures come from.</summary>
    [Label(500)]
    public string? Source { get; init; }
}
