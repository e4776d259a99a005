using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Passes;

/// <summary>Parameters of a list of passes, as the API description shows them; <see cref="PassQuery"/> reads them.</summary>
public sealed record PassListParameters
{
    /// <summary>Start of the period, ISO 8601 UTC, 1957 to 2100; now when left out.</summary>
    /// <example>2026-03-18T04:00:00Z</example>
    [FromQuery(Name = "fromUtc")]
    public string? FromUtc { get; init; }

    /// <summary>End of the period, at most 31 days after its start; 24 hours after it when left out.</summary>
    [FromQuery(Name = "toUtc")]
    public string? ToUtc { get; init; }

    /// <summary>One station; all when left out.</summary>
    [FromQuery(Name = "station")]
    public string? Station { get; init; }

    /// <summary>One antenna's identifier; all when left out.</summary>
    [FromQuery(Name = "antenna")]
    public string? Antenna { get; init; }

    /// <summary>One spacecraft; all when left out.</summary>
    [FromQuery(Name = "spacecraft")]
    public string? Spacecraft { get; init; }

    /// <summary>downlink, uplink, a radio's identifier, or radio:chain; all when left out.</summary>
    [FromQuery(Name = "link")]
    public string? Link { get; init; }

    /// <summary>Least highest margin, dB, -200 to 200.</summary>
    [FromQuery(Name = "minimumMarginDb")]
    public string? MinimumMarginDb { get; init; }

    /// <summary>closes, closesInPart or doesNotClose.</summary>
    [FromQuery(Name = "verdict")]
    public string? Verdict { get; init; }

    /// <summary>true keeps passes with at least one usable second of positive margin.</summary>
    /// <example>true</example>
    [FromQuery(Name = "closes")]
    public string? Closes { get; init; }

    /// <summary>Greatest number of items, 1 to 1000; 200 when left out.</summary>
    [FromQuery(Name = "limit")]
    public string? Limit { get; init; }

    /// <summary>The next of the page before.</summary>
    [FromQuery(Name = "cursor")]
    public string? Cursor { get; init; }

    /// <summary>Step of the margin profile of each item, 1 to 60 s; no profile when left out.</summary>
    [FromQuery(Name = "profileStepS")]
    public string? ProfileStepS { get; init; }
}
