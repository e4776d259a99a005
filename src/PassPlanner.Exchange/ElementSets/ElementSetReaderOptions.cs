namespace PassPlanner.Exchange.ElementSets;

/// <summary>How element sets are read.</summary>
public sealed record ElementSetReaderOptions
{
    /// <summary>Whether a line whose checksum is wrong is taken all the same.</summary>
    public bool AcceptBadChecksums { get; init; }

    /// <summary>Greatest number of characters read.</summary>
    public int MaximumCharacters { get; init; } = 64 * 1024 * 1024;
}
