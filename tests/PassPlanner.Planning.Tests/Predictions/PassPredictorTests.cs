using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Pointing;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Passes;
using PassPlanner.Planning.Predictions;
using PassPlanner.Planning.Profiles;
using PassPlanner.Planning.Tests.Links;

namespace PassPlanner.Planning.Tests.Predictions;

public class PassPredictorTests
{
    private static readonly TimeWindow Period = new(UtcInstant.FromCalendar(2022, 1, 23), UtcInstant.FromCalendar(2022, 1, 25));
    private static readonly Station South = StationOf("south", 0);
    private static readonly Station Deaf = StationOf("deaf", 0) with { Antennas = [] };
    private static readonly TrackedSpacecraft Low = new(SpacecraftOf("low"), LinkScene.Trajectory);
    private static readonly TrackedSpacecraft Silent = new(SpacecraftOf("silent"), null);

    [Fact]
    public void Passes_come_by_AOS_and_every_pair_without_one_has_its_reason()
    {
        Prediction prediction = Predict(new PlanningModel([South, Deaf], [Low, Silent]));
        Assert.NotEmpty(prediction.Passes);
        Assert.Equal(prediction.Passes.OrderBy(p => p.Pass.Window.StartUtc).Select(p => p.Pass.Window), prediction.Passes.Select(p => p.Pass.Window));
        Assert.Equal(
            [("low", "deaf", NoPassReason.NoAntennaForFrequency), ("silent", "", NoPassReason.NoElementSet)],
            prediction.WithoutPasses.Select(w => (w.Spacecraft.Id, w.Station?.Id ?? "", w.Reason)));
    }

    [Fact]
    public void The_same_question_gets_the_same_answer()
    {
        (string, double, double)[] Once() => [.. Predict(new PlanningModel([South], [Low])).Passes
            .Select(p => (p.Pass.Window.ToString(), p.Assessment.YieldBytes, p.Assessment.HighestMarginDb))];
        Assert.Equal(Once(), Once());
    }

    [Fact]
    public void A_pass_of_the_list_is_the_one_found_at_any_of_its_instants()
    {
        var model = new PlanningModel([South], [Low]);
        foreach (PredictedPass listed in Predict(model).Passes.Take(6))
        {
            PredictedPass found = new PassPredictor(model)
                .PredictAt(Low, South, listed.Pass.MaximumElevationUtc, link => link.Radio.Id == listed.Chain.Link.Radio.Id, CancellationToken.None).Single();
            Assert.Equal(listed.Pass, found.Pass);
            Assert.Equal(listed.Assessment.YieldBytes, found.Assessment.YieldBytes);
            Assert.Equal(listed.Assessment.UsableWindows, found.Assessment.UsableWindows);
        }
    }

    [Fact]
    public void A_spacecraft_that_stays_below_the_horizon_is_listed_so()
    {
        var buried = new PlanningModel([StationOf("buried", 89.9)], [Low]);
        Assert.Equal(NoPassReason.NeverUp, Assert.Single(Predict(buried).WithoutPasses).Reason);
    }

    [Fact]
    public void Work_that_nobody_waits_for_is_given_up()
    {
        using var source = new CancellationTokenSource();
        source.Cancel();
        Assert.ThrowsAny<OperationCanceledException>(() => Predict(new PlanningModel([South], [Low]), source.Token));
    }

    private static Prediction Predict(PlanningModel model, CancellationToken cancellation = default) => new PassPredictor(model).Predict(
        new PredictionRequest { Period = Period, Stations = model.Stations, Spacecraft = model.Spacecraft, WantsLink = _ => true }, cancellation);

    private static Station StationOf(string id, double maskDeg) => new()
    {
        Id = id,
        Name = id,
        Revision = 1,
        Position = LinkScene.Place,
        Mask = HorizonMask.Constant(maskDeg),
        Antennas = [LinkScene.Antenna],
    };

    private static Spacecraft SpacecraftOf(string id) => new()
    {
        Id = id,
        Name = id,
        Revision = 1,
        CatalogNumber = 0,
        Attitude = new NadirAttitude(),
        Transmitters = [LinkScene.Transmitter],
        Receivers = [LinkScene.Receiver],
    };
}
