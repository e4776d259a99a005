using System.Text.Json.Serialization;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>What a transmitter and a receiver of a spacecraft have in common.</summary>
public abstract record RadioDocument
{
    /// <summary>Identifier within the spacecraft.</summary>
    [JsonPropertyOrder(-1)]
    [Identifier(Required = true)]
    public string? Id { get; init; }

    /// <summary>Carrier frequency.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? FrequencyHz { get; init; }

    /// <summary>Margin that the operator's policy asks for; 3 when left out.</summary>
    [Quantity(-10, 50, "dB")]
    public double? RequiredMarginDb { get; init; }

    /// <summary>Elevation above which a pass must close throughout to count as closing; 10 when left out.</summary>
    [Quantity(0, 90, "degrees")]
    public double? MinimumElevationDeg { get; init; }

    /// <summary>Time from first closing until data flow; 0 when left out.</summary>
    [Quantity(0, 3600, "s")]
    public double? AcquisitionS { get; init; }

    /// <summary>Share of the year whose weather the margin must stand; 99 when left out; used by the weather models.</summary>
    [Quantity(50, 99.999, "percent")]
    public double? AvailabilityPercent { get; init; }

    /// <summary>Antenna pattern.</summary>
    [Part(Required = true)]
    public PatternDocument? Pattern { get; init; }

    /// <summary>Direction of the antenna's axis in body axes; +Z when left out.</summary>
    [Quantity(-1e6, 1e6, "", Count = 3)]
    public IReadOnlyList<double>? Boresight { get; init; }

    /// <summary>Body direction of phi = 0, made perpendicular to the boresight; +X when left out.</summary>
    [Quantity(-1e6, 1e6, "", Count = 3)]
    public IReadOnlyList<double>? Reference { get; init; }

    /// <summary>Polarisation.</summary>
    [Part(Required = true)]
    public PolarisationDocument? Polarisation { get; init; }

    /// <summary>Relative tilt that the mismatch is taken for; worst when left out.</summary>
    [Choice("worst", "mean", "best")]
    public string? PolarisationCase { get; init; }

    /// <summary>Waveforms that the radio can use.</summary>
    [List(1, 64, Required = true)]
    public IReadOnlyList<WaveformDocument>? Waveforms { get; init; }
}
