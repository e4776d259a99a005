namespace PassPlanner.Service.ElementSets;

/// <summary>What was understood of an upload of element sets.</summary>
public sealed record ElementSetUpload
{
    /// <summary>Sets that are new.</summary>
    public required IReadOnlyList<UploadedSet> Accepted { get; init; }

    /// <summary>Sets that were there already.</summary>
    public required IReadOnlyList<UploadedSet> Unchanged { get; init; }

    /// <summary>Sets whose catalogue number no spacecraft has.</summary>
    public required IReadOnlyList<UploadedSet> Unmatched { get; init; }

    /// <summary>Lines that could not be read.</summary>
    public required IReadOnlyList<RefusedLineResponse> Refused { get; init; }
}
