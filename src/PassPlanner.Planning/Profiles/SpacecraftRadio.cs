using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Pointing;
using PassPlanner.Physics.Waveforms;

namespace PassPlanner.Planning.Profiles;

/// <summary>What a transmitter and a receiver of a spacecraft have in common.</summary>
public abstract record SpacecraftRadio
{
    /// <summary>Identifier within the spacecraft.</summary>
    public required string Id { get; init; }

    /// <summary>Carrier frequency, Hz.</summary>
    public required double FrequencyHz { get; init; }

    /// <summary>Margin that the operator's policy asks for, dB.</summary>
    public required double RequiredMarginDb { get; init; }

    /// <summary>Elevation above which every second must be usable for the pass to close, degrees.</summary>
    public required double MinimumElevationDeg { get; init; }

    /// <summary>Time from first closing until data flow, s.</summary>
    public required double AcquisitionS { get; init; }

    /// <summary>Antenna pattern.</summary>
    public required PatternModel Pattern { get; init; }

    /// <summary>How the antenna stands on the body.</summary>
    public required AntennaMounting Mounting { get; init; }

    /// <summary>Polarisation.</summary>
    public required Polarisation Polarisation { get; init; }

    /// <summary>Relative tilt that the mismatch is taken for.</summary>
    public required PolarisationCase PolarisationCase { get; init; }

    /// <summary>Waveforms, at least one, slowest first.</summary>
    public required IReadOnlyList<Waveform> Waveforms { get; init; }
}
