namespace PassPlanner.Physics.Links;

/// <summary>One line of a link budget.</summary>
/// <param name="Id">Short fixed name for programs, such as <c>freeSpaceLoss</c>.</param>
/// <param name="Name">Name for people.</param>
/// <param name="ValueDb">Value, signed as it enters the total, in the line's unit.</param>
/// <param name="Unit">Unit of the value: dB, dBi, dBW, dB/K, dBHz and the like.</param>
/// <param name="Kind">Term or sum.</param>
/// <param name="Source">Where the value came from: a model with its edition, or who entered it.</param>
public sealed record BudgetLine(string Id, string Name, double ValueDb, string Unit, BudgetLineKind Kind, string Source);
