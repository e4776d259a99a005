namespace PassPlanner.Store;

/// <summary>A waveform of the operator's own, as it is stored.</summary>
public sealed record StoredWaveform
{
    /// <summary>Identifier.</summary>
    public required string Id { get; init; }

    /// <summary>Document, JSON.</summary>
    public required string DocumentJson { get; init; }
}
