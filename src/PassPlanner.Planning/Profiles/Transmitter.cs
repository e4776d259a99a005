namespace PassPlanner.Planning.Profiles;

/// <summary>A transmitter of a spacecraft.</summary>
public sealed record Transmitter : SpacecraftRadio
{
    /// <summary>Power of the amplifier, W.</summary>
    public required double PowerW { get; init; }

    /// <summary>Loss between the amplifier and the antenna, dB.</summary>
    public required double LineLossDb { get; init; }
}
