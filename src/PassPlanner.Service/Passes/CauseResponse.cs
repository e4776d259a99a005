namespace PassPlanner.Service.Passes;

/// <summary>What limits a pass, for programs.</summary>
public sealed record CauseResponse
{
    /// <summary>none, range, spacecraftAntenna, pointing, atmosphere, polarisation, noise, acquisition or power.</summary>
    public required string Kind { get; init; }

    /// <summary>What the cause costs, dB, negative or 0.</summary>
    public required double ChangeDb { get; init; }

    /// <summary>What the best second lacks, dB; 0 when some second closes.</summary>
    public required double ShortByDb { get; init; }
}
