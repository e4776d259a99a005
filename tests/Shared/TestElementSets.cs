using System.Globalization;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Tests;

/// <summary>Element sets of the reference files by their fixed columns; no checks, for tests alone.</summary>
internal static class TestElementSets
{
    /// <summary>All sets of a file, in its order; comment lines and name lines are passed over.</summary>
    public static IReadOnlyList<ElementSet> Read(string relativePath)
    {
        using var reader = new StreamReader(ReferenceData.Open(relativePath));
        var sets = new List<ElementSet>();
        string? first = null;
        while (reader.ReadLine() is { } line)
        {
            if (line.StartsWith("1 ", StringComparison.Ordinal))
            {
                first = line;
            }
            else if (line.StartsWith("2 ", StringComparison.Ordinal) && first is not null)
            {
                sets.Add(Parse(first, line));
                first = null;
            }
        }

        return sets;
    }

    public static ElementSet Parse(string line1, string line2)
    {
        int year = int.Parse(line1.AsSpan(18, 2), CultureInfo.InvariantCulture);
        return new ElementSet
        {
            CatalogNumber = Catalogue(line1.Substring(2, 5)),
            EpochUtc = UtcInstant.FromDayOfYear(year < 57 ? 2000 + year : 1900 + year, Number(line1.Substring(20, 12))),
            MeanMotionDotRevPerDay2 = Number(line1.Substring(33, 10)),
            BStarPerEarthRadius = Exponential(line1.Substring(53, 8)),
            InclinationDeg = Number(line2.Substring(8, 8)),
            RightAscensionOfNodeDeg = Number(line2.Substring(17, 8)),
            Eccentricity = Number("0." + line2.Substring(26, 7).Replace(' ', '0')),
            ArgumentOfPerigeeDeg = Number(line2.Substring(34, 8)),
            MeanAnomalyDeg = Number(line2.Substring(43, 8)),
            MeanMotionRevPerDay = Number(line2.Substring(52, 11)),
        };
    }

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);

    private static double Exponential(string text)
    {
        double mantissa = Number(text[..6].Replace(' ', '0').Insert(1, "."));
        return mantissa * Math.Pow(10.0, Number(text[6..]));
    }

    private static int Catalogue(string text)
    {
        const string Letters = "ABCDEFGHJKLMNPQRSTUVWXYZ";
        int letter = Letters.IndexOf(text[0]);
        return letter < 0
            ? int.Parse(text.Trim(), CultureInfo.InvariantCulture)
            : ((letter + 10) * 10000) + int.Parse(text.AsSpan(1), CultureInfo.InvariantCulture);
    }
}
