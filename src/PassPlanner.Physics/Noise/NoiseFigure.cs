using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Noise;

/// <summary>Noise figures and the noise temperatures that they stand for: T = 290 K (F - 1) (IEEE).</summary>
public static class NoiseFigure
{
    /// <summary>Reference temperature of the definition, K.</summary>
    public const double ReferenceTemperatureK = 290;

    /// <summary>Noise temperature of a noise figure, K.</summary>
    /// <param name="noiseFigureDb">Noise figure, dB, 0 to 60.</param>
    /// <exception cref="ArgumentOutOfRangeException">The noise figure is out of range.</exception>
    public static double ToTemperatureK(double noiseFigureDb) =>
        ReferenceTemperatureK * (Decibel.ToRatio(RangeCheck.Within(noiseFigureDb, 0, 60, nameof(noiseFigureDb), "dB")) - 1);

    /// <summary>Noise figure of a noise temperature, dB.</summary>
    /// <param name="temperatureK">Noise temperature, K, at least 0.</param>
    public static double FromTemperatureK(double temperatureK) =>
        Decibel.FromRatio(1 + (temperatureK / ReferenceTemperatureK));
}
