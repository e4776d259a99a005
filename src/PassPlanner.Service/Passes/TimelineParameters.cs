using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Passes;

/// <summary>Parameters of a timeline, as the API description shows them.</summary>
public sealed record TimelineParameters : PassLinkParameters
{
    /// <summary>Time between samples, whole seconds, 1 to 600; 1 when left out.</summary>
    [FromQuery(Name = "stepS")]
    public string? StepS { get; init; }

    /// <summary>json or csv; by the Accept header when left out.</summary>
    [FromQuery(Name = "format")]
    public string? Format { get; init; }
}
