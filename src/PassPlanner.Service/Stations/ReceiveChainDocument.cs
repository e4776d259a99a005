using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>One receive band of an antenna.</summary>
public sealed record ReceiveChainDocument : ChainDocument
{
    /// <summary>Noise.</summary>
    [Part(Required = true)]
    public NoiseDocument? Noise { get; init; }
}
