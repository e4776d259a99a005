using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>A receiver and its antenna.</summary>
public sealed record ReceiverDocument : RadioDocument
{
    /// <summary>G/T where the antenna's gain is greatest; the pattern gives the gain relative to that.</summary>
    [Quantity(-60, 80, "dB/K", Required = true)]
    public double? GOverTDbPerK { get; init; }
}
