using System.Text;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>Reads element sets in every form that they come in. A bad line is refused with its reason; the rest is still read.</summary>
public static class ElementSetReader
{
    /// <summary>Reads a text, UTF-8 with or without a byte-order mark.</summary>
    /// <param name="stream">The text; read to its end, not closed.</param>
    /// <param name="options">How.</param>
    public static ElementSetReading Read(Stream stream, ElementSetReaderOptions options)
    {
        using var reader = new StreamReader(stream, Encoding.UTF8, detectEncodingFromByteOrderMarks: true, leaveOpen: true);
        char[] buffer = new char[8192];
        var text = new StringBuilder();
        for (int read = reader.ReadBlock(buffer); read > 0; read = reader.ReadBlock(buffer))
        {
            text.Append(buffer, 0, read);
            if (text.Length > options.MaximumCharacters)
            {
                return new ElementSetReading(
                    [], [new RefusedLine(1, 1, $"the text has more than {options.MaximumCharacters} characters; send it in parts")], ElementSetFormat.TwoLine);
            }
        }

        return Read(text.ToString(), options);
    }

    private static ElementSetReading Read(string text, ElementSetReaderOptions options)
    {
        ElementSetFormat format = FormatOf(text);
        var sink = new ReadingSink();
        switch (format)
        {
            case ElementSetFormat.OmmKvn:
                OmmKvnReader.Read(text, sink);
                break;
            case ElementSetFormat.OmmXml:
                OmmXmlReader.Read(text, sink);
                break;
            case ElementSetFormat.OmmJson:
                OmmJsonReader.Read(text, sink);
                break;
            case ElementSetFormat.OmmCsv:
                OmmCsvReader.Read(text, sink);
                break;
            default:
                new TwoLineReader(sink, options.AcceptBadChecksums).Read(text);
                break;
        }

        return sink.ToReading(format);
    }

    /// <summary>The form of a text by its beginning.</summary>
    private static ElementSetFormat FormatOf(string text)
    {
        string start = text.TrimStart();
        string firstLine = start.Split('\n', 2)[0];
        return start switch
        {
            ['{', ..] or ['[', ..] => ElementSetFormat.OmmJson,
            ['<', ..] => ElementSetFormat.OmmXml,
            _ when firstLine.Contains("NORAD_CAT_ID", StringComparison.OrdinalIgnoreCase) && firstLine.Contains(',', StringComparison.Ordinal) => ElementSetFormat.OmmCsv,
            _ when start.StartsWith("CCSDS_OMM_VERS", StringComparison.Ordinal) || start.Contains("\nCCSDS_OMM_VERS", StringComparison.Ordinal) => ElementSetFormat.OmmKvn,
            _ => ElementSetFormat.TwoLine,
        };
    }
}
