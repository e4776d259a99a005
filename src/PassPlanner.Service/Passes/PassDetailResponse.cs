using PassPlanner.Service.Stations;

namespace PassPlanner.Service.Passes;

/// <summary>One pass with what its page needs.</summary>
public sealed record PassDetailResponse : PassResponse
{
    /// <summary>Address of the budget.</summary>
    public required string BudgetUrl { get; init; }

    /// <summary>Address of the pointing table.</summary>
    public required string PointingUrl { get; init; }

    /// <summary>Revision of the station's profile.</summary>
    public required int StationRevision { get; init; }

    /// <summary>Revision of the spacecraft's profile.</summary>
    public required int SpacecraftRevision { get; init; }

    /// <summary>Horizon mask, geometric.</summary>
    public required IReadOnlyList<MaskPointDocument> HorizonMask { get; init; }

    /// <summary>Waveforms, slowest first.</summary>
    public required IReadOnlyList<WaveformUse> Waveforms { get; init; }

    /// <summary>Index of the waveform that needs the least C/N0.</summary>
    public required int MostRobustWaveform { get; init; }

    /// <summary>Second at which the most robust waveform has its greatest margin.</summary>
    public required string BestUtc { get; init; }

    /// <summary>Sun at the greatest elevation.</summary>
    public required SunResponse Sun { get; init; }

    /// <summary>The same pass by other antennas and links.</summary>
    public required IReadOnlyList<AlternativeResponse> Alternatives { get; init; }

    /// <summary>Models behind the figures.</summary>
    public required IReadOnlyList<ModelUse> Models { get; init; }
}
