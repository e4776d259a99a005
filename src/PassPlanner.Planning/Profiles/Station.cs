using PassPlanner.Physics.Frames;
using PassPlanner.Planning.Passes;

namespace PassPlanner.Planning.Profiles;

/// <summary>A station as the planner computes with it.</summary>
public sealed record Station
{
    /// <summary>Identifier.</summary>
    public required string Id { get; init; }

    /// <summary>Name for people.</summary>
    public required string Name { get; init; }

    /// <summary>Revision of the profile.</summary>
    public required int Revision { get; init; }

    /// <summary>Place on the WGS-84 ellipsoid.</summary>
    public required GeodeticPosition Position { get; init; }

    /// <summary>Horizon, geometric elevation by azimuth.</summary>
    public required HorizonMask Mask { get; init; }

    /// <summary>Antennas.</summary>
    public required IReadOnlyList<Antenna> Antennas { get; init; }
}
