namespace PassPlanner.Service.Validation;

/// <summary>A member that holds another document.</summary>
[AttributeUsage(AttributeTargets.Property)]
public sealed class PartAttribute : Attribute
{
    /// <summary>Whether the member must be there.</summary>
    public bool Required { get; init; }
}
