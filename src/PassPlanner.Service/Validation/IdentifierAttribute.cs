namespace PassPlanner.Service.Validation;

/// <summary>An identifier: 1 to 64 of a-z, 0-9 and hyphen.</summary>
[AttributeUsage(AttributeTargets.Property)]
public sealed class IdentifierAttribute : Attribute
{
    /// <summary>Whether the member must be there.</summary>
    public bool Required { get; init; }
}
