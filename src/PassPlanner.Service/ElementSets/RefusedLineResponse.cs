namespace PassPlanner.Service.ElementSets;

/// <summary>A line of an upload that could not be read.</summary>
public sealed record RefusedLineResponse
{
    /// <summary>Line, from 1.</summary>
    public required int LineNumber { get; init; }

    /// <summary>Column, from 1.</summary>
    public required int Column { get; init; }

    /// <summary>Why.</summary>
    public required string Reason { get; init; }
}
