namespace PassPlanner.Service.Validation;

/// <summary>
/// JSON has no NaN and no Infinity, yet some programs write them. Put in quotes they survive parsing, so that the
/// answer can name the member instead of a byte position.
/// </summary>
public static class NonFiniteNumbers
{
    private static ReadOnlySpan<byte> Letters => "NaInfity-"u8;

    /// <summary>The text with bare NaN, Infinity and -Infinity in quotes; the same array when there are none.</summary>
    public static byte[] Quote(byte[] json)
    {
        List<byte>? quoted = null;
        bool inString = false;
        int copied = 0;
        for (int i = 0; i < json.Length; i++)
        {
            if (inString && json[i] == '\\')
            {
                i++;
            }
            else if (json[i] == '"')
            {
                inString = !inString;
            }
            else if (!inString && Letters.Contains(json[i]) && TokenAt(json.AsSpan(i)) is var length and > 0)
            {
                quoted ??= new List<byte>(json.Length + 16);
                quoted.AddRange(json.AsSpan(copied, i - copied));
                quoted.Add((byte)'"');
                quoted.AddRange(json.AsSpan(i, length));
                quoted.Add((byte)'"');
                copied = i + length;
                i += length - 1;
            }
        }

        if (quoted is null)
        {
            return json;
        }

        quoted.AddRange(json.AsSpan(copied));
        return [.. quoted];
    }

    private static int TokenAt(ReadOnlySpan<byte> text) =>
        text.StartsWith("NaN"u8) ? 3
        : text.StartsWith("Infinity"u8) ? 8
        : text.StartsWith("-Infinity"u8) ? 9
        : 0;
}
