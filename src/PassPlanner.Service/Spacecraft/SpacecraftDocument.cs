using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>A spacecraft: its radios, its attitude, its recorder and its needs.</summary>
public sealed record SpacecraftDocument
{
    /// <summary>Identifier, 1 to 64 of a-z, 0-9 and hyphen; made from the name when left out.</summary>
    [Identifier]
    public string? Id { get; init; }

    /// <summary>Name for people.</summary>
    [Label(120, Required = true)]
    public string? Name { get; init; }

    /// <summary>Catalogue number by which element sets are matched; none when left out.</summary>
    [Quantity(1, 999999999, "")]
    public int? CatalogNumber { get; init; }

    /// <summary>Weight of its bytes in a plan; 1 when left out.</summary>
    [Quantity(0, 1000, "")]
    public double? Priority { get; init; }

    /// <summary>Attitude law; nadir when left out.</summary>
    [Part]
    public AttitudeDocument? Attitude { get; init; }

    /// <summary>Transmitters.</summary>
    [List(0, 20)]
    public IReadOnlyList<TransmitterDocument>? Transmitters { get; init; }

    /// <summary>Receivers.</summary>
    [List(0, 20)]
    public IReadOnlyList<ReceiverDocument>? Receivers { get; init; }

    /// <summary>Recorder.</summary>
    [Part]
    public RecorderDocument? Recorder { get; init; }

    /// <summary>What it must get.</summary>
    [List(0, 20)]
    public IReadOnlyList<NeedDocument>? Needs { get; init; }

    /// <summary>Revision; written by the service, not used when sent.</summary>
    public int? Revision { get; init; }

    /// <summary>When the revision was saved; written by the service, not used when sent.</summary>
    public string? SavedUtc { get; init; }

    /// <summary>Whether it belongs to the demo scenario; written by the service, not used when sent.</summary>
    public bool? IsDemo { get; init; }
}
