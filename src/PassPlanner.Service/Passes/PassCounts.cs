namespace PassPlanner.Service.Passes;

/// <summary>Numbers of passes by verdict, after the filters.</summary>
public sealed record PassCounts
{
    /// <summary>All.</summary>
    public required int Passes { get; init; }

    /// <summary>Closing.</summary>
    public required int Closes { get; init; }

    /// <summary>Closing in part.</summary>
    public required int ClosesInPart { get; init; }

    /// <summary>Not closing.</summary>
    public required int DoesNotClose { get; init; }
}
