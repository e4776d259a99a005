namespace PassPlanner.Planning.Profiles;

/// <summary>An antenna of a station.</summary>
public sealed record Antenna
{
    /// <summary>Identifier within the station.</summary>
    public required string Id { get; init; }

    /// <summary>Name for people.</summary>
    public required string Name { get; init; }

    /// <summary>Time held before a contact, s.</summary>
    public required double SetUpS { get; init; }

    /// <summary>Time held after a contact, s.</summary>
    public required double TearDownS { get; init; }

    /// <summary>Direction of a mount that does not move; nothing for a mount that follows the track.</summary>
    public FixedDirection? FixedDirection { get; init; }

    /// <summary>Pointing errors.</summary>
    public required PointingErrors Pointing { get; init; }

    /// <summary>Receive chains.</summary>
    public required IReadOnlyList<ReceiveChain> Receive { get; init; }

    /// <summary>Transmit chains.</summary>
    public required IReadOnlyList<TransmitChain> Transmit { get; init; }
}
