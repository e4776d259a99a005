using System.Globalization;
using CsCheck;
using PassPlanner.Physics.Atmosphere;
using PassPlanner.Tests;

namespace PassPlanner.Physics.Tests.Atmosphere;

public class ItuRP834Tests
{
    private const double PrintedDigitDeg = 0.5e-5 + 1e-9;

    /// <summary>Validation. Source: radio/p834-9-refraction.csv, ITU-R P.834-9 section 4.</summary>
    [Fact]
    public void Refraction_agrees_with_the_values_of_the_Recommendation()
    {
        foreach (IReadOnlyDictionary<string, string> row in ReferenceData.Rows("radio/p834-9-refraction.csv"))
        {
            double heightM = 1000 * Number(row["station_height_km"]);
            double inputDeg = Number(row["input_elevation_deg"]);
            double outputDeg = row["direction"] == "free-space to apparent"
                ? ItuRP834.ApparentElevationDeg(inputDeg, heightM)
                : ItuRP834.GeometricElevationDeg(inputDeg, heightM);
            Assert.Equal(Number(row["output_elevation_deg"]), outputDeg, PrintedDigitDeg);
        }
    }

    [Fact]
    public void Apparent_elevation_is_never_lower_and_rises_with_the_geometric_one() => Gen.Select(
        Gen.Double[-90, 89.9], Gen.Double[-400, 8000], Gen.Double[0.001, 0.1]).Sample((elevationDeg, heightM, stepDeg) =>
    {
        double here = ItuRP834.ApparentElevationDeg(elevationDeg, heightM);
        Assert.InRange(here, elevationDeg, elevationDeg + 1.2);
        Assert.True(ItuRP834.ApparentElevationDeg(elevationDeg + stepDeg, heightM) > here);
    });

    [Fact]
    public void Nothing_is_bent_at_the_zenith() =>
        Assert.Equal(90, ItuRP834.ApparentElevationDeg(90, 0), 1e-12);

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
