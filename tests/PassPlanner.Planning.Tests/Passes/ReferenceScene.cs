using System.Globalization;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Tests;

namespace PassPlanner.Planning.Tests.Passes;

/// <summary>The ten spacecraft and six stations of the reference passes; see tests/reference/orbit/SOURCE.md.</summary>
internal static class ReferenceScene
{
    public static readonly TimeWindow Interval = new(UtcInstant.FromCalendar(2022, 1, 23), UtcInstant.FromCalendar(2022, 1, 25));

    public static readonly IReadOnlyDictionary<string, TopocentricFrame> Stations = ReferenceData.Rows("orbit/stations.csv").ToDictionary(
        row => row["station_id"],
        row => new TopocentricFrame(new GeodeticPosition(Number(row, "latitude_deg"), Number(row, "longitude_deg"), Number(row, "height_m"))));

    public static readonly IReadOnlyDictionary<int, ElementSet> Sets =
        TestElementSets.Read("orbit/spacecraft.tle").ToDictionary(set => set.CatalogNumber);

    public static double Number(IReadOnlyDictionary<string, string> row, string column)
        => double.Parse(row[column], CultureInfo.InvariantCulture);

    public static UtcInstant Instant(IReadOnlyDictionary<string, string> row, string column)
    {
        Assert.True(UtcInstant.TryParse(row[column], out UtcInstant instant), row[column]);
        return instant;
    }
}
