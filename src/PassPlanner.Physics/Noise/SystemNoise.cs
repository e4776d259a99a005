using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Noise;

/// <summary>
/// How the noise of a receiving chain was described. All temperatures refer to the antenna's terminal, before the line:
/// a line's loss is in the temperature, and is not taken from the gain.
/// </summary>
public abstract record SystemNoise
{
    private protected SystemNoise()
    {
    }

    /// <summary>Whether the temperature follows the sky, so that it must be asked for at every instant.</summary>
    public abstract bool FollowsSky { get; }

    /// <summary>System noise temperature, K.</summary>
    /// <param name="peakGainDbi">Peak gain of the antenna, dBi.</param>
    /// <param name="skyTemperatureK">Noise temperature of the sky in the beam, K.</param>
    /// <param name="lineLossDb">Loss between the antenna's terminal and the receiver, dB, at least 0.</param>
    public abstract double TemperatureK(double peakGainDbi, double skyTemperatureK, double lineLossDb);

    /// <summary>Temperature and G/T towards a transmitter.</summary>
    /// <param name="gainDbi">Gain towards the transmitter, dBi.</param>
    /// <param name="peakGainDbi">Peak gain of the antenna, dBi.</param>
    /// <param name="skyTemperatureK">Noise temperature of the sky in the beam, K.</param>
    /// <param name="lineLossDb">Loss between the antenna's terminal and the receiver, dB, at least 0.</param>
    public ReceivedNoise At(double gainDbi, double peakGainDbi, double skyTemperatureK, double lineLossDb)
    {
        double temperatureK = TemperatureK(peakGainDbi, skyTemperatureK, lineLossDb);
        return new ReceivedNoise(temperatureK, gainDbi - Decibel.FromRatio(temperatureK));
    }
}
