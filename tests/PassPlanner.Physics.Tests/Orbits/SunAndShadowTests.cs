using System.Globalization;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Physics.Tests.Orbits;

/// <summary>The Sun's direction and the Earth's shadow; see tests/reference/orbit/SOURCE.md.</summary>
public sealed class SunAndShadowTests(ITestOutputHelper output)
{
    private const double OneHundredthOfADegreeDeg = 0.01;
    private const double TenMetresKm = 0.01;
    private const double DegPerRad = 180.0 / Math.PI;

    [Fact]
    public void The_Sun_stands_where_the_reference_sees_it()
    {
        Dictionary<string, TopocentricFrame> stations = ReferenceData.Rows("orbit/stations.csv").ToDictionary(
            row => row["station_id"],
            row => new TopocentricFrame(new GeodeticPosition(Number(row, "latitude_deg"), Number(row, "longitude_deg"), Number(row, "height_m"))));
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceData.Rows("orbit/sun.csv");
        double worstDeg = 0;
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            (double azimuthDeg, double elevationDeg) = SunPosition.Look(stations[row["station_id"]], Instant(row), 0.0);
            double elevationErrorDeg = Math.Abs(elevationDeg - Number(row, "sun_elevation_deg"));
            double azimuthErrorDeg = Math.Abs(azimuthDeg - Number(row, "sun_azimuth_deg")) * Math.Cos(elevationDeg / DegPerRad);
            double errorDeg = Math.Max(elevationErrorDeg, azimuthErrorDeg);
            Assert.True(errorDeg <= OneHundredthOfADegreeDeg, $"{row["station_id"]} {row["utc"]}: {errorDeg} deg");
            worstDeg = Math.Max(worstDeg, errorDeg);
        }

        output.WriteLine($"sun.csv: {rows.Count} rows; worst {worstDeg:f4} deg");
        Assert.Equal(10, rows.Count);
    }

    [Fact]
    public void Shadow_flags_and_heights_are_those_of_the_reference()
    {
        IReadOnlyList<IReadOnlyDictionary<string, string>> rows = ReferenceData.Rows("orbit/shadow.csv");
        double worstKm = 0;
        double worstSunDeg = 0;
        foreach (IReadOnlyDictionary<string, string> row in rows)
        {
            var position = new Vector3D(Number(row, "x_teme_km"), Number(row, "y_teme_km"), Number(row, "z_teme_km"));
            var direction = new Vector3D(Number(row, "sun_x_teme"), Number(row, "sun_y_teme"), Number(row, "sun_z_teme"));
            Vector3D almanac = SunPosition.TemeKm(Instant(row));
            worstSunDeg = Math.Max(worstSunDeg, almanac.AngleToRad(direction) * DegPerRad);
            SunlightState expected = row["in_umbra_cone"] == "1" ? SunlightState.Umbra
                : row["in_penumbra_only"] == "1" ? SunlightState.Penumbra : SunlightState.Sunlit;
            foreach (Vector3D sun in (Vector3D[])[direction * SunPosition.AstronomicalUnitKm, almanac])
            {
                Assert.Equal(expected, EarthShadow.At(position, sun));
                Assert.Equal(row["in_cylinder"] == "1", EarthShadow.IsInCylinder(position, sun));
            }

            if (row["height_above_cylinder_km"].Length > 0)
            {
                double errorKm = Math.Abs(EarthShadow.HeightAboveCylinderKm(position, direction) - Number(row, "height_above_cylinder_km"));
                Assert.True(errorKm <= TenMetresKm, $"{row["case"]}: {errorKm} km");
                worstKm = Math.Max(worstKm, errorKm);
            }
        }

        output.WriteLine($"shadow.csv: {rows.Count} rows; all flags, worst height {worstKm:e2} km; almanac Sun within {worstSunDeg:f4} deg");
        Assert.Equal(8, rows.Count);
        Assert.True(worstSunDeg <= OneHundredthOfADegreeDeg);
    }

    [Fact]
    public void Beyond_the_tip_of_the_umbra_the_Sun_is_never_wholly_hidden()
    {
        var sun = new Vector3D(SunPosition.AstronomicalUnitKm, 0, 0);
        Assert.Equal(SunlightState.Umbra, EarthShadow.At(new(-1.3e6, 0, 0), sun));
        Assert.Equal(SunlightState.Penumbra, EarthShadow.At(new(-1.5e6, 0, 0), sun));
    }

    private static UtcInstant Instant(IReadOnlyDictionary<string, string> row)
    {
        Assert.True(UtcInstant.TryParse(row["utc"], out UtcInstant instant));
        return instant;
    }

    private static double Number(IReadOnlyDictionary<string, string> row, string column)
        => double.Parse(row[column], CultureInfo.InvariantCulture);
}
