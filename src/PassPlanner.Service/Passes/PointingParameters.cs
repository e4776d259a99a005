using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Passes;

/// <summary>Parameters of a pointing table, as the API description shows them.</summary>
public sealed record PointingParameters : PassLinkParameters
{
    /// <summary>Time between samples, whole seconds, 1 to 600; 1 when left out.</summary>
    [FromQuery(Name = "stepS")]
    public string? StepS { get; init; }
}
