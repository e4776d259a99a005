using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Passes;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Planning.Tests.Passes;

/// <summary>All passes of the reference tables; see tests/reference/orbit/SOURCE.md for conventions and tolerances.</summary>
public sealed class ReferencePassTests(ITestOutputHelper output)
{
    private const double EdgeS = 0.02;
    private const double LowMaximumS = 0.05;
    private const double HighMaximumS = 0.5;
    private const double HalfAMillidegreeDeg = 0.0005;
    private const double TwoMetresKm = 0.002;

    private readonly Dictionary<string, double> worst = [];

    [Theory]
    [InlineData("orbit/passes.csv", -0.1088)]
    [InlineData("orbit/passes-ut1-equals-utc.csv", 0.0)]
    public void Every_reference_pass_is_found_and_no_other(string file, double ut1MinusUtcS)
    {
        int rows = 0;
        IReadOnlyList<IReadOnlyDictionary<string, string>> table = ReferenceData.Rows(file);
        var groups = table.GroupBy(row => (Catalog: (int)ReferenceScene.Number(row, "catalog_number"), Station: row["station_id"], Mask: ReferenceScene.Number(row, "mask_deg")));
        foreach (var group in groups)
        {
            string where = $"{group.Key.Catalog} over {group.Key.Station} at {group.Key.Mask} deg";
            var trajectory = new SpacecraftTrajectory([ReferenceScene.Sets[group.Key.Catalog]], ut1MinusUtcS);
            IReadOnlyList<Pass> passes = PassFinder.Find(
                trajectory, ReferenceScene.Stations[group.Key.Station], HorizonMask.Constant(group.Key.Mask), ReferenceScene.Interval, CancellationToken.None).Passes;
            List<IReadOnlyDictionary<string, string>> expected = [.. group];
            Assert.True(expected.Count == passes.Count, $"{where}: {passes.Count} passes, expected {expected.Count}");
            for (int i = 0; i < passes.Count; i++)
            {
                Compare(passes[i], expected[i], Closest(table, expected[i]), ReferenceScene.Sets[group.Key.Catalog], where);
                rows++;
            }
        }

        output.WriteLine($"{file}: {rows} passes; worst {string.Join(", ", worst.Select(pair => $"{pair.Key} {pair.Value:g3}"))}");
        Assert.Equal(1181, rows);
    }

    [Fact]
    public void Visibility_and_counts_are_those_of_the_reference()
    {
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceData.Rows("orbit/visibility.csv");
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            var trajectory = new SpacecraftTrajectory(
                [ReferenceScene.Sets[(int)ReferenceScene.Number(row, "catalog_number")]], ReferenceScene.Number(row, "dut1_s"));
            PassSearch search = PassFinder.Find(
                trajectory,
                ReferenceScene.Stations[row["station_id"]],
                HorizonMask.Constant(ReferenceScene.Number(row, "mask_deg")),
                ReferenceScene.Interval,
                CancellationToken.None);
            (VisibilityStatus status, int count) = row["status"] switch
            {
                "never" => (VisibilityStatus.NeverUp, 0),
                "always" => (VisibilityStatus.AlwaysUp, 2),
                _ => (VisibilityStatus.Passes, (int)ReferenceScene.Number(row, "pass_count")),
            };
            Assert.True(status == search.Status && count == search.Passes.Count, $"{row["catalog_number"]} {row["station_id"]} {row["mask_deg"]}: {search.Status}, {search.Passes.Count}");
        }

