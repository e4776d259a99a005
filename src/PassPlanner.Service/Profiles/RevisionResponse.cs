namespace PassPlanner.Service.Profiles;

/// <summary>A revision of a profile.</summary>
public sealed record RevisionResponse
{
    /// <summary>Number, from 1.</summary>
    public required int Revision { get; init; }

    /// <summary>When it was saved.</summary>
    public required string SavedUtc { get; init; }
}
