using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>Noise of a receive chain, entered in one of three ways.</summary>
public sealed record NoiseDocument
{
    /// <summary>The way it is entered.</summary>
    [Choice("systemTemperature", "gOverT", "components", Required = true)]
    public string? Kind { get; init; }

    /// <summary>System noise temperature at the antenna's terminal (kind systemTemperature).</summary>
    [Quantity(0, 1e6, "K", AboveMinimum = true)]
    public double? SystemNoiseTemperatureK { get; init; }

    /// <summary>G/T on the boresight (kind gOverT).</summary>
    [Quantity(-60, 80, "dB/K")]
    public double? GOverTDbPerK { get; init; }

    /// <summary>Noise temperature of the receiver at its input (kind components).</summary>
    [Quantity(0, 1e6, "K", AboveMinimum = true)]
    public double? ReceiverNoiseTemperatureK { get; init; }

    /// <summary>Physical temperature of the line (kind components); 290 when left out.</summary>
    [Quantity(0, 400, "K")]
    public double? LineTemperatureK { get; init; }

    /// <summary>Noise picked up from the ground and the structure (kind components); 0 when left out.</summary>
    [Quantity(0, 400, "K")]
    public double? SpilloverTemperatureK { get; init; }
}
