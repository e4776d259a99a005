namespace PassPlanner.Store;

/// <summary>What came of a write.</summary>
public abstract record SaveOutcome
{
    private SaveOutcome()
    {
    }

    /// <summary>It was written.</summary>
    /// <param name="Revision">The revision that now stands; 0 when the profile is gone.</param>
    public sealed record Done(int Revision) : SaveOutcome;

    /// <summary>There is no such profile.</summary>
    public sealed record Missing : SaveOutcome;

    /// <summary>There is one with this identifier already.</summary>
    public sealed record Exists : SaveOutcome;

    /// <summary>The profile has changed since.</summary>
    /// <param name="CurrentRevision">The revision that stands.</param>
    public sealed record Conflict(int CurrentRevision) : SaveOutcome;

    /// <summary>Something depends on it.</summary>
    /// <param name="ElementSets">Number of element sets.</param>
    public sealed record Dependents(int ElementSets) : SaveOutcome;
}
