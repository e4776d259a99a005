using PassPlanner.Service.Radios;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>A transmitter and its antenna.</summary>
public sealed record TransmitterDocument : IRadioDocument
{
    /// <summary>Identifier within the spacecraft.</summary>
    [Identifier(Required = true)]
    public string? Id { get; init; }

    /// <summary>Carrier frequency.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? FrequencyHz { get; init; }

    /// <summary>Power of the amplifier.</summary>
    [Quantity(0, 1e5, "W", AboveMinimum = true, Required = true)]
    public double? PowerW { get; init; }

    /// <summary>Loss between the amplifier and the antenna; 0 when left out.</summary>
    [Quantity(0, 30, "dB")]
    public double? LineLossDb { get; init; }

    /// <inheritdoc/>
    [Quantity(-10, 50, "dB")]
    public double? RequiredMarginDb { get; init; }

    /// <inheritdoc/>
    [Quantity(0, 90, "degrees")]
    public double? MinimumElevationDeg { get; init; }

    /// <inheritdoc/>
    [Quantity(0, 3600, "s")]
    public double? AcquisitionS { get; init; }

    /// <summary>Share of the year whose weather the margin must stand; 99 when left out; used by the weather models.</summary>
    [Quantity(50, 99.999, "percent")]
    public double? AvailabilityPercent { get; init; }

    /// <inheritdoc/>
    [Part(Required = true)]
    public PatternDocument? Pattern { get; init; }

    /// <inheritdoc/>
    [Quantity(-1e6, 1e6, "", Count = 3)]
    public IReadOnlyList<double>? Boresight { get; init; }

    /// <inheritdoc/>
    [Quantity(-1e6, 1e6, "", Count = 3)]
    public IReadOnlyList<double>? Reference { get; init; }

    /// <inheritdoc/>
    [Part(Required = true)]
    public PolarisationDocument? Polarisation { get; init; }

    /// <inheritdoc/>
    [Choice("worst", "mean", "best")]
    public string? PolarisationCase { get; init; }

    /// <inheritdoc/>
    [List(1, 64, Required = true)]
    public IReadOnlyList<WaveformDocument>? Waveforms { get; init; }
}
