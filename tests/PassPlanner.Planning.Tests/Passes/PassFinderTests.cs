using CsCheck;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Passes;

namespace PassPlanner.Planning.Tests.Passes;

public sealed class PassFinderTests
{
    private const double MillisecondS = 0.001;
    private static readonly TimeWindow Period = ReferenceScene.Interval;

    private static readonly HorizonMask Jagged = new(
    [
        new(0, 2), new(20, 14), new(22, 1), new(70, 9), new(110, 3), new(140, 25), new(141, 4),
        new(200, 12), new(230, 0), new(260, 18), new(300, -1), new(330, 7),
    ]);

    private static readonly Gen<(int Catalog, string Station, HorizonMask Mask)> Pairs = Gen.Select(
        Gen.Int[0, ReferenceScene.Sets.Count - 1].Select(i => ReferenceScene.Sets.Keys.ElementAt(i)),
        Gen.Int[0, ReferenceScene.Stations.Count - 1].Select(i => ReferenceScene.Stations.Keys.ElementAt(i)),
        Gen.OneOf(
            Gen.Double[-3.0, 60.0].Select(HorizonMask.Constant),
            Gen.Select(Gen.Double[0.0, 359.0], Gen.Double[-3.0, 25.0]).Array[2, 12].Select(points =>
                new HorizonMask([.. points.DistinctBy(point => point.Item1).Select(point => new MaskPoint(point.Item1, point.Item2))]))));

