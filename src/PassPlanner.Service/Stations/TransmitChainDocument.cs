using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>One transmit band of an antenna.</summary>
public sealed record TransmitChainDocument : ChainDocument
{
    /// <summary>Power of the amplifier.</summary>
    [Quantity(0, 1e6, "W", AboveMinimum = true, Required = true)]
    public double? PowerW { get; init; }
}
