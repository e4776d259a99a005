namespace PassPlanner.Physics.Links;

/// <summary>
/// A link with fixed geometry as an engineer writes it down. Some members are alternatives of each other;
/// <see cref="FixedLinkBudget.Of"/> says when too few or too many are given.
/// </summary>
public sealed record FixedLinkInputs
{
    /// <summary>Frequency, Hz, 30 MHz to 350 GHz.</summary>
    public required double FrequencyHz { get; init; }

    /// <summary>Distance, km, above 0 and at most 10^9; or <see cref="FreeSpaceLossDb"/> or <see cref="PowerFluxDensityDbWPerM2"/>.</summary>
    public double? SlantRangeKm { get; init; }

    /// <summary>Free-space loss, dB, 0 to 400.</summary>
    public double? FreeSpaceLossDb { get; init; }

    /// <summary>Power flux density that arrives, dBW/m^2, -400 to 100.</summary>
    public double? PowerFluxDensityDbWPerM2 { get; init; }

    /// <summary>Radiated power, dBW, -200 to 200; or its parts, beginning with <see cref="PowerW"/>.</summary>
    public double? EirpDbw { get; init; }

    /// <summary>Power of the transmitter, W, above 0 and at most 10^9.</summary>
    public double? PowerW { get; init; }

    /// <summary>Loss between transmitter and antenna, dB, 0 to 100; goes with <see cref="PowerW"/>.</summary>
    public double LineLossDb { get; init; }

    /// <summary>Gain of the transmitting antenna, dBi, -100 to 100; goes with <see cref="PowerW"/>.</summary>
    public double GainDbi { get; init; }

    /// <summary>Pointing loss of the transmitting antenna, dB, 0 to 100; part of the radiated power towards the receiver.</summary>
    public double PointingLossDb { get; init; }

    /// <summary>Losses on the path and at the receiver, each -100 to 400 dB.</summary>
    public IReadOnlyList<NamedLoss> Losses { get; init; } = [];

    /// <summary>Receiving gain over system noise temperature, dB/K, -100 to 100; or <see cref="ReceiveGainDbi"/> and <see cref="SystemNoiseTemperatureK"/>.</summary>
    public double? GOverTDbPerK { get; init; }

    /// <summary>Gain of the receiving antenna, dBi, -100 to 100.</summary>
    public double? ReceiveGainDbi { get; init; }

    /// <summary>Pointing loss of the receiving antenna, dB, 0 to 100.</summary>
    public double ReceivePointingLossDb { get; init; }

    /// <summary>System noise temperature, K, above 0 and at most 10^6. Where it refers to the receiver's input, the line's loss belongs among the losses.</summary>
    public double? SystemNoiseTemperatureK { get; init; }

    /// <summary>Information bit rate, bit/s, above 0 and at most 10^12; or <see cref="NoiseBandwidthHz"/>; left out, the budget ends at C/N0.</summary>
    public double? BitRateBps { get; init; }

    /// <summary>Noise bandwidth, Hz, above 0 and at most 10^12, for a budget of C/N.</summary>
    public double? NoiseBandwidthHz { get; init; }

    /// <summary>Eb/N0 that the receiver needs, dB, -30 to 100; goes with <see cref="BitRateBps"/>.</summary>
    public double? RequiredEbN0Db { get; init; }

    /// <summary>C/N that the receiver needs, dB, -100 to 100; goes with <see cref="NoiseBandwidthHz"/>.</summary>
    public double? RequiredCOverNDb { get; init; }

    /// <summary>Received power that the receiver needs, dBW, -400 to 100; goes with <see cref="ReceiveGainDbi"/> and without another requirement.</summary>
    public double? RequiredReceivedPowerDbw { get; init; }

    /// <summary>What the real modem loses against the requirement, dB, 0 to 100.</summary>
    public double ImplementationLossDb { get; init; }
}