        output.WriteLine($"visibility.csv: {rows.Count} rows");
        Assert.Equal(360, rows.Count);
    }

    [Fact]
    public void A_decaying_object_ends_with_its_reason_and_instant()
    {
        const double TenSecondGridS = 10.0;
        IReadOnlyDictionary<string, string> row = ReferenceData.Rows("orbit/spacecraft.csv").Single(r => r["catalog_number"] == "49975");
        var trajectory = new SpacecraftTrajectory([ReferenceScene.Sets[49975]], 0.0);
        PassSearch search = PassFinder.Find(
            trajectory, ReferenceScene.Stations["NULL"], HorizonMask.Default, ReferenceScene.Interval, CancellationToken.None);
        Assert.NotNull(search.Failure);
        Assert.Equal(Sgp4Status.Decayed, search.Failure.Status);
        double lateS = ReferenceScene.Instant(row, "first_sgp4_error_utc").SecondsSince(search.Failure.FirstUtc);
        output.WriteLine($"49975 fails at {search.Failure.FirstUtc}, {lateS:f3} s before the reference's 10 s grid sees it");
        Assert.InRange(lateS, 0.0, TenSecondGridS);
        Assert.Equal(Sgp4Status.Decayed, trajectory.TryTeme(search.Failure.FirstUtc, out _));
        Assert.Equal(Sgp4Status.Ok, trajectory.TryTeme(search.Failure.FirstUtc.AddSeconds(-0.002), out _));
        Assert.All(search.Passes, pass => Assert.True(pass.Window.EndUtc <= search.Failure.FirstUtc));
    }

    /// <summary>
    /// The row that gives the least range within a pass. It is the pass's own row but for 26110 over WIRR at 10 degrees on
    /// 24 January: there the table names AOS, though its rows for 0 and 5 degrees show a nearer instant inside that pass.
    /// </summary>
    private static IReadOnlyDictionary<string, string> Closest(
        IReadOnlyList<IReadOnlyDictionary<string, string>> table, IReadOnlyDictionary<string, string> row)
        => table
            .Where(other => other["catalog_number"] == row["catalog_number"]
                && other["station_id"] == row["station_id"]
                && string.CompareOrdinal(other["closest_utc"], row["aos_utc"]) >= 0
                && string.CompareOrdinal(other["closest_utc"], row["los_utc"]) <= 0)
            .Append(row)
            .MinBy(other => ReferenceScene.Number(other, "closest_range_km"))!;

    private void Compare(
        Pass pass, IReadOnlyDictionary<string, string> row, IReadOnlyDictionary<string, string> closest, ElementSet set, string where)
    {
        bool isLow = set.MeanMotionRevPerDay > 11.0;
        double Apart(UtcInstant instant, string column) => Math.Abs(instant.SecondsSince(ReferenceScene.Instant(row, column)));
        double closestS = Math.Abs(pass.ClosestApproachUtc.SecondsSince(ReferenceScene.Instant(closest, "closest_utc")));
        double Turn(double azimuthDeg, string column) => Math.Abs(Math.IEEERemainder(azimuthDeg - ReferenceScene.Number(row, column), 360.0));
        string at = $"{where}, pass of {row["aos_utc"]}";
        Check("aos_s", Apart(pass.Window.StartUtc, "aos_utc"), EdgeS, at);
        Check("los_s", Apart(pass.Window.EndUtc, "los_utc"), EdgeS, at);
        Check(isLow ? "tca_low_s" : "tca_high_s", Apart(pass.MaximumElevationUtc, "tca_utc"), isLow ? LowMaximumS : HighMaximumS, at);
        Check("elevation_deg", Math.Abs(pass.MaximumElevationDeg - ReferenceScene.Number(row, "max_elevation_deg")), HalfAMillidegreeDeg, at);
        Check("closest_km", Math.Abs(pass.ClosestRangeKm - ReferenceScene.Number(closest, "closest_range_km")), TwoMetresKm, at);
        Check("closest_s", closestS, isLow ? LowMaximumS : HighMaximumS, at);
        Check("aos_azimuth_deg", Turn(pass.AosAzimuthDeg, "aos_azimuth_deg"), HalfAMillidegreeDeg, at);
        Check("los_azimuth_deg", Turn(pass.LosAzimuthDeg, "los_azimuth_deg"), HalfAMillidegreeDeg, at);
        if (isLow)
        {
            double levelDeg = Math.Cos(pass.MaximumElevationDeg * Math.PI / 180.0);
            Check("tca_azimuth_deg", levelDeg * Turn(pass.MaximumElevationAzimuthDeg, "tca_azimuth_deg"), 0.01, at);
        }

        Assert.True(row["azimuth_crosses_north"] == "1" == pass.CrossesNorth, at);
        Assert.True(row["starts_before_interval"] == "1" == pass.Window.StartUtc < ReferenceScene.Interval.StartUtc, at);
        Assert.True(row["ends_after_interval"] == "1" == pass.Window.EndUtc > ReferenceScene.Interval.EndUtc, at);
        Assert.True(row["near_zenith"] == "1" == pass.MaximumElevationDeg > 85.0, at);
        Assert.False(pass.AosIsOpen || pass.LosIsOpen || pass.CutBy is not null, at);
    }

    private void Check(string quantity, double error, double tolerance, string where)
    {
        Assert.True(error <= tolerance, $"{where}: {quantity} off by {error}");
        worst[quantity] = Math.Max(worst.GetValueOrDefault(quantity), error);
    }
}
