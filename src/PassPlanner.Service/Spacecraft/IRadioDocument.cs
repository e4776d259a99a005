using PassPlanner.Service.Radios;

namespace PassPlanner.Service.Spacecraft;

/// <summary>What a transmitter and a receiver of a spacecraft have in common.</summary>
public interface IRadioDocument
{
    /// <summary>Identifier within the spacecraft.</summary>
    string? Id { get; }

    /// <summary>Carrier frequency.</summary>
    double? FrequencyHz { get; }

    /// <summary>Margin that the operator's policy asks for; 3 when left out.</summary>
    double? RequiredMarginDb { get; }

    /// <summary>Elevation above which a pass must close throughout to count as closing; 10 when left out.</summary>
    double? MinimumElevationDeg { get; }

    /// <summary>Time from first closing until data flow; 0 when left out.</summary>
    double? AcquisitionS { get; }

    /// <summary>Antenna pattern.</summary>
    PatternDocument? Pattern { get; }

    /// <summary>Direction of the antenna's axis in body axes; +Z when left out.</summary>
    IReadOnlyList<double>? Boresight { get; }

    /// <summary>Body direction of phi = 0, made perpendicular to the boresight; +X when left out.</summary>
    IReadOnlyList<double>? Reference { get; }

    /// <summary>Polarisation.</summary>
    PolarisationDocument? Polarisation { get; }

    /// <summary>Relative tilt that the mismatch is taken for; worst when left out.</summary>
    string? PolarisationCase { get; }

    /// <summary>Waveforms that the radio can use.</summary>
    IReadOnlyList<WaveformDocument>? Waveforms { get; }
}
