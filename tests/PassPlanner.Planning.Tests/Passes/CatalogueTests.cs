using System.Diagnostics;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Passes;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Planning.Tests.Passes;

public sealed class CatalogueTests(ITestOutputHelper output)
{
    [Fact]
    public void The_whole_catalogue_over_one_day_and_one_station_runs_without_an_exception()
    {
        IReadOnlyList<ElementSet> sets = TestElementSets.Read("orbit/catalogue.tle.gz");
        var station = new TopocentricFrame(new GeodeticPosition(51.3, -1.9, 95.0));
        var day = new TimeWindow(UtcInstant.FromCalendar(2022, 1, 23), UtcInstant.FromCalendar(2022, 1, 24));
        var searches = new PassSearch[sets.Count];
        long start = Stopwatch.GetTimestamp();
        Parallel.For(0, sets.Count, i => searches[i] = PassFinder.Find(
            new SpacecraftTrajectory([sets[i]], 0.0), station, HorizonMask.Default, day, CancellationToken.None));
        output.WriteLine(
            $"catalogue.tle: {sets.Count} sets, {searches.Sum(search => search.Passes.Count)} passes, "
            + $"{searches.Count(search => search.Status == VisibilityStatus.AlwaysUp)} always up, "
            + $"{searches.Count(search => search.Failure is { } failure && failure.FirstUtc == day.StartUtc)} fail at once, "
            + $"{searches.Count(search => search.Failure is { } failure && failure.FirstUtc > day.StartUtc)} later, "
            + $"{Stopwatch.GetElapsedTime(start).TotalSeconds:f1} s");
        Assert.Equal(23939, sets.Count);
        Assert.All(searches, search => Assert.All(search.Passes, pass => Assert.True(
            double.IsFinite(pass.MaximumElevationDeg) && double.IsFinite(pass.ClosestRangeKm) && pass.Window.StartUtc < pass.Window.EndUtc)));
        Assert.Equal(119, searches.Count(search => search.Failure is { } failure && failure.FirstUtc == day.StartUtc));
    }
}
