namespace PassPlanner.Physics.Noise;

/// <summary>Noise of a receiving antenna at one instant, at the antenna's terminal.</summary>
/// <param name="SystemNoiseTemperatureK">System noise temperature, K.</param>
/// <param name="GOverTDbPerK">Gain towards the transmitter over that temperature, dB/K.</param>
public readonly record struct ReceivedNoise(double SystemNoiseTemperatureK, double GOverTDbPerK);
