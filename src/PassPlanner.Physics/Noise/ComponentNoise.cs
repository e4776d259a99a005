using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Noise;

/// <summary>Kind <c>components</c>: antenna (sky and spillover), line and receiver in cascade.</summary>
public sealed record ComponentNoise : SystemNoise
{
    /// <summary>The parts of a receiving chain.</summary>
    /// <param name="receiverNoiseTemperatureK">Noise temperature of the receiver at its input, K, above 0 and at most 1,000,000.</param>
    /// <param name="lineTemperatureK">Physical temperature of the line, K, 0 to 400.</param>
    /// <param name="spilloverTemperatureK">What the ground adds to the antenna's temperature, K, 0 to 400.</param>
    /// <exception cref="ArgumentOutOfRangeException">A temperature is out of range.</exception>
    public ComponentNoise(
        double receiverNoiseTemperatureK,
        double lineTemperatureK = NoiseFigure.ReferenceTemperatureK,
        double spilloverTemperatureK = 0)
    {
        ReceiverNoiseTemperatureK = RangeCheck.AboveZero(receiverNoiseTemperatureK, 1e6, nameof(receiverNoiseTemperatureK), "K");
        LineTemperatureK = RangeCheck.Within(lineTemperatureK, 0, 400, nameof(lineTemperatureK), "K");
        SpilloverTemperatureK = RangeCheck.Within(spilloverTemperatureK, 0, 400, nameof(spilloverTemperatureK), "K");
    }

    /// <summary>Noise temperature of the receiver at its input, K.</summary>
    public double ReceiverNoiseTemperatureK { get; }

    /// <summary>Physical temperature of the line, K.</summary>
    public double LineTemperatureK { get; }

    /// <summary>What the ground adds to the antenna's temperature, K.</summary>
    public double SpilloverTemperatureK { get; }

    /// <inheritdoc/>
    public override bool FollowsSky => true;

    /// <inheritdoc/>
    public override double TemperatureK(double peakGainDbi, double skyTemperatureK, double lineLossDb) =>
        AtTerminalK(skyTemperatureK + SpilloverTemperatureK, lineLossDb);

    /// <summary>System noise temperature at the antenna's terminal, K: T antenna + T line (L - 1) + L T receiver.</summary>
    /// <param name="antennaTemperatureK">Noise that the antenna picks up, K.</param>
    /// <param name="lineLossDb">Loss L of the line, dB, at least 0.</param>
    public double AtTerminalK(double antennaTemperatureK, double lineLossDb) =>
        antennaTemperatureK + NoiseCascade.TemperatureAtInputK(
            [NoiseCascade.Line(lineLossDb, LineTemperatureK), new NoiseStage(0, ReceiverNoiseTemperatureK)]);

    /// <summary>System noise temperature at the receiver's input, K: the terminal's over L.</summary>
    /// <param name="antennaTemperatureK">Noise that the antenna picks up, K.</param>
    /// <param name="lineLossDb">Loss L of the line, dB, at least 0.</param>
    public double AtReceiverK(double antennaTemperatureK, double lineLossDb) =>
        AtTerminalK(antennaTemperatureK, lineLossDb) * Decibel.ToRatio(-lineLossDb);
}
