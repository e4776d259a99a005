namespace PassPlanner.Service.Validation;

/// <summary>One thing wrong with one member of a document.</summary>
/// <param name="Pointer">JSON pointer as a fragment, such as #/antennas/0/receive/0/pattern/diameterM.</param>
/// <param name="Detail">What is wrong, with the value, the unit and what is allowed.</param>
public sealed record FieldError(string Pointer, string Detail);
