using System.Globalization;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Physics.Tests.Frames;

/// <summary>Look angles of ten spacecraft from six stations; see tests/reference/orbit/SOURCE.md.</summary>
public sealed class TrackTests(ITestOutputHelper output)
{
    private const double HalfAMillidegreeDeg = 0.0005;
    private const double TwoMetresKm = 0.002;
    private const double OneMillimetrePerSecondKmPerS = 1e-6;
    private const double DegPerRad = 180.0 / Math.PI;

    [Fact]
    public void Every_row_of_the_reference_tracks_is_reproduced()
    {
        IReadOnlyList<ElementSet> sets = TestElementSets.Read("orbit/spacecraft.tle");
        Dictionary<string, TopocentricFrame> stations = ReferenceData.Rows("orbit/stations.csv").ToDictionary(
            row => row["station_id"],
            row => new TopocentricFrame(new GeodeticPosition(Number(row, "latitude_deg"), Number(row, "longitude_deg"), Number(row, "height_m"))));
        double worstSkyDeg = 0, worstElevationDeg = 0, worstRangeKm = 0, worstRateKmPerS = 0;
        int rows = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceData.Rows("orbit/tracks.csv"))
        {
            TopocentricFrame station = stations[row["station_id"]];
            ElementSet set = sets.Single(candidate => candidate.CatalogNumber == (int)Number(row, "catalog_number"));
            var trajectory = new SpacecraftTrajectory([set], Number(row, "dut1_s"));
            Assert.True(UtcInstant.TryParse(row["utc"], out UtcInstant instant));
            Assert.Equal(Sgp4Status.Ok, trajectory.TryEcef(instant, out EcefState state));
            LookAngles look = station.Look(state);
            double skyDeg = DegPerRad * station.UnitVector(look.AzimuthDeg, look.ElevationDeg)
                .AngleToRad(station.UnitVector(Number(row, "azimuth_deg"), Number(row, "elevation_deg")));
            double elevationDeg = Math.Abs(look.ElevationDeg - Number(row, "elevation_deg"));
            double rangeKm = Math.Abs(look.SlantRangeKm - Number(row, "range_km"));
            double rateKmPerS = Math.Abs(look.RangeRateKmPerS - Number(row, "range_rate_km_s"));
            string where = $"track {row["track"]} at {row["utc"]}";
            Assert.True(skyDeg <= HalfAMillidegreeDeg, $"{where}: {skyDeg} deg");
            Assert.True(elevationDeg <= HalfAMillidegreeDeg, $"{where}: {elevationDeg} deg");
            Assert.True(rangeKm <= TwoMetresKm, $"{where}: {rangeKm} km");
            Assert.True(rateKmPerS <= OneMillimetrePerSecondKmPerS, $"{where}: {rateKmPerS} km/s");
            worstSkyDeg = Math.Max(worstSkyDeg, skyDeg);
            worstElevationDeg = Math.Max(worstElevationDeg, elevationDeg);
            worstRangeKm = Math.Max(worstRangeKm, rangeKm);
            worstRateKmPerS = Math.Max(worstRateKmPerS, rateKmPerS);
            rows++;
        }

        output.WriteLine($"tracks.csv: {rows} rows; worst {worstSkyDeg:e2} deg on the sky, {worstElevationDeg:e2} deg elevation, {worstRangeKm:e2} km, {worstRateKmPerS:e2} km/s");
        Assert.Equal(2466, rows);
    }

    private static double Number(IReadOnlyDictionary<string, string> row, string column)
        => double.Parse(row[column], CultureInfo.InvariantCulture);
}
