using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Assessments;

/// <summary>What a pass carries over one link.</summary>
public sealed record Assessment
{
    /// <summary>Verdict.</summary>
    public required Verdict Verdict { get; init; }

    /// <summary>What limits the pass.</summary>
    public required LimitingCause Cause { get; init; }

    /// <summary>Greatest margin of the best waveform at each second, dB.</summary>
    public required double HighestMarginDb { get; init; }

    /// <summary>Least margin of the best waveform at each second, dB.</summary>
    public required double LowestMarginDb { get; init; }

    /// <summary>Second at which the most robust waveform has its greatest margin.</summary>
    public required UtcInstant BestUtc { get; init; }

    /// <summary>Usable windows, half-open, in order.</summary>
    public required IReadOnlyList<TimeWindow> UsableWindows { get; init; }

    /// <summary>Usable seconds.</summary>
    public required int UsableS { get; init; }

    /// <summary>Bytes that the usable seconds carry, with the best waveform at each second.</summary>
    public required double YieldBytes { get; init; }

    /// <summary>Fastest information bit rate at a usable second, bit/s; 0 when none is usable.</summary>
    public required double HighestBitRateBps { get; init; }

    /// <summary>Elevation at the first usable second, degrees; nothing when none is usable.</summary>
    public double? UsableFromElevationDeg { get; init; }

    /// <summary>Elevation at the last usable second, degrees; nothing when none is usable.</summary>
    public double? UsableToElevationDeg { get; init; }

    /// <summary>Margin along the pass, when it was asked for.</summary>
    public MarginProfile? Profile { get; init; }
}
