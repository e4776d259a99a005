using MathNet.Numerics;
using MathNet.Numerics.RootFinding;
using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Waveforms;

/// <summary>Bit error rate of uncoded modulations in white Gaussian noise (J. G. Proakis, Digital Communications, 5th edition, chapter 4).</summary>
public static class BitErrorRate
{
    private const double LowestEbN0Db = -30;
    private const double HighestEbN0Db = 40;

    /// <summary>Bit error rate, 0 to 0.5. The bounds for 8PSK and 16QAM are a little high below 2 dB.</summary>
    /// <param name="modulation">Modulation.</param>
    /// <param name="ebN0Db">Energy per bit over noise density, dB.</param>
    public static double Of(Modulation modulation, double ebN0Db)
    {
        double ebN0 = Decibel.ToRatio(ebN0Db);
        switch (modulation)
        {
            case Modulation.CoherentPsk:
                return Q(Math.Sqrt(2 * ebN0));
            case Modulation.DifferentiallyEncodedBpsk:
                double one = Q(Math.Sqrt(2 * ebN0));
                return 2 * one * (1 - one);
            case Modulation.DifferentialBpsk:
                return 0.5 * Math.Exp(-ebN0);
            case Modulation.CoherentFsk:
                return Q(Math.Sqrt(ebN0));
            case Modulation.NoncoherentFsk:
                return 0.5 * Math.Exp(-ebN0 / 2);
            case Modulation.EightPsk:
                return 2.0 / 3 * Q(Math.Sqrt(6 * ebN0) * Math.Sin(Math.PI / 8));
            case Modulation.SixteenQam:
                return 0.75 * Q(Math.Sqrt(0.8 * ebN0));
            default:
                throw new ArgumentOutOfRangeException(nameof(modulation), modulation, "modulation must be one of the listed ones");
        }
    }

    /// <summary>Eb/N0 that a bit error rate needs, dB, to 1e-9 dB.</summary>
    /// <param name="modulation">Modulation.</param>
    /// <param name="bitErrorRate">Bit error rate, 1e-15 to 0.1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The bit error rate is out of range.</exception>
    public static double RequiredEbN0Db(Modulation modulation, double bitErrorRate)
    {
        RangeCheck.Within(bitErrorRate, 1e-15, 0.1, nameof(bitErrorRate), "");
        return Brent.FindRoot(
            ebN0Db => Math.Log(Math.Max(double.Epsilon, Of(modulation, ebN0Db)) / bitErrorRate), LowestEbN0Db, HighestEbN0Db, 1e-11, 500);
    }

    /// <summary>Tail of the normal distribution.</summary>
    private static double Q(double x) => 0.5 * SpecialFunctions.Erfc(x / Math.Sqrt(2));
}
