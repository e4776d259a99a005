using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Noise;

/// <summary>Noise of stages one after another (H. T. Friis, Proc. IRE 32, 1944).</summary>
public static class NoiseCascade
{
    /// <summary>A passive line: its loss, and the noise of its warmth.</summary>
    /// <param name="lossDb">Loss, dB, at least 0.</param>
    /// <param name="temperatureK">Physical temperature, K.</param>
    public static NoiseStage Line(double lossDb, double temperatureK) =>
        new(-lossDb, temperatureK * (Decibel.ToRatio(lossDb) - 1));

    /// <summary>Noise temperature of all stages at the input of the first, K: T1 + T2/g1 + T3/(g1 g2) and so on.</summary>
    /// <param name="stages">Stages from the antenna on.</param>
    public static double TemperatureAtInputK(ReadOnlySpan<NoiseStage> stages)
    {
        double sum = 0;
        double gain = 1;
        foreach (NoiseStage stage in stages)
        {
            sum += stage.TemperatureK / gain;
            gain *= Decibel.ToRatio(stage.GainDb);
        }

        return sum;
    }
}
