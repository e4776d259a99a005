using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Planning.Assessments;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Profiles;
using PassPlanner.Planning.Tests.Links;

namespace PassPlanner.Planning.Tests.Assessments;

/// <summary>One real pass of 38 degrees; the power decides how much of it closes.</summary>
public class PassAssessorTests
{
    private static readonly PassTrack Track = LinkScene.Track();

    [Fact]
    public void A_strong_link_closes_without_a_cause()
    {
        Assessment assessment = Assess(LinkScene.Transmitter with { PowerW = 1e5 });
        Assert.Equal(Verdict.Closes, assessment.Verdict);
        Assert.Equal(CauseKind.None, assessment.Cause.Kind);
        Assert.Equal("", assessment.Cause.InWords);
        Assert.Equal(Track.Count - 10, assessment.UsableS);
        Assert.Equal(Track.UtcOf(10), Assert.Single(assessment.UsableWindows).StartUtc);
        Assert.Equal(Track.UtcOf(Track.Count), assessment.UsableWindows[0].EndUtc);
    }

    [Fact]
    public void A_link_that_closes_about_the_middle_closes_in_part_for_range()
    {
        Assessment assessment = Assess(LinkScene.Transmitter with { PowerW = 0.9, Pattern = new IsotropicModel() });
        Assert.Equal(Verdict.ClosesInPart, assessment.Verdict);
        Assert.Equal(CauseKind.Range, assessment.Cause.Kind);
        Assert.Matches(@"^Range, \u2212\d+\.\d dB, below \d+\u00b0$", assessment.Cause.InWords);
        Assert.InRange(assessment.UsableS, 1, Track.Count - 1);
        Assert.Equal(assessment.UsableS, assessment.UsableWindows.Sum(w => w.DurationS));
    }

    [Fact]
    public void A_narrow_beam_that_looks_down_is_the_cause()
    {
        Assessment assessment = Assess(LinkScene.Transmitter with { PowerW = 0.5, Pattern = new GaussianBeamModel(12, 60) });
        Assert.Equal(CauseKind.SpacecraftAntenna, assessment.Cause.Kind);
    }

    [Fact]
    public void A_link_without_power_says_how_much_is_missing()
    {
        Assessment assessment = Assess(LinkScene.Transmitter with { PowerW = 1e-6, Pattern = new IsotropicModel() });
        Assert.Equal(Verdict.DoesNotClose, assessment.Verdict);
        Assert.Equal(CauseKind.Power, assessment.Cause.Kind);
        Assert.Equal(3 - assessment.HighestMarginDb, assessment.Cause.ShortByDb, 1e-9);
        Assert.StartsWith("Best second is ", assessment.Cause.InWords, StringComparison.Ordinal);
        Assert.Equal((0, 0.0, 0.0), (assessment.UsableS, assessment.YieldBytes, assessment.HighestBitRateBps));
        Assert.Empty(assessment.UsableWindows);
        Assert.Null(assessment.UsableFromElevationDeg);
    }

    [Fact]
    public void A_link_that_closes_for_less_than_the_acquisition_time_does_not_close()
    {
        Assessment assessment = Assess(LinkScene.Transmitter with { PowerW = 1e5, AcquisitionS = 3000 });
        Assert.Equal(Verdict.DoesNotClose, assessment.Verdict);
        Assert.Equal(CauseKind.Acquisition, assessment.Cause.Kind);
        Assert.Equal($"Closes for {Track.Count} s, acquisition takes 3000 s", assessment.Cause.InWords);
    }

    [Fact]
    public void A_pass_below_the_minimum_elevation_closes_when_every_second_does()
    {
        Assert.Equal(Verdict.Closes, Assess(LinkScene.Transmitter with { PowerW = 1e5, MinimumElevationDeg = 80 }).Verdict);
        Assert.Equal(Verdict.ClosesInPart, Assess(LinkScene.Transmitter with { PowerW = 0.9, Pattern = new IsotropicModel(), MinimumElevationDeg = 80 }).Verdict);
    }

    [Fact]
    public void The_yield_counts_the_user_bits_of_the_best_waveform()
    {
        var one = new Waveform("only", 8e6, 1, 0, 0.5);
        Assessment assessment = Assess(LinkScene.Transmitter with { PowerW = 1e5, Waveforms = [one] });
        Assert.Equal(assessment.UsableS * 8e6 * 0.5 / 8, assessment.YieldBytes, 1e-6);
        Assert.Equal(8e6, assessment.HighestBitRateBps);
    }

    [Fact]
    public void Stretches_read_one_by_one_give_the_same_as_one()
    {
        LinkChain chain = LinkScene.Downlink(LinkScene.Transmitter with { PowerW = 0.25 });
        var whole = new PassAssessor(chain, 7);
        var columns = new LinkColumns(Track.Count);
        chain.Evaluate(Track, columns);
        whole.Add(Track, columns);
        var parts = new PassAssessor(chain, 7);
        var part = new PassTrack(100);
        var frame = new PassPlanner.Physics.Frames.TopocentricFrame(LinkScene.Place);
        for (int done = 0; done < Track.Count; done += 100)
        {
            part.Fill(LinkScene.Trajectory, frame, Track.UtcOf(done), 1, Math.Min(100, Track.Count - done));
            chain.Evaluate(part, columns);
            parts.Add(part, columns);
        }

        (Assessment one, Assessment other) = (whole.Finish()!, parts.Finish()!);
        Assert.Equal(one.UsableWindows, other.UsableWindows);
        Assert.Equal(one.YieldBytes, other.YieldBytes);
        Assert.Equal(one.Cause, other.Cause);
        Assert.Equal(one.Profile!.MarginDb, other.Profile!.MarginDb);
        Assert.Equal((Track.Count + 6) / 7, one.Profile.MarginDb.Count);
    }

    [Fact]
    public void A_pass_without_a_whole_second_has_no_assessment() => Assert.Null(new PassAssessor(LinkScene.Downlink(), 0).Finish());

    private static Assessment Assess(Transmitter radio)
    {
        LinkChain chain = LinkScene.Downlink(radio);
        var columns = new LinkColumns(Track.Count);
        chain.Evaluate(Track, columns);
        var assessor = new PassAssessor(chain, 0);
        assessor.Add(Track, columns);
        return assessor.Finish()!;
    }
}
