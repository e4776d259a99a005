namespace PassPlanner.Service.ElementSets;

/// <summary>One element set of an upload.</summary>
public sealed record UploadedSet
{
    /// <summary>Line on which it begins.</summary>
    public required int LineNumber { get; init; }

    /// <summary>Spacecraft; left out when none matches.</summary>
    public string? Spacecraft { get; init; }

    /// <summary>Catalogue number.</summary>
    public required int CatalogNumber { get; init; }

    /// <summary>Name in the source.</summary>
    public required string Name { get; init; }

    /// <summary>Epoch.</summary>
    public required string EpochUtc { get; init; }
}
