using System.Diagnostics.CodeAnalysis;
using PassPlanner.Service.Stations;

namespace PassPlanner.Service.Passes;

/// <summary>One pass with what its page needs.</summary>
public sealed record PassDetailResponse : PassResponse
{
    /// <summary>Adds to an item of the list.</summary>
    [SetsRequiredMembers]
    public PassDetailResponse(PassResponse item)
        : base(item)
    {
    }

    /// <summary>Address of the budget.</summary>
    public string BudgetUrl { get; init; } = "";

    /// <summary>Address of the pointing table.</summary>
    public string PointingUrl { get; init; } = "";

    /// <summary>Revision of the station's profile.</summary>
    public int StationRevision { get; init; }

    /// <summary>Revision of the spacecraft's profile.</summary>
    public int SpacecraftRevision { get; init; }

    /// <summary>Horizon mask, geometric.</summary>
    public IReadOnlyList<MaskPointDocument> HorizonMask { get; init; } = [];

    /// <summary>Waveforms, slowest first.</summary>
    public IReadOnlyList<WaveformUse> Waveforms { get; init; } = [];

    /// <summary>Index of the waveform that needs the least C/N0.</summary>
    public int MostRobustWaveform { get; init; }

    /// <summary>Second at which the most robust waveform has its greatest margin.</summary>
    public string BestUtc { get; init; } = "";

    /// <summary>Sun at the greatest elevation.</summary>
    public SunResponse Sun { get; init; } = new() { AzimuthDeg = 0, ElevationDeg = 0 };

    /// <summary>The same pass by other antennas and links.</summary>
    public IReadOnlyList<AlternativeResponse> Alternatives { get; init; } = [];

    /// <summary>Models behind the figures.</summary>
    public IReadOnlyList<ModelUse> Models { get; init; } = [];
}
