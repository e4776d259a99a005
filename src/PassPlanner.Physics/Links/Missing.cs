namespace PassPlanner.Physics.Links;

/// <summary>The value does not exist.</summary>
/// <typeparam name="T">Type of the value that is not there.</typeparam>
/// <param name="Reason">Why, as a sentence for a person.</param>
public sealed record Missing<T>(string Reason) : Finding<T>;
