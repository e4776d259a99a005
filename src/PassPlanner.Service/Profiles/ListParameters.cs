using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Profiles;

/// <summary>Parameters of a list of profiles, as the API description shows them.</summary>
public sealed record ListParameters
{
    /// <summary>Greatest number of items, 1 to 1000; 1000 when left out.</summary>
    [FromQuery(Name = "limit")]
    public string? Limit { get; init; }

    /// <summary>The next of the page before.</summary>
    [FromQuery(Name = "cursor")]
    public string? Cursor { get; init; }
}
