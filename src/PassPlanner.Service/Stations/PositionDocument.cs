using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>A place on the WGS-84 ellipsoid.</summary>
public sealed record PositionDocument
{
    /// <summary>Geodetic latitude, north positive.</summary>
    [Quantity(-90, 90, "degrees", Required = true)]
    public double? LatitudeDeg { get; init; }

    /// <summary>Longitude, east positive.</summary>
    [Quantity(-180, 360, "degrees", Required = true)]
    public double? LongitudeDeg { get; init; }

    /// <summary>Height above the ellipsoid; 0 when left out.</summary>
    [Quantity(-500, 9000, "m")]
    public double? HeightM { get; init; }
}
