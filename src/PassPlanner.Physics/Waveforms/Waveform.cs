using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Waveforms;

/// <summary>Modulation, code and bit rate of a radio, with what its receiver needs.</summary>
public sealed record Waveform
{
    /// <summary>A waveform.</summary>
    /// <param name="name">Name for people, not empty.</param>
    /// <param name="bitRateBps">Information bit rate, bit/s, above 0 and at most 10^12.</param>
    /// <param name="requiredEbN0Db">Energy per information bit over noise density that the receiver needs, dB, -2 to 60.</param>
    /// <param name="implementationLossDb">What the real modem loses against that, dB, 0 to 30.</param>
    /// <param name="frameEfficiency">Share of the information bits that are payload, above 0 and at most 1.</param>
    /// <param name="occupiedBandwidthHz">Occupied bandwidth, Hz, above 0 and at most 10^12; left out when not known.</param>
    /// <param name="source">Where the requirement came from.</param>
    /// <exception cref="ArgumentException">A value is out of range or the name is empty.</exception>
    public Waveform(
        string name,
        double bitRateBps,
        double requiredEbN0Db,
        double implementationLossDb = 0,
        double frameEfficiency = 1,
        double? occupiedBandwidthHz = null,
        string source = "entered")
    {
        Name = string.IsNullOrWhiteSpace(name) ? throw new ArgumentException("name is empty; a waveform must have one", nameof(name)) : name;
        BitRateBps = RangeCheck.AboveZero(bitRateBps, 1e12, nameof(bitRateBps), "bit/s");
        RequiredEbN0Db = RangeCheck.Within(requiredEbN0Db, -2, 60, nameof(requiredEbN0Db), "dB");
        ImplementationLossDb = RangeCheck.Within(implementationLossDb, 0, 30, nameof(implementationLossDb), "dB");
        FrameEfficiency = RangeCheck.AboveZero(frameEfficiency, 1, nameof(frameEfficiency), "");
        OccupiedBandwidthHz = RangeCheck.AboveZeroIfGiven(occupiedBandwidthHz, 1e12, nameof(occupiedBandwidthHz), "Hz");
        Source = source;
    }

    /// <summary>Name for people.</summary>
    public string Name { get; }

    /// <summary>Information bit rate, bit/s.</summary>
    public double BitRateBps { get; }

    /// <summary>Energy per information bit over noise density that the receiver needs, dB; never below -1.59 dB, the limit of any code, in nature.</summary>
    public double RequiredEbN0Db { get; }

    /// <summary>What the real modem loses against that, dB.</summary>
    public double ImplementationLossDb { get; }

    /// <summary>Share of the information bits that are payload.</summary>
    public double FrameEfficiency { get; }

    /// <summary>Occupied bandwidth, Hz; none when not known.</summary>
    public double? OccupiedBandwidthHz { get; }

    /// <summary>Where the requirement came from.</summary>
    public string Source { get; }

    /// <summary>C/N0 at which the margin is 0, dBHz: required Eb/N0 + implementation loss + 10 log10 of the bit rate.</summary>
    public double ThresholdCOverN0DbHz => RequiredEbN0Db + ImplementationLossDb + Decibel.FromRatio(BitRateBps);

    /// <summary>Margin, dB.</summary>
    /// <param name="cOverN0DbHz">Carrier power over noise density, dBHz.</param>
    public double MarginDb(double cOverN0DbHz) => cOverN0DbHz - ThresholdCOverN0DbHz;
}
