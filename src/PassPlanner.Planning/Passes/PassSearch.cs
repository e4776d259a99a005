namespace PassPlanner.Planning.Passes;

/// <summary>What a search for passes found.</summary>
/// <param name="Status">How the spacecraft stands to the horizon.</param>
/// <param name="Passes">Passes by AOS; for a spacecraft that never sets, one for each UTC day that the period touches.</param>
/// <param name="Failure">Where the propagation ends within the period; nothing when it does not.</param>
public sealed record PassSearch(VisibilityStatus Status, IReadOnlyList<Pass> Passes, PropagationFailure? Failure);
