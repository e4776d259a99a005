using System.Globalization;
using CsvHelper;
using PassPlanner.Physics.Antennas;

namespace PassPlanner.Exchange.Patterns;

/// <summary>
/// Reads measured cuts from CSV: a header that names the columns with their units, angleDeg and gainDbi, and phiDeg where
/// there are several cuts; then a row for each point. Rows of one phi make one cut, in the order of their angles.
/// </summary>
public static class MeasuredCutReader
{
    private const int MostRows = 100_000;
    private static readonly string[] Known = ["phiDeg", "angleDeg", "gainDbi"];

    /// <summary>Reads a text, UTF-8.</summary>
    /// <param name="stream">The text; read to its end, not closed.</param>
    public static MeasuredCutReading Read(Stream stream)
    {
        var refused = new List<RefusedRow>();
        var points = new List<(double PhiDeg, double AngleDeg, double GainDbi)>();
        try
        {
            using CsvReader reader = CsvReader.Create(stream, new CsvReaderOptions { HasHeader = false, Separator = ',', TrackLineNumbers = true }, leaveOpen: true);
            ReadRows(reader, points, refused);
        }
        catch (FormatException)
        {
            refused.Add(new RefusedRow(points.Count + refused.Count + 2, 1, "the text is not CSV from here on: a quote is not closed, or a row is too long"));
        }

        List<MeasuredCut> cuts = refused.Count > 0 ? [] : Cuts(points, refused);
        return new MeasuredCutReading(cuts, refused);
    }

    private static void ReadRows(CsvReader reader, List<(double PhiDeg, double AngleDeg, double GainDbi)> points, List<RefusedRow> refused)
    {
        int row = 1;
        if (!reader.Read() || ColumnsOf(reader, refused) is not { } columns)
        {
            return;
        }

        while (reader.Read())
        {
            row++;
            if (row > MostRows)
            {
                refused.Add(new RefusedRow(row, 1, $"there are more than {MostRows} rows"));
                return;
            }

            double? phiDeg = columns.Phi < 0 ? 0 : Number(reader, row, columns.Phi, "phiDeg", 0, 360, "degrees", refused);
            double? angleDeg = Number(reader, row, columns.Angle, "angleDeg", 0, 180, "degrees", refused);
            double? gainDbi = Number(reader, row, columns.Gain, "gainDbi", AntennaPattern.MinimumGainDbi, 100, "dBi", refused);
            if (phiDeg is { } phi && angleDeg is { } angle && gainDbi is { } gain)
            {
                points.Add((phi % 360, angle, gain));
            }
        }
    }

    private static (int Phi, int Angle, int Gain)? ColumnsOf(CsvReader reader, List<RefusedRow> refused)
    {
        string[] header = [.. Enumerable.Range(0, reader.FieldCount).Select(i => reader.GetString(i).Trim().TrimStart('\uFEFF'))];
        for (int i = 0; i < header.Length; i++)
        {
            if (!Known.Contains(header[i], StringComparer.Ordinal))
            {
                refused.Add(new RefusedRow(1, i + 1, $"\"{header[i]}\" is no column here; there are {string.Join(", ", Known)}, each with its unit in its name"));
            }
        }

        (int phi, int angle, int gain) = (Array.IndexOf(header, "phiDeg"), Array.IndexOf(header, "angleDeg"), Array.IndexOf(header, "gainDbi"));
        if (angle < 0 || gain < 0)
        {
            refused.Add(new RefusedRow(1, 1, "the header must name angleDeg and gainDbi, and phiDeg where there are several cuts"));
        }

        return refused.Count == 0 ? (phi, angle, gain) : null;
    }

    private static double? Number(
        CsvReader reader, int row, int column, string name, double minimum, double maximum, string unit, List<RefusedRow> refused)
    {
        string text = column < reader.FieldCount ? reader.GetString(column).Trim() : "";
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) && value >= minimum && value <= maximum)
        {
            return value;
        }

        refused.Add(new RefusedRow(row, column + 1, FormattableString.Invariant($"{name} is \"{text}\"; it must be a number from {minimum} to {maximum} {unit}")));
        return null;
    }

    private static List<MeasuredCut> Cuts(List<(double PhiDeg, double AngleDeg, double GainDbi)> points, List<RefusedRow> refused)
    {
        var cuts = new List<MeasuredCut>();
        foreach (IGrouping<double, (double PhiDeg, double AngleDeg, double GainDbi)> cut in points.GroupBy(p => p.PhiDeg).OrderBy(g => g.Key))
        {
            List<(double PhiDeg, double AngleDeg, double GainDbi)> ordered = [.. cut.OrderBy(p => p.AngleDeg)];
            double? twice = ordered.Zip(ordered.Skip(1)).Where(pair => pair.First.AngleDeg == pair.Second.AngleDeg).Select(pair => (double?)pair.First.AngleDeg).FirstOrDefault();
            if (ordered.Count < 2 || twice is not null)
            {
                refused.Add(new RefusedRow(1, 1, FormattableString.Invariant(
                    $"the cut at phiDeg {cut.Key} {(twice is { } angleDeg ? $"has angleDeg {angleDeg} twice" : "has one point; it must have at least 2")}")));
                continue;
            }

            cuts.Add(new MeasuredCut(cut.Key, [.. ordered.Select(p => p.AngleDeg)], [.. ordered.Select(p => p.GainDbi)]));
        }

        if (points.Count == 0)
        {
            refused.Add(new RefusedRow(1, 1, "there is no row with a point"));
        }

        return refused.Count > 0 ? [] : cuts;
    }
}
