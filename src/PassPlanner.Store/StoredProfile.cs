namespace PassPlanner.Store;

/// <summary>One revision of a profile as it is stored.</summary>
public sealed record StoredProfile
{
    /// <summary>Identifier.</summary>
    public required string Id { get; init; }

    /// <summary>Revision, from 1.</summary>
    public required int Revision { get; init; }

    /// <summary>Document, JSON.</summary>
    public required string DocumentJson { get; init; }

    /// <summary>When it was saved, ticks of 100 ns since 1970-01-01T00:00:00Z.</summary>
    public required long SavedUtcTicks { get; init; }

    /// <summary>Whether it belongs to the demo scenario.</summary>
    public required bool IsDemo { get; init; }
}
