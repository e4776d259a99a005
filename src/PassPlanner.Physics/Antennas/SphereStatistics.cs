using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>How an antenna's gain is spread over all directions, for a spacecraft whose attitude is not controlled.</summary>
public static class SphereStatistics
{
    private const double GoldenRatio = 0.6180339887498949;
    private const int Rings = 512;
    private const int DirectionsPerRing = 64;

    /// <summary>
    /// The gain that a percentage of all directions (by solid angle) lie below, dBi. Found from 32,768 directions of
    /// equal solid angle: good to 0.05 dB where the gain changes by less than 1 dB per percent.
    /// </summary>
    /// <param name="pattern">The pattern.</param>
    /// <param name="percentile">Percent of directions with less gain, above 0 and below 100.</param>
    /// <exception cref="ArgumentOutOfRangeException">The percentile is out of range.</exception>
    public static double GainAtPercentileDbi(AntennaPattern pattern, double percentile)
    {
        CheckPercentile(percentile);
        int perRing = pattern.IsRotationallySymmetric ? 1 : DirectionsPerRing;
        int rings = Rings * DirectionsPerRing / perRing;
        double[] gainsDbi = new double[rings * perRing];
        for (int ring = 0; ring < rings; ring++)
        {
            double offAxisRad = Math.Acos(1 - (2 * (ring + 0.5) / rings));
            for (int i = 0; i < perRing; i++)
            {
                // Each ring is turned by the golden ratio of a step, so that no two rings count the same angles.
                double phiRad = 2 * Math.PI * (i + (ring * GoldenRatio)) / perRing;
                gainsDbi[(ring * perRing) + i] = pattern.GainDbi(offAxisRad, phiRad);
            }
        }

        Array.Sort(gainsDbi);
        double place = Math.Clamp((percentile / 100 * gainsDbi.Length) - 0.5, 0, gainsDbi.Length - 1);
        int below = (int)place;
        double above = gainsDbi[Math.Min(below + 1, gainsDbi.Length - 1)];
        return gainsDbi[below] + ((place - below) * (above - gainsDbi[below]));
    }

    internal static double CheckPercentile(double percentile) =>
        percentile is > 0 and < 100
            ? percentile
            : throw RangeCheck.Refusal(percentile, nameof(percentile), "percent", "above 0 and below 100");
}
