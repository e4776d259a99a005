namespace PassPlanner.Service.Validation;

/// <summary>Bounds on the number of entries of a list, and whether it must be there.</summary>
/// <param name="minimumCount">Least number of entries.</param>
/// <param name="maximumCount">Greatest number of entries.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class ListAttribute(int minimumCount, int maximumCount) : Attribute
{
    /// <summary>Least number of entries.</summary>
    public int MinimumCount { get; } = minimumCount;

    /// <summary>Greatest number of entries.</summary>
    public int MaximumCount { get; } = maximumCount;

    /// <summary>Whether the member must be there.</summary>
    public bool Required { get; init; }
}
