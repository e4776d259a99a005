namespace PassPlanner.Service.Validation;

/// <summary>A text member that takes one of a few words.</summary>
/// <param name="words">The words allowed.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class ChoiceAttribute(params string[] words) : Attribute
{
    /// <summary>The words allowed.</summary>
    public IReadOnlyList<string> Words { get; } = words;

    /// <summary>Whether the member must be there.</summary>
    public bool Required { get; init; }
}
