using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>A link with fixed geometry. Some members are alternatives; a problem says when too few or too many are given.</summary>
public sealed record BudgetQuestion
{
    /// <summary>Frequency.</summary>
    [Quantity(3e7, 3e11, "Hz", Required = true)]
    public double? FrequencyHz { get; init; }

    /// <summary>Distance; or freeSpaceLossDb or powerFluxDensityDbWPerM2.</summary>
    [Quantity(0, 1e9, "km", AboveMinimum = true)]
    public double? SlantRangeKm { get; init; }

    /// <summary>Free-space loss.</summary>
    [Quantity(0, 400, "dB")]
    public double? FreeSpaceLossDb { get; init; }

    /// <summary>Power flux density that arrives.</summary>
    [Quantity(-400, 100, "dBW/m2")]
    public double? PowerFluxDensityDbWPerM2 { get; init; }

    /// <summary>Radiated power; or its parts powerW, lineLossDb, gainDbi, pointingLossDb.</summary>
    [Quantity(-200, 200, "dBW")]
    public double? EirpDbw { get; init; }

    /// <summary>Power of the transmitter.</summary>
    [Quantity(0, 1e9, "W", AboveMinimum = true)]
    public double? PowerW { get; init; }

    /// <summary>Loss between the transmitter and its antenna; 0 when left out.</summary>
    [Quantity(0, 100, "dB")]
    public double? LineLossDb { get; init; }

    /// <summary>Gain of the transmitting antenna; 0 when left out.</summary>
    [Quantity(-100, 100, "dBi")]
    public double? GainDbi { get; init; }

    /// <summary>Pointing loss of the transmitting antenna; 0 when left out.</summary>
    [Quantity(0, 100, "dB")]
    public double? PointingLossDb { get; init; }

    /// <summary>Losses on the way and at the receiver.</summary>
    [List(0, 50)]
    public IReadOnlyList<LossDocument>? Losses { get; init; }

    /// <summary>G/T of the receiving antenna; or its parts receiveGainDbi, systemNoiseTemperatureK.</summary>
    [Quantity(-100, 100, "dB/K")]
    public double? GOverTDbPerK { get; init; }

    /// <summary>Gain of the receiving antenna.</summary>
    [Quantity(-100, 100, "dBi")]
    public double? ReceiveGainDbi { get; init; }

    /// <summary>Pointing loss of the receiving antenna; 0 when left out.</summary>
    [Quantity(0, 100, "dB")]
    public double? ReceivePointingLossDb { get; init; }

    /// <summary>System noise temperature.</summary>
    [Quantity(0, 1e6, "K", AboveMinimum = true)]
    public double? SystemNoiseTemperatureK { get; init; }

    /// <summary>Information bit rate; or noiseBandwidthHz; without either the budget ends at C/N0.</summary>
    [Quantity(0, 1e12, "bit/s", AboveMinimum = true)]
    public double? BitRateBps { get; init; }

    /// <summary>Noise bandwidth, for a budget of C/N.</summary>
    [Quantity(0, 1e12, "Hz", AboveMinimum = true)]
    public double? NoiseBandwidthHz { get; init; }

    /// <summary>Eb/N0 that the receiver needs.</summary>
    [Quantity(-30, 100, "dB")]
    public double? RequiredEbN0Db { get; init; }

    /// <summary>C/N that the receiver needs.</summary>
    [Quantity(-100, 100, "dB")]
    public double? RequiredCOverNDb { get; init; }

    /// <summary>Received power that the receiver needs.</summary>
    [Quantity(-400, 100, "dBW")]
    public double? RequiredReceivedPowerDbw { get; init; }

    /// <summary>Loss of the real modem; 0 when left out.</summary>
    [Quantity(0, 100, "dB")]
    public double? ImplementationLossDb { get; init; }
}
