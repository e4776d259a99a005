using CsvHelper;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>Reads messages in CSV: a header of keywords in any order, then a row for each message. Columns are numbers of fields.</summary>
internal static class OmmCsvReader
{
    public static void Read(string text, ReadingSink sink)
    {
        var lines = new List<(string Text, int LineNumber)>();
        int lineNumber = 0;
        foreach (ReadOnlySpan<char> raw in text.AsSpan().EnumerateLines())
        {
            lineNumber++;
            if (!raw.IsWhiteSpace())
            {
                lines.Add((raw.ToString(), lineNumber));
            }
        }

        if (lines.Count == 0)
        {
            return;
        }

        IReadOnlyList<string> header = FieldsOf(lines[0].Text) ?? [];
        if (!header.Contains("NORAD_CAT_ID", StringComparer.OrdinalIgnoreCase))
        {
            sink.Refuse(lines[0].LineNumber, 1, "the header lacks NORAD_CAT_ID; it must have the keywords of an orbit mean-elements message");
            return;
        }

        foreach ((string line, int number) in lines.Skip(1))
        {
            ReadRow(line, number, header, sink);
        }
    }

    private static void ReadRow(string line, int lineNumber, IReadOnlyList<string> header, ReadingSink sink)
    {
        if (FieldsOf(line) is not { } fields)
        {
            sink.Refuse(lineNumber, 1, "the row is not CSV: a quote is not closed");
            return;
        }

        if (fields.Count != header.Count)
        {
            sink.Refuse(lineNumber, Math.Min(fields.Count, header.Count) + 1, $"the row has {fields.Count} fields; it must have {header.Count} as the header");
            return;
        }

        var message = new OmmMessage(lineNumber);
        for (int i = 0; i < header.Count; i++)
        {
            message.Set(header[i].Trim(), fields[i].Trim(), new Place(lineNumber, i + 1));
        }

        message.Finish(sink, needsMetadata: false);
    }

    /// <summary>The fields of one row; nothing when it is not CSV. Rows are read one by one so that a bad one does not take the rest with it.</summary>
    private static List<string>? FieldsOf(string line)
    {
        try
        {
            using CsvReader reader = CsvReader.FromText(line + "\n", new CsvReaderOptions { HasHeader = false, Separator = ',' });
            return reader.Read() ? [.. Enumerable.Range(0, reader.FieldCount).Select(reader.GetString)] : [];
        }
        catch (FormatException)
        {
            return null;
        }
    }
}
