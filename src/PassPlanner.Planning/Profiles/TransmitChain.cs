namespace PassPlanner.Planning.Profiles;

/// <summary>One transmit band of an antenna.</summary>
public sealed record TransmitChain : AntennaChain
{
    /// <summary>Power of the amplifier, W.</summary>
    public required double PowerW { get; init; }
}
