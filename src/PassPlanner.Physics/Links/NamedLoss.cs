namespace PassPlanner.Physics.Links;

/// <summary>A loss that an engineer enters under a name of their own.</summary>
/// <param name="Name">Name for people.</param>
/// <param name="ValueDb">Loss, dB; positive when power is lost.</param>
public readonly record struct NamedLoss(string Name, double ValueDb);
