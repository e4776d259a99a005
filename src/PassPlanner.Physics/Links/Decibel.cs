namespace PassPlanner.Physics.Links;

/// <summary>Power ratios and their decibels: 10 log10 of the ratio.</summary>
public static class Decibel
{
    /// <summary>Decibels of a power ratio.</summary>
    /// <param name="ratio">Ratio of two powers, at least 0; 0 gives negative infinity.</param>
    public static double FromRatio(double ratio) => 10 * Math.Log10(ratio);

    /// <summary>The power ratio of a number of decibels.</summary>
    /// <param name="valueDb">Decibels.</param>
    public static double ToRatio(double valueDb) => Math.Exp(valueDb * (Math.Log(10) / 10));
}
