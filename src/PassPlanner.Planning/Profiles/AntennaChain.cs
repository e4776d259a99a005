using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;

namespace PassPlanner.Planning.Profiles;

/// <summary>What a receive and a transmit chain of an antenna have in common.</summary>
public abstract record AntennaChain
{
    /// <summary>Identifier within the antenna.</summary>
    public required string Id { get; init; }

    /// <summary>Lowest frequency, Hz.</summary>
    public required double FromHz { get; init; }

    /// <summary>Highest frequency, Hz.</summary>
    public required double ToHz { get; init; }

    /// <summary>Antenna pattern, free of frequency.</summary>
    public required PatternModel Pattern { get; init; }

    /// <summary>Polarisation.</summary>
    public required Polarisation Polarisation { get; init; }

    /// <summary>Loss between the antenna and the receiver or amplifier, dB.</summary>
    public required double LineLossDb { get; init; }

    /// <summary>Clear-sky loss at the zenith as entered, dB; nothing when it was not entered.</summary>
    public double? ClearSkyZenithLossDb { get; init; }

    /// <summary>Whether a frequency lies in the chain's band, ends included.</summary>
    public bool Covers(double frequencyHz) => FromHz <= frequencyHz && frequencyHz <= ToHz;
}
