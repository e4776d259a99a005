using PassPlanner.Service.Radios;

namespace PassPlanner.Service.Passes;

/// <summary>The link budget of a pass at one instant.</summary>
public sealed record BudgetResponse
{
    /// <summary>Instant.</summary>
    public required string AtUtc { get; init; }

    /// <summary>Waveform.</summary>
    public required WaveformUse Waveform { get; init; }

    /// <summary>Lines in order.</summary>
    public required IReadOnlyList<BudgetLineResponse> Lines { get; init; }

    /// <summary>C/N0, dBHz.</summary>
    public required double COverN0DbHz { get; init; }

    /// <summary>Eb/N0, dB.</summary>
    public required double EbN0Db { get; init; }

    /// <summary>Margin, dB.</summary>
    public required double MarginDb { get; init; }

    /// <summary>Margin asked for, dB.</summary>
    public required double RequiredMarginDb { get; init; }

    /// <summary>Azimuth, degrees.</summary>
    public required double AzimuthDeg { get; init; }

    /// <summary>Geometric elevation, degrees.</summary>
    public required double ElevationDeg { get; init; }

    /// <summary>Slant range, km.</summary>
    public required double SlantRangeKm { get; init; }

    /// <summary>Models behind the figures.</summary>
    public required IReadOnlyList<ModelUse> Models { get; init; }
}
