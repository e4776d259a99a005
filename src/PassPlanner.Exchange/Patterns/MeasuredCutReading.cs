using PassPlanner.Physics.Antennas;

namespace PassPlanner.Exchange.Patterns;

/// <summary>What was read of a text of measured cuts: the cuts, or what is wrong; a pattern with holes is of no use.</summary>
/// <param name="Cuts">Cuts by phi; none when a row was refused.</param>
/// <param name="Refused">Rows that could not be read.</param>
public sealed record MeasuredCutReading(IReadOnlyList<MeasuredCut> Cuts, IReadOnlyList<RefusedRow> Refused);
