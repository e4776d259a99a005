using PassPlanner.Physics.Pointing;

namespace PassPlanner.Planning.Profiles;

/// <summary>A spacecraft as the planner computes with it.</summary>
public sealed record Spacecraft
{
    /// <summary>Identifier.</summary>
    public required string Id { get; init; }

    /// <summary>Name for people.</summary>
    public required string Name { get; init; }

    /// <summary>Revision of the profile.</summary>
    public required int Revision { get; init; }

    /// <summary>Catalogue number; 0 when it has none.</summary>
    public required int CatalogNumber { get; init; }

    /// <summary>Attitude law.</summary>
    public required AttitudeLaw Attitude { get; init; }

    /// <summary>Transmitters.</summary>
    public required IReadOnlyList<Transmitter> Transmitters { get; init; }

    /// <summary>Receivers.</summary>
    public required IReadOnlyList<Receiver> Receivers { get; init; }
}
