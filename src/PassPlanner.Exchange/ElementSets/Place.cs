namespace PassPlanner.Exchange.ElementSets;

/// <summary>A place in a text.</summary>
/// <param name="LineNumber">Line, from 1.</param>
/// <param name="Column">Column, from 1.</param>
internal readonly record struct Place(int LineNumber, int Column);
