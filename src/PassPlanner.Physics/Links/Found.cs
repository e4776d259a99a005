namespace PassPlanner.Physics.Links;

/// <summary>The value exists.</summary>
/// <typeparam name="T">Type of the value.</typeparam>
/// <param name="Value">The value.</param>
public sealed record Found<T>(T Value) : Finding<T>;
