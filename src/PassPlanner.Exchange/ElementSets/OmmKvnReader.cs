namespace PassPlanner.Exchange.ElementSets;

/// <summary>Reads messages in keyword = value notation, one after another in a text (CCSDS 502.0-B-3, section 7).</summary>
internal static class OmmKvnReader
{
    private const string FirstKeyword = "CCSDS_OMM_VERS";

    public static void Read(string text, ReadingSink sink)
    {
        OmmMessage? message = null;
        int lineNumber = 0;
        foreach (ReadOnlySpan<char> raw in text.AsSpan().EnumerateLines())
        {
            lineNumber++;
            string line = raw.TrimEnd().ToString();
            string bare = line.TrimStart();
            if (bare.Length == 0 || bare.StartsWith("COMMENT", StringComparison.Ordinal))
            {
                continue;
            }

            int equals = line.IndexOf('=', StringComparison.Ordinal);
            if (equals < 0)
            {
                sink.Refuse(lineNumber, line.Length - bare.Length + 1, $"{FieldParser.Quoted(bare)} is no keyword = value");
                continue;
            }

            string keyword = line[..equals].Trim();
            if (keyword == FirstKeyword)
            {
                message?.Finish(sink, needsMetadata: true);
                message = new OmmMessage(lineNumber);
            }

            message ??= new OmmMessage(lineNumber);
            string value = line[(equals + 1)..];
            int column = equals + 2 + (value.Length - value.TrimStart().Length);
            (string bareValue, string? unit) = SplitUnit(value.Trim());
            message.Set(keyword, bareValue, new Place(lineNumber, column), unit);
        }

        message?.Finish(sink, needsMetadata: true);
    }

    /// <summary>A value and the unit in brackets that may follow it.</summary>
    private static (string Value, string? Unit) SplitUnit(string value)
    {
        int bracket = value.LastIndexOf('[');
        return bracket > 0 && value.EndsWith(']') ? (value[..bracket].TrimEnd(), value[(bracket + 1)..^1].Trim()) : (value, null);
    }
}
