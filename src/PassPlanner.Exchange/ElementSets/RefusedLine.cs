namespace PassPlanner.Exchange.ElementSets;

/// <summary>A line that could not be read.</summary>
/// <param name="LineNumber">Line, from 1.</param>
/// <param name="Column">Column, from 1; of CSV, the number of the field.</param>
/// <param name="Reason">What is wrong, with the value, the unit and what is allowed.</param>
public sealed record RefusedLine(int LineNumber, int Column, string Reason);
