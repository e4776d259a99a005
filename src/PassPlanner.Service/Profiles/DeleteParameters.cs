using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Profiles;

/// <summary>Parameters of a deletion, as the API description shows them.</summary>
public sealed record DeleteParameters
{
    /// <summary>true deletes what depends on the thing as well; refused without it.</summary>
    [FromQuery(Name = "cascade")]
    public string? Cascade { get; init; }
}
