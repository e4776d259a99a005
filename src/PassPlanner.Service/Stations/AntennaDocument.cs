using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>An antenna: its mount, its pointing and its chains.</summary>
public sealed record AntennaDocument
{
    /// <summary>Identifier within the station; made from the name when left out.</summary>
    [Identifier]
    public string? Id { get; init; }

    /// <summary>Name for people.</summary>
    [Label(120, Required = true)]
    public string? Name { get; init; }

    /// <summary>Time held before a contact; 0 when left out.</summary>
    [Quantity(0, 7200, "s")]
    public double? SetUpS { get; init; }

    /// <summary>Time held after a contact; 0 when left out.</summary>
    [Quantity(0, 7200, "s")]
    public double? TearDownS { get; init; }

    /// <summary>How it is moved; an ideal mount when left out.</summary>
    [Part]
    public MountDocument? Mount { get; init; }

    /// <summary>How well it points; perfectly when left out.</summary>
    [Part]
    public PointingDocument? Pointing { get; init; }

    /// <summary>Receive chains, one for each band.</summary>
    [List(0, 20)]
    public IReadOnlyList<ReceiveChainDocument>? Receive { get; init; }

    /// <summary>Transmit chains, one for each band.</summary>
    [List(0, 20)]
    public IReadOnlyList<TransmitChainDocument>? Transmit { get; init; }
}
