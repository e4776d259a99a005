using System.Text.Json.Serialization;

namespace PassPlanner.Service.Profiles;

/// <summary>A page of a list.</summary>
/// <typeparam name="T">Type of the items.</typeparam>
public sealed record ProfileList<T>
{
    /// <summary>Items in order.</summary>
    public required IReadOnlyList<T> Items { get; init; }

    /// <summary>Cursor of the next page; null on the last.</summary>
    [JsonIgnore(Condition = JsonIgnoreCondition.Never)]
    public string? Next { get; init; }
}
