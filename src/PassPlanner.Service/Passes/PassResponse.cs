namespace PassPlanner.Service.Passes;

/// <summary>One pass over one antenna by one link.</summary>
public record PassResponse
{
    /// <summary>Spacecraft.</summary>
    public required string Spacecraft { get; init; }

    /// <summary>Its name.</summary>
    public required string SpacecraftName { get; init; }

    /// <summary>Station.</summary>
    public required string Station { get; init; }

    /// <summary>Its name.</summary>
    public required string StationName { get; init; }

    /// <summary>Antenna.</summary>
    public required string Antenna { get; init; }

    /// <summary>Its name.</summary>
    public required string AntennaName { get; init; }

    /// <summary>Link.</summary>
    public required LinkReference Link { get; init; }

    /// <summary>Carrier frequency, Hz.</summary>
    public required double FrequencyHz { get; init; }

    /// <summary>Acquisition of signal: rise above the horizon mask; the end of the search when aosIsOpen.</summary>
    public required string AosUtc { get; init; }

    /// <summary>Loss of signal: set below the horizon mask; the end of the search when losIsOpen.</summary>
    public required string LosUtc { get; init; }

    /// <summary>Whether the spacecraft was up before the search began.</summary>
    public required bool AosIsOpen { get; init; }

    /// <summary>Whether the spacecraft is still up where the search ends.</summary>
    public required bool LosIsOpen { get; init; }

    /// <summary>Length of the pass, s.</summary>
    public required double DurationS { get; init; }

    /// <summary>Instant of the greatest elevation.</summary>
    public required string MaximumElevationUtc { get; init; }

    /// <summary>Greatest elevation, degrees, geometric.</summary>
    public required double MaximumElevationDeg { get; init; }

    /// <summary>Instant of the least range.</summary>
    public required string ClosestApproachUtc { get; init; }

    /// <summary>Least range, km.</summary>
    public required double ClosestRangeKm { get; init; }

    /// <summary>Azimuth at AOS, degrees.</summary>
    public required double AosAzimuthDeg { get; init; }

    /// <summary>Azimuth at LOS, degrees.</summary>
    public required double LosAzimuthDeg { get; init; }

    /// <summary>closes, closesInPart or doesNotClose.</summary>
    public required string Verdict { get; init; }

    /// <summary>What limits the pass, in words; empty when it closes.</summary>
    public required string LimitingCause { get; init; }

    /// <summary>What limits the pass, for programs.</summary>
    public required CauseResponse Cause { get; init; }

    /// <summary>Margin that the operator's policy asks for, dB.</summary>
    public required double RequiredMarginDb { get; init; }

    /// <summary>Greatest value of the timeline's marginDb, dB.</summary>
    public required double HighestMarginDb { get; init; }

    /// <summary>Least value of the timeline's marginDb, dB.</summary>
    public required double LowestMarginDb { get; init; }

    /// <summary>Usable windows.</summary>
    public required IReadOnlyList<WindowResponse> UsableWindows { get; init; }

    /// <summary>Usable seconds.</summary>
    public required int UsableS { get; init; }

    /// <summary>Bytes that the usable seconds carry.</summary>
    public required double YieldBytes { get; init; }

    /// <summary>Fastest information bit rate at a usable second, bit/s; 0 when none is usable.</summary>
    public required double HighestBitRateBps { get; init; }

    /// <summary>Elevation at the first usable second, degrees; left out when none is usable.</summary>
    public double? UsableElevationFromDeg { get; init; }

    /// <summary>Elevation at the last usable second, degrees; left out when none is usable.</summary>
    public double? UsableElevationToDeg { get; init; }

    /// <summary>Element set behind the result.</summary>
    public required ElementSetUse ElementSet { get; init; }

    /// <summary>Margin along the pass, when profileStepS was given.</summary>
    public MarginProfileResponse? MarginProfile { get; init; }

    /// <summary>Address of the pass.</summary>
    public required string PassUrl { get; init; }

    /// <summary>Address of the pass second by second.</summary>
    public required string TimelineUrl { get; init; }
}
