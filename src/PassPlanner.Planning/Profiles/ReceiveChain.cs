using PassPlanner.Physics.Noise;

namespace PassPlanner.Planning.Profiles;

/// <summary>One receive band of an antenna.</summary>
public sealed record ReceiveChain : AntennaChain
{
    /// <summary>Noise, in the form in which it was entered.</summary>
    public required SystemNoise Noise { get; init; }
}
