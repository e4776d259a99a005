namespace PassPlanner.Exchange.Patterns;

/// <summary>A row that could not be read.</summary>
/// <param name="Row">Row, from 1, the header included.</param>
/// <param name="Field">Field, from 1.</param>
/// <param name="Reason">What is wrong, with the value, the unit and the range.</param>
public sealed record RefusedRow(int Row, int Field, string Reason);
