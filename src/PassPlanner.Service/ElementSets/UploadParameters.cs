using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.ElementSets;

/// <summary>Parameters of an upload, as the API description shows them.</summary>
public sealed record UploadParameters
{
    /// <summary>true takes lines whose checksum is wrong; refused without it.</summary>
    [FromQuery(Name = "acceptBadChecksums")]
    public string? AcceptBadChecksums { get; init; }
}
