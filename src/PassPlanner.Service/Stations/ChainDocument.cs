using System.Text.Json.Serialization;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>What a receive and a transmit chain of an antenna have in common.</summary>
public abstract record ChainDocument
{
    /// <summary>Identifier within the antenna.</summary>
    [JsonPropertyOrder(-1)]
    [Identifier(Required = true)]
    public string? Id { get; init; }

    /// <summary>Lowest frequency.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? FromHz { get; init; }

    /// <summary>Highest frequency.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? ToHz { get; init; }

    /// <summary>Antenna pattern.</summary>
    [Part(Required = true)]
    public PatternDocument? Pattern { get; init; }

    /// <summary>Polarisation.</summary>
    [Part(Required = true)]
    public PolarisationDocument? Polarisation { get; init; }

    /// <summary>Loss between the antenna and the receiver or amplifier; 0 when left out.</summary>
    [Quantity(0, 30, "dB")]
    public double? LineLossDb { get; init; }

    /// <summary>Clear-sky loss at the zenith, spread by 1/sin(elevation).</summary>
    [Quantity(0, 100, "dB")]
    public double? ClearSkyZenithLossDb { get; init; }
}
