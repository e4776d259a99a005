using PassPlanner.Physics.Waveforms;

namespace PassPlanner.Planning.Links;

/// <summary>
/// The waveforms of a radio, slowest first, with the C/N0 that each needs. The margin of a waveform is C/N0 less its
/// need; the best waveform at a C/N0 is the fastest whose margin is at least the required one, and where there is
/// none, the one with the greatest margin.
/// </summary>
public sealed class WaveformLadder
{
    private readonly double[] needDbHz;

    /// <summary>Orders the waveforms and computes their needs.</summary>
    /// <param name="waveforms">At least one waveform.</param>
    /// <param name="requiredMarginDb">Margin that the operator's policy asks for, dB.</param>
    /// <exception cref="ArgumentException">There is no waveform.</exception>
    public WaveformLadder(IReadOnlyList<Waveform> waveforms, double requiredMarginDb)
    {
        if (waveforms.Count == 0)
        {
            throw new ArgumentException("waveforms is empty; it must have at least one waveform", nameof(waveforms));
        }

        Waveforms = [.. waveforms.OrderBy(w => w.BitRateBps).ThenBy(w => w.RequiredEbN0Db + w.ImplementationLossDb)];
        RequiredMarginDb = requiredMarginDb;
        needDbHz = [.. Waveforms.Select(w => (10 * Math.Log10(w.BitRateBps)) + w.RequiredEbN0Db + w.ImplementationLossDb)];
        MostRobust = Array.IndexOf(needDbHz, needDbHz.Min());
    }

    /// <summary>Waveforms, slowest first.</summary>
    public IReadOnlyList<Waveform> Waveforms { get; }

    /// <summary>Margin that the operator's policy asks for, dB.</summary>
    public double RequiredMarginDb { get; }

    /// <summary>Index of the waveform that needs the least C/N0.</summary>
    public int MostRobust { get; }

    /// <summary>C/N0 at which the margin of a waveform is 0, dBHz.</summary>
    public double NeedDbHz(int waveform) => needDbHz[waveform];

    /// <summary>Margin of a waveform, dB.</summary>
    public double MarginDb(int waveform, double cOverN0DbHz) => cOverN0DbHz - needDbHz[waveform];

    /// <summary>Whether any waveform has the required margin.</summary>
    public bool Closes(double cOverN0DbHz) => MarginDb(MostRobust, cOverN0DbHz) >= RequiredMarginDb;

    /// <summary>Index of the best waveform.</summary>
    public int Best(double cOverN0DbHz)
    {
        for (int i = needDbHz.Length - 1; i >= 0; i--)
        {
            if (MarginDb(i, cOverN0DbHz) >= RequiredMarginDb)
            {
                return i;
            }
        }

        return MostRobust;
    }
}
