using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Passes;

/// <summary>Parameters of a budget, as the API description shows them.</summary>
public sealed record BudgetParameters : PassLinkParameters
{
    /// <summary>Instant within the pass; the best second when left out.</summary>
    [FromQuery(Name = "atUtc")]
    public string? AtUtc { get; init; }

    /// <summary>Index of a waveform of the pass; the most robust one when left out.</summary>
    [FromQuery(Name = "waveform")]
    public string? Waveform { get; init; }
}