    [Fact]
    public void Elevation_rises_through_the_mask_at_AOS_falls_through_it_at_LOS_and_peaks_between()
        => Pairs.Sample(
            pair =>
            {
                (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(pair.Catalog, pair.Station);
                UtcInstant before = UtcInstant.Earliest;
                foreach (Pass pass in Find(trajectory, station, pair.Mask).Passes)
                {
                    Assert.True(pass.Window.StartUtc < pass.Window.EndUtc);
                    Assert.True(before <= pass.Window.StartUtc);
                    before = pass.Window.EndUtc;
                    if (!pass.AosIsOpen)
                    {
                        Assert.True(ExcessDeg(trajectory, station, pair.Mask, pass.Window.StartUtc.AddSeconds(-MillisecondS)) < 0.0);
                        Assert.True(ExcessDeg(trajectory, station, pair.Mask, pass.Window.StartUtc.AddSeconds(MillisecondS)) > 0.0);
                    }

                    if (!pass.LosIsOpen)
                    {
                        Assert.True(ExcessDeg(trajectory, station, pair.Mask, pass.Window.EndUtc.AddSeconds(-MillisecondS)) > 0.0);
                        Assert.True(ExcessDeg(trajectory, station, pair.Mask, pass.Window.EndUtc.AddSeconds(MillisecondS)) < 0.0);
                    }

                    for (int k = 1; k < 26; k++)
                    {
                        UtcInstant inside = pass.Window.StartUtc.AddSeconds(pass.Window.DurationS * k / 40.0);
                        LookAngles look = Look(trajectory, station, inside);
                        Assert.True(look.ElevationDeg >= pair.Mask.ElevationDegAt(look.AzimuthDeg));
                        Assert.True(look.ElevationDeg <= pass.MaximumElevationDeg + 1e-7);
                        Assert.True(look.SlantRangeKm >= pass.ClosestRangeKm - 1e-6);
                    }
                }
            },
            iter: 60);

    [Fact]
    public void A_scan_of_every_second_finds_no_pass_and_no_gap_that_the_search_has_lost()
        => Pairs.Where(pair => pair.Catalog != 49975).Sample(
            pair =>
            {
                (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(pair.Catalog, pair.Station);
                TimeWindow quarterDay = new(Period.StartUtc, Period.StartUtc.AddSeconds(21600));
                IReadOnlyList<Pass> passes = PassFinder.Find(trajectory, station, pair.Mask, quarterDay, CancellationToken.None).Passes;
                int index = 0;
                for (UtcInstant instant = quarterDay.StartUtc; instant < quarterDay.EndUtc; instant = instant.AddSeconds(1))
                {
                    while (index < passes.Count && passes[index].Window.EndUtc <= instant)
                    {
                        index++;
                    }

                    bool isListed = index < passes.Count && passes[index].Window.Contains(instant);
                    double excessDeg = ExcessDeg(trajectory, station, pair.Mask, instant);
                    Assert.True(isListed == excessDeg >= 0.0, $"{pair.Catalog} {pair.Station} {instant}: {excessDeg} deg, listed {isListed}");
                }
            },
            iter: 25);

    [Fact]
    public void A_jagged_mask_cuts_one_hump_into_several_passes()
    {
        (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(36508, "ISEN");
        IReadOnlyList<Pass> level = Find(trajectory, station, HorizonMask.Constant(Jagged.MinimumDeg)).Passes;
        IReadOnlyList<Pass> jagged = Find(trajectory, station, Jagged).Passes;
        Assert.All(jagged, pass => Assert.Contains(level, whole => whole.Window.StartUtc <= pass.Window.StartUtc && pass.Window.EndUtc <= whole.Window.EndUtc));
        Assert.Contains(level, whole => jagged.Count(pass => whole.Window.Overlaps(pass.Window)) >= 2);
    }

    [Fact]
    public void The_pass_at_any_instant_inside_is_the_listed_one_to_the_tick()
        => Pairs.Sample(
            pair =>
            {
                (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(pair.Catalog, pair.Station);
                foreach (Pass pass in Find(trajectory, station, pair.Mask).Passes.Take(6))
                {
                    foreach (double part in (double[])[0.0, 0.3, 0.999])
                    {
                        UtcInstant instant = pass.Window.StartUtc.AddSeconds(part * pass.Window.DurationS);
                        Assert.Equal(pass, PassFinder.FindAt(trajectory, station, pair.Mask, instant, CancellationToken.None));
                    }

                    if (!pass.LosIsOpen)
                    {
                        Assert.NotEqual(pass, PassFinder.FindAt(trajectory, station, pair.Mask, pass.Window.EndUtc, CancellationToken.None));
                    }
                }
            },
            iter: 30);

    [Fact]
    public void A_pass_is_the_same_whatever_period_finds_it()
    {
        (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(25544, "MARL");
        IReadOnlyList<Pass> whole = Find(trajectory, station, HorizonMask.Default).Passes;
        var pieces = new List<Pass>();
        for (UtcInstant start = Period.StartUtc; start < Period.EndUtc; start = start.AddSeconds(7777))
        {
            UtcInstant end = start.AddSeconds(7777) < Period.EndUtc ? start.AddSeconds(7777) : Period.EndUtc;
            pieces.AddRange(PassFinder.Find(trajectory, station, HorizonMask.Default, new TimeWindow(start, end), CancellationToken.None).Passes);
        }

        Assert.Equal(whole, pieces.Distinct());
    }

    [Fact]
    public async Task Stations_that_share_a_grid_on_two_threads_get_what_each_gets_alone()
    {
        var trajectory = new SpacecraftTrajectory([ReferenceScene.Sets[40296]], 0.0);
        var grid = EphemerisGrid.Build(trajectory, Period, CancellationToken.None);
        List<Pass> Everywhere() => [.. ReferenceScene.Stations.Values.SelectMany(station => PassFinder.Find(grid, station, Jagged, CancellationToken.None).Passes)];
        List<Pass>[] shared = await Task.WhenAll(Task.Run(Everywhere), Task.Run(Everywhere));
        List<Pass> alone = [.. ReferenceScene.Stations.Values.SelectMany(station => Find(trajectory, station, Jagged).Passes)];
        Assert.Equal(alone, shared[0]);
        Assert.Equal(alone, shared[1]);
    }

    [Fact]
    public void A_geostationary_spacecraft_in_view_gives_one_open_pass_for_each_day_of_the_period()
    {
        (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(41866, "ALTO");
        PassSearch search = Find(trajectory, station, HorizonMask.Default);
        Assert.Equal(VisibilityStatus.AlwaysUp, search.Status);
        Assert.Equal(2, search.Passes.Count);
        Assert.Equal(Period.StartUtc, search.Passes[0].Window.StartUtc);
        Assert.Equal(Period.EndUtc, search.Passes[1].Window.EndUtc);
        Assert.All(search.Passes, pass => Assert.True(pass is { AosIsOpen: true, LosIsOpen: true, CutBy: null }));
        Assert.All(search.Passes, pass => Assert.True(pass.Window.Contains(pass.MaximumElevationUtc) || pass.Window.EndUtc == pass.MaximumElevationUtc));
        Assert.Equal(VisibilityStatus.NeverUp, Find(trajectory, ReferenceScene.Stations["ISEN"], HorizonMask.Default).Status);
    }

    [Fact]
    public void A_period_inside_a_pass_lists_that_pass_whole()
    {
        (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(40296, "MARL");
        Pass longest = Find(trajectory, station, HorizonMask.Default).Passes.MaxBy(pass => pass.Window.DurationS)!;
        var inside = new TimeWindow(longest.Window.StartUtc.AddSeconds(5000), longest.Window.EndUtc.AddSeconds(-5000));
        PassSearch search = PassFinder.Find(trajectory, station, HorizonMask.Default, inside, CancellationToken.None);
        Assert.Equal(VisibilityStatus.AlwaysUp, search.Status);
        Assert.Equal([longest], search.Passes);
    }

    [Fact]
    public void A_pass_under_way_when_the_propagation_fails_is_cut_there_with_the_reason()
    {
        var trajectory = new SpacecraftTrajectory([ReferenceScene.Sets[49975]], 0.0);
        UtcInstant failsUtc = Find(trajectory, ReferenceScene.Stations["NULL"], HorizonMask.Default).Failure!.FirstUtc;
        trajectory.TryEcef(failsUtc.AddSeconds(-1), out EcefState state);
        GeodeticPosition spacecraft = Wgs84.ToGeodetic(state.PositionKm);
        var station = new TopocentricFrame(spacecraft with { HeightM = spacecraft.HeightM - 500.0 });
        PassSearch search = Find(trajectory, station, HorizonMask.Constant(0));
        Pass last = search.Passes[^1];
        Assert.True(last.LosIsOpen);
        Assert.Equal(search.Failure, last.CutBy);
        Assert.Equal(failsUtc, last.Window.EndUtc);
        Assert.False(search.Passes[0].LosIsOpen && search.Passes.Count > 1);
    }

    [Fact]
    public void An_object_without_a_position_at_the_start_has_no_passes_and_a_reason()
    {
        var trajectory = new SpacecraftTrajectory([ReferenceScene.Sets[49975]], 0.0);
        UtcInstant failsUtc = Find(trajectory, ReferenceScene.Stations["NULL"], HorizonMask.Default).Failure!.FirstUtc;
        var after = new TimeWindow(failsUtc.AddSeconds(1), failsUtc.AddSeconds(100));
        PassSearch search = PassFinder.Find(trajectory, ReferenceScene.Stations["NULL"], HorizonMask.Default, after, CancellationToken.None);
        Assert.Equal(VisibilityStatus.NeverUp, search.Status);
        Assert.Empty(search.Passes);
        Assert.Equal(new PropagationFailure(Sgp4Status.Decayed, after.StartUtc), search.Failure);
    }

    [Fact]
    public void A_mask_just_under_the_top_of_a_pass_keeps_it_and_one_just_over_loses_it()
    {
        const double TenThousandthDeg = 1e-4;
        (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(47258, "ISEN");
        foreach (Pass pass in Find(trajectory, station, HorizonMask.Default).Passes)
        {
            bool IsKept(double maskDeg) => Find(trajectory, station, HorizonMask.Constant(maskDeg)).Passes.Any(found => found.Window.Overlaps(pass.Window));
            Assert.True(IsKept(pass.MaximumElevationDeg - TenThousandthDeg));
            Assert.False(IsKept(pass.MaximumElevationDeg + TenThousandthDeg));
        }
    }

    [Fact]
    public void A_mask_that_touches_the_lowest_point_of_a_long_pass_opens_a_gap_there()
    {
        const double TenthOfAMicrodegreeDeg = 1e-7;
        (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(41866, "MARL");
        UtcInstant lowestUtc = Period.StartUtc.AddSeconds(3600);
        for (int stepS = 600; stepS >= 1; stepS /= 4)
        {
            lowestUtc = Enumerable.Range(-200, 401).Select(k => lowestUtc.AddSeconds(k * stepS))
                .Where(instant => instant.SecondsSince(Period.StartUtc) is > 3600.0 and < 90000.0)
                .MinBy(instant => Look(trajectory, station, instant).ElevationDeg);
        }

        double lowestDeg = Look(trajectory, station, lowestUtc).ElevationDeg;
        bool HasGap(double maskDeg)
        {
            var near = new TimeWindow(lowestUtc.AddSeconds(-1800), lowestUtc.AddSeconds(1800));
            PassSearch search = PassFinder.Find(trajectory, station, HorizonMask.Constant(maskDeg), near, CancellationToken.None);
            return search.Passes.All(pass => !pass.Window.Contains(lowestUtc));
        }

        Assert.True(HasGap(lowestDeg + TenthOfAMicrodegreeDeg));
        Assert.False(HasGap(lowestDeg - TenthOfAMicrodegreeDeg));
    }

    [Fact]
    public void The_first_failure_is_found_even_where_SGP4_recovers_within_seconds()
    {
        // With these arguments of perigee the first time below one Earth radius shrinks from 3 minutes to 38 s, then to none.
        const int LookBackS = 7200;
        for (int k = 0; k < 26; k++)
        {
            ElementSet set = ReferenceScene.Sets[49975] with { ArgumentOfPerigeeDeg = 208.0 + (k * 0.1) };
            var trajectory = new SpacecraftTrajectory([set], 0.0);
            if (EphemerisGrid.Build(trajectory, Period, CancellationToken.None).Failure is { } failure)
            {
                for (int s = 1; s < LookBackS && failure.FirstUtc.AddSeconds(-s) > Period.StartUtc; s++)
                {
                    Assert.Equal(Sgp4Status.Ok, trajectory.TryTeme(failure.FirstUtc.AddSeconds(-s), out _));
                }
            }
        }
    }

    [Fact]
    public void A_newer_set_serves_from_its_epoch_on()
    {
        (_, TopocentricFrame station) = Scene(25544, "MARL");
        ElementSet older = ReferenceScene.Sets[25544];
        UtcInstant switchUtc = Period.StartUtc.AddSeconds(90000);
        ElementSet newer = older with { EpochUtc = switchUtc, MeanAnomalyDeg = older.MeanAnomalyDeg + 40.0 };
        IReadOnlyList<Pass> both = Find(new SpacecraftTrajectory([newer, older], 0.0), station, HorizonMask.Default).Passes;
        IReadOnlyList<Pass> early = Find(new SpacecraftTrajectory([older], 0.0), station, HorizonMask.Default).Passes;
        IReadOnlyList<Pass> late = Find(new SpacecraftTrajectory([newer], 0.0), station, HorizonMask.Default).Passes;
        Assert.Equal(early.Where(pass => pass.Window.EndUtc < switchUtc), both.Where(pass => pass.Window.EndUtc < switchUtc));
        Assert.Equal(late.Where(pass => pass.Window.StartUtc > switchUtc), both.Where(pass => pass.Window.StartUtc > switchUtc));
    }

    [Fact]
    public void An_empty_period_is_refused_and_a_cancelled_search_ends()
    {
        (SpacecraftTrajectory trajectory, TopocentricFrame station) = Scene(25544, "MARL");
        Assert.Throws<ArgumentOutOfRangeException>(() => PassFinder.Find(
            trajectory, station, HorizonMask.Default, new TimeWindow(Period.StartUtc, Period.StartUtc), CancellationToken.None));
        Assert.Throws<OperationCanceledException>(() => PassFinder.Find(
            trajectory, station, HorizonMask.Default, Period, new CancellationToken(canceled: true)));
    }

    private static (SpacecraftTrajectory Trajectory, TopocentricFrame Station) Scene(int catalog, string station)
        => (new SpacecraftTrajectory([ReferenceScene.Sets[catalog]], 0.0), ReferenceScene.Stations[station]);

    private static PassSearch Find(SpacecraftTrajectory trajectory, TopocentricFrame station, HorizonMask mask)
        => PassFinder.Find(trajectory, station, mask, Period, CancellationToken.None);

    private static LookAngles Look(SpacecraftTrajectory trajectory, TopocentricFrame station, UtcInstant instant)
    {
        Assert.Equal(Sgp4Status.Ok, trajectory.TryEcef(instant, out EcefState state));
        return station.Look(state);
    }

    private static double ExcessDeg(SpacecraftTrajectory trajectory, TopocentricFrame station, HorizonMask mask, UtcInstant instant)
    {
        LookAngles look = Look(trajectory, station, instant);
        return look.ElevationDeg - mask.ElevationDegAt(look.AzimuthDeg);
    }
}
