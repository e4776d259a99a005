namespace PassPlanner.Exchange.ElementSets;

/// <summary>What was read of a text.</summary>
/// <param name="Accepted">Element sets in the order of the text.</param>
/// <param name="Refused">Lines that could not be read, in the order of the text.</param>
/// <param name="Format">Form of the text.</param>
public sealed record ElementSetReading(IReadOnlyList<ReadElementSet> Accepted, IReadOnlyList<RefusedLine> Refused, ElementSetFormat Format);
