namespace PassPlanner.Service.Passes;

/// <summary>A model behind a result.</summary>
public sealed record ModelUse
{
    /// <summary>What it models.</summary>
    public required string Name { get; init; }

    /// <summary>Source and edition.</summary>
    public required string Edition { get; init; }

    /// <summary>What to know about its use here.</summary>
    public required string Note { get; init; }
}
