namespace PassPlanner.Physics.Noise;

/// <summary>A stage of a receiving chain.</summary>
/// <param name="GainDb">Gain, dB; negative for a loss.</param>
/// <param name="TemperatureK">Noise temperature at the stage's input, K; of a loss L at temperature T it is T (L - 1).</param>
public readonly record struct NoiseStage(double GainDb, double TemperatureK);
