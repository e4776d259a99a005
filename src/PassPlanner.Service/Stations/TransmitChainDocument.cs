using PassPlanner.Service.Radios;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>One transmit band of an antenna.</summary>
public sealed record TransmitChainDocument
{
    /// <summary>Identifier within the antenna.</summary>
    [Identifier(Required = true)]
    public string? Id { get; init; }

    /// <summary>Lowest frequency sent.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? FromHz { get; init; }

    /// <summary>Highest frequency sent.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? ToHz { get; init; }

    /// <summary>Power of the amplifier.</summary>
    [Quantity(0, 1e6, "W", AboveMinimum = true, Required = true)]
    public double? PowerW { get; init; }

    /// <summary>Loss between the amplifier and the antenna; 0 when left out.</summary>
    [Quantity(0, 30, "dB")]
    public double? LineLossDb { get; init; }

    /// <summary>Antenna pattern.</summary>
    [Part(Required = true)]
    public PatternDocument? Pattern { get; init; }

    /// <summary>Polarisation.</summary>
    [Part(Required = true)]
    public PolarisationDocument? Polarisation { get; init; }

    /// <summary>Clear-sky loss at the zenith, spread by 1/sin(elevation).</summary>
    [Quantity(0, 100, "dB")]
    public double? ClearSkyZenithLossDb { get; init; }
}
