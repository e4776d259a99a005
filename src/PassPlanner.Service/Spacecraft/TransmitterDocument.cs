using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>A transmitter and its antenna.</summary>
public sealed record TransmitterDocument : RadioDocument
{
    /// <summary>Power of the amplifier.</summary>
    [Quantity(0, 1e5, "W", AboveMinimum = true, Required = true)]
    public double? PowerW { get; init; }

    /// <summary>Loss between the amplifier and the antenna; 0 when left out.</summary>
    [Quantity(0, 30, "dB")]
    public double? LineLossDb { get; init; }
}
