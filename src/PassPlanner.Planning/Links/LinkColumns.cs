namespace PassPlanner.Planning.Links;

/// <summary>What a link does along a stretch of a pass, as columns; filled again and again by a <see cref="LinkChain"/>.</summary>
public sealed class LinkColumns(int capacity)
{
    private readonly LinkSample[] samples = new LinkSample[capacity];

    /// <summary>Samples filled.</summary>
    public int Count { get; internal set; }

    /// <summary>The samples.</summary>
    public ReadOnlySpan<LinkSample> Samples => samples.AsSpan(0, Count);

    internal Span<LinkSample> Buffer => samples;
}
