namespace PassPlanner.Planning.Profiles;

/// <summary>A receiver of a spacecraft.</summary>
public sealed record Receiver : SpacecraftRadio
{
    /// <summary>G/T where the antenna's gain is greatest, dB/K.</summary>
    public required double GOverTDbPerK { get; init; }
}
