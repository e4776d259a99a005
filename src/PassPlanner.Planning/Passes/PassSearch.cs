namespace PassPlanner.Planning.Passes;

/// <summary>What a search for passes found.</summary>
/// <param name="Status">How the spacecraft stands to the horizon.</param>
/// <param name="Passes">Passes in order; for a spacecraft that is always up, one for each UTC day of the period.</param>
/// <param name="Failure">Where the propagation ends; nothing when it does not.</param>
public sealed record PassSearch(VisibilityStatus Status, IReadOnlyList<Pass> Passes, PropagationFailure? Failure);
