using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Passes;

/// <summary>Which antenna and link of a pass is meant, as the API description shows it.</summary>
public record PassLinkParameters
{
    /// <summary>Antenna; the one of the highest yield when left out.</summary>
    [FromQuery(Name = "antenna")]
    public string? Antenna { get; init; }

    /// <summary>downlink, uplink, a radio's identifier, or radio:chain; the one of the highest yield when left out.</summary>
    [FromQuery(Name = "link")]
    public string? Link { get; init; }
}
