namespace PassPlanner.Service.Validation;

/// <summary>A free text member of bounded length, without control characters and overrides of direction.</summary>
/// <param name="maximumLength">Greatest number of characters.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class LabelAttribute(int maximumLength) : Attribute
{
    /// <summary>Greatest number of characters.</summary>
    public int MaximumLength { get; } = maximumLength;

    /// <summary>Whether the member must be there and not blank.</summary>
    public bool Required { get; init; }
}
