namespace PassPlanner.Planning.Assessments;

/// <summary>Whether a pass closes a link.</summary>
public enum Verdict
{
    /// <summary>No second is usable.</summary>
    DoesNotClose,

    /// <summary>Some second is usable, but not every second above the link's minimum elevation.</summary>
    ClosesInPart,

    /// <summary>Every second above the link's minimum elevation is usable, acquisition aside; for a pass that stays below it, every second.</summary>
    Closes,
}
