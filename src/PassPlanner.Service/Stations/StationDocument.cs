using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>A station: a place, its horizon, its radio climate and its antennas.</summary>
public sealed record StationDocument
{
    /// <summary>Identifier, 1 to 64 of a-z, 0-9 and hyphen; made from the name when left out.</summary>
    [Identifier]
    public string? Id { get; init; }

    /// <summary>Name for people.</summary>
    [Label(120, Required = true)]
    public string? Name { get; init; }

    /// <summary>Where it stands on the WGS-84 ellipsoid.</summary>
    [Part(Required = true)]
    public PositionDocument? Position { get; init; }

    /// <summary>Horizon by azimuth, linear between its points and around; one point is a constant; 5 degrees when left out.</summary>
    [List(1, 720)]
    public IReadOnlyList<MaskPointDocument>? HorizonMask { get; init; }

    /// <summary>Whether the mask's elevations are as seen through the air (ITU-R P.834-9) instead of geometric; false when left out.</summary>
    public bool? MaskIsApparent { get; init; }

    /// <summary>Radio climate; kept with the profile, used by the weather models.</summary>
    [Part]
    public ClimateDocument? Climate { get; init; }

    /// <summary>Antennas at the station.</summary>
    [List(0, 100)]
    public IReadOnlyList<AntennaDocument>? Antennas { get; init; }

    /// <summary>Revision; written by the service, not used when sent.</summary>
    public int? Revision { get; init; }

    /// <summary>When the revision was saved; written by the service, not used when sent.</summary>
    public string? SavedUtc { get; init; }

    /// <summary>Whether it belongs to the demo scenario; written by the service, not used when sent.</summary>
    public bool? IsDemo { get; init; }
}
