using CsCheck;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Planning.Links;

namespace PassPlanner.Planning.Tests.Links;

public class WaveformLadderTests
{
    private static readonly Gen<WaveformLadder> Ladders = Gen.Select(
        Gen.Select(Gen.Double[1e3, 1e9], Gen.Double[-1, 20], Gen.Double[0, 4]).Array[1, 8],
        Gen.Double[-2, 8],
        (waveforms, requiredDb) => new WaveformLadder([.. waveforms.Select((w, i) => new Waveform($"w{i}", w.Item1, w.Item2, w.Item3))], requiredDb));

    [Fact]
    public void The_best_waveform_is_the_fastest_that_has_the_required_margin() => Gen.Select(Ladders, Gen.Double[20, 120]).Sample((ladder, cOverN0DbHz) =>
    {
        int best = ladder.Best(cOverN0DbHz);
        if (ladder.Closes(cOverN0DbHz))
        {
            Assert.True(ladder.MarginDb(best, cOverN0DbHz) >= ladder.RequiredMarginDb);
            Assert.All(
                ladder.Waveforms.Select((w, i) => (w, i)).Where(x => ladder.MarginDb(x.i, cOverN0DbHz) >= ladder.RequiredMarginDb),
                x => Assert.True(x.w.BitRateBps <= ladder.Waveforms[best].BitRateBps));
        }
        else
        {
            Assert.All(Enumerable.Range(0, ladder.Waveforms.Count), i => Assert.True(ladder.MarginDb(i, cOverN0DbHz) <= ladder.MarginDb(best, cOverN0DbHz)));
        }
    });

    [Fact]
    public void The_margin_is_what_the_waveform_itself_says() => Gen.Select(Ladders, Gen.Double[20, 120]).Sample((ladder, cOverN0DbHz) =>
        Assert.All(ladder.Waveforms.Select((w, i) => (w, i)), x => Assert.Equal(x.w.MarginDb(cOverN0DbHz), ladder.MarginDb(x.i, cOverN0DbHz), 1e-9)));

    [Fact]
    public void More_signal_never_means_a_slower_waveform() => Gen.Select(Ladders, Gen.Double[20, 120], Gen.Double[0, 20]).Sample((ladder, cOverN0DbHz, moreDb) =>
    {
        if (ladder.Closes(cOverN0DbHz))
        {
            Assert.True(ladder.Waveforms[ladder.Best(cOverN0DbHz + moreDb)].BitRateBps >= ladder.Waveforms[ladder.Best(cOverN0DbHz)].BitRateBps);
        }
    });

    [Fact]
    public void A_ladder_without_a_waveform_is_refused() => Assert.Throws<ArgumentException>(() => new WaveformLadder([], 3));
}
