using System.Reflection;
using System.Text.Json;
using System.Text.Json.Nodes;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Service.Spacecraft;
using PassPlanner.Service.Stations;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Demo;

/// <summary>
/// An invented scenario: three stations and five spacecraft in orbits that are usual for small satellites. Its element
/// sets are written for the day on which they are asked for, so that it never goes stale.
/// </summary>
public static class DemoScenario
{
    /// <summary>An element set in two lines, invented, that the reader takes.</summary>
    public const string ExampleTwoLines =
        "LARK 1\n"
        + "1 90001U 26001A   26077.50000000  .00001000  00000-0  50000-4 0  9996\n"
        + "2 90001  97.5000 100.0000 0010000  90.0000 270.0000 15.20000000    12\n";

    /// <summary>The day on which the orbits below hold as written.</summary>
    private static readonly UtcInstant ReferenceUtc = UtcInstant.FromCalendar(2026, 1, 1);

    private static readonly (string Id, int CatalogNumber, string Name, double MeanMotionRevPerDay, double InclinationDeg, double Eccentricity, double NodeDeg, double MeanAnomalyDeg, double BStar)[] Orbits =
    [
        ("lark-1", 900000001, "LARK 1", 15.20, 97.45, 0.0011, 61.0, 20.0, 4.0e-5),
        ("lark-2", 900000002, "LARK 2", 15.20, 97.45, 0.0010, 61.0, 200.0, 4.0e-5),
        ("merle", 900000003, "MERLE", 14.90, 97.80, 0.0015, 148.0, 75.0, 2.0e-5),
        ("siskin", 900000004, "SISKIN", 15.16, 51.64, 0.0006, 240.0, 310.0, 6.0e-5),
        ("dunlin", 900000005, "DUNLIN", 15.05, 97.60, 0.0012, 95.0, 130.0, 3.0e-5),
    ];

    /// <summary>The stations.</summary>
    public static IReadOnlyList<StationDocument> Stations => Read<StationDocument>("stations.json");

    /// <summary>The spacecraft.</summary>
    public static IReadOnlyList<SpacecraftDocument> Spacecraft => Read<SpacecraftDocument>("spacecraft.json");

    /// <summary>The first document of a file, as an example for the API description.</summary>
    public static JsonNode ExampleOf(string file) => JsonNode.Parse(Text(file))!.AsArray()[0]!.DeepClone();

    /// <summary>The element set of each spacecraft for midnight of a day.</summary>
    /// <param name="dayUtc">An instant of the day.</param>
    public static IReadOnlyList<(string SpacecraftId, ElementSet ElementSet)> ElementSetsFor(UtcInstant dayUtc)
    {
        double days = Math.Floor(dayUtc.SecondsSince(ReferenceUtc) / 86400);
        return [.. Orbits.Select(orbit =>
        {
            (double nodeDegPerDay, double perigeeDegPerDay) = RatesDegPerDay(orbit.MeanMotionRevPerDay, orbit.InclinationDeg, orbit.Eccentricity);
            return (orbit.Id, new ElementSet
            {
                CatalogNumber = orbit.CatalogNumber,
                Name = orbit.Name,
                EpochUtc = ReferenceUtc.AddSeconds(days * 86400),
                MeanMotionRevPerDay = orbit.MeanMotionRevPerDay,
                Eccentricity = orbit.Eccentricity,
                InclinationDeg = orbit.InclinationDeg,
                RightAscensionOfNodeDeg = Wrap(orbit.NodeDeg + (days * nodeDegPerDay)),
                ArgumentOfPerigeeDeg = Wrap(90 + (days * perigeeDegPerDay)),
                MeanAnomalyDeg = Wrap(orbit.MeanAnomalyDeg + (days * 360 * (orbit.MeanMotionRevPerDay % 1))),
                BStarPerEarthRadius = orbit.BStar,
            });
        })];
    }

    /// <summary>Secular rates of the node and the perigee under J2 (common practice; WGS-72 constants), degrees a day.</summary>
    private static (double NodeDegPerDay, double PerigeeDegPerDay) RatesDegPerDay(double meanMotionRevPerDay, double inclinationDeg, double eccentricity)
    {
        GravityModel gravity = GravityModel.Wgs72;
        double motionRadPerS = meanMotionRevPerDay * 2 * Math.PI / 86400;
        double semiMajorAxisKm = Math.Cbrt(gravity.MuKm3PerS2 / (motionRadPerS * motionRadPerS));
        double parameterKm = semiMajorAxisKm * (1 - (eccentricity * eccentricity));
        double rate = 1.5 * gravity.J2 * Math.Pow(gravity.EarthRadiusKm / parameterKm, 2) * meanMotionRevPerDay * 360;
        double cosine = Math.Cos(double.DegreesToRadians(inclinationDeg));
        return (-rate * cosine, rate * ((2.5 * cosine * cosine) - 0.5));
    }

    private static double Wrap(double angleDeg) => angleDeg - (360 * Math.Floor(angleDeg / 360));

    private static IReadOnlyList<T> Read<T>(string file) => JsonSerializer.Deserialize<IReadOnlyList<T>>(Text(file), WireFormat.Options)!;

    private static string Text(string file)
    {
        // Embedded by the project file under these names.
        using Stream stream = Assembly.GetExecutingAssembly().GetManifestResourceStream("Demo/" + file)!;
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}
