using PassPlanner.Physics.Orbits;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>An element set and the line on which it begins.</summary>
/// <param name="ElementSet">Element set.</param>
/// <param name="LineNumber">Line, from 1.</param>
public sealed record ReadElementSet(ElementSet ElementSet, int LineNumber);
