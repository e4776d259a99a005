namespace PassPlanner.Service.Passes;

/// <summary>A half-open window of time: the start belongs to it, the end does not.</summary>
public sealed record WindowResponse
{
    /// <summary>First usable second.</summary>
    public required string StartUtc { get; init; }

    /// <summary>Last usable second plus one.</summary>
    public required string EndUtc { get; init; }
}
