using System.Text.Json.Serialization;

namespace PassPlanner.Service.Passes;

/// <summary>Passes of a period.</summary>
public sealed record PassListResponse
{
    /// <summary>Start of the period.</summary>
    public required string FromUtc { get; init; }

    /// <summary>End of the period.</summary>
    public required string ToUtc { get; init; }

    /// <summary>When the answer was worked out.</summary>
    public required string ComputedUtc { get; init; }

    /// <summary>Passes by AOS.</summary>
    public required IReadOnlyList<PassResponse> Items { get; init; }

    /// <summary>Cursor of the next page; null on the last.</summary>
    [JsonIgnore(Condition = JsonIgnoreCondition.Never)]
    public string? Next { get; init; }

    /// <summary>Numbers over all pages.</summary>
    public required PassCounts Counts { get; init; }

    /// <summary>What has no pass in the period, and why.</summary>
    public required IReadOnlyList<WithoutPassesResponse> WithoutPasses { get; init; }

    /// <summary>Models behind the figures.</summary>
    public required IReadOnlyList<ModelUse> Models { get; init; }
}
