using PassPlanner.Physics.Orbits;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>
/// Reads two-line sets by their columns (Spacetrack Report #3, section 2; Alpha-5 numbers as common practice has them). A
/// line is taken for a line of elements when its first columns look like one, and otherwise for a name; two-digit years
/// from 57 are of the twentieth century.
/// </summary>
internal sealed class TwoLineReader(ReadingSink sink, bool acceptBadChecksums)
{
    private const int LineLength = 69;
    private const int FirstYear = 57;
    private const string AlphaDigits = "0123456789ABCDEFGHJKLMNPQRSTUVWXYZ";

    private (string Text, int LineNumber)? name;
    private (string Text, int LineNumber)? first;

    public void Read(string text)
    {
        int lineNumber = 0;
        foreach (ReadOnlySpan<char> raw in text.AsSpan().EnumerateLines())
        {
            lineNumber++;
            string line = raw.TrimEnd().ToString();
            if (line.Length == 0 || line[0] == '#')
            {
                continue;
            }

            if (IsElements(line, '1'))
            {
                RefuseFirstAlone();
                first = (line, lineNumber);
            }
            else if (IsElements(line, '2'))
            {
                TakeSecond(line, lineNumber);
            }
            else
            {
                RefuseFirstAlone();
                RefuseNameAlone();
                name = (line, lineNumber);
            }
        }

        RefuseFirstAlone();
        RefuseNameAlone();
    }

    /// <summary>Whether a line begins as line 1 or 2 does: its number, a space, and a catalogue number or the blanks of one.</summary>
    private static bool IsElements(string line, char number) =>
        line.Length >= 7 && line[0] == number && line[1] == ' ' && char.IsAsciiDigit(line[6]) && line[2..6].All(c => char.IsAsciiLetterOrDigit(c) || c == ' ');

    private void RefuseFirstAlone()
    {
        if (first is { } alone)
        {
            sink.Refuse(alone.LineNumber, 1, "line 1 of an element set without a line 2 after it");
            first = null;
            name = null;
        }
    }

    private void RefuseNameAlone()
    {
        if (name is { } alone)
        {
            sink.Refuse(alone.LineNumber, 1, "neither line 1 nor line 2 of an element set, nor a name before one");
            name = null;
        }
    }

    private void TakeSecond(string line, int lineNumber)
    {
        if (first is not { } one)
        {
            RefuseNameAlone();
            sink.Refuse(lineNumber, 1, "line 2 of an element set without a line 1 before it");
            return;
        }

        var fields = new FieldParser();
        CheckLine(one.Text, one.LineNumber, fields);
        CheckLine(line, lineNumber, fields);
        ElementSet? set = fields.Refusal is null ? Parse(one.Text, one.LineNumber, line, lineNumber, fields) : null;
        if (fields.Refusal is { } refusal)
        {
            sink.Refuse(refusal);
        }
        else
        {
            sink.Accept(set!, name?.LineNumber ?? one.LineNumber);
        }

        (first, name) = (null, null);
    }

    private void CheckLine(string line, int lineNumber, FieldParser fields)
    {
        if (line.Length != LineLength && !(acceptBadChecksums && line.Length == LineLength - 1))
        {
            fields.Refuse(new Place(lineNumber, Math.Min(line.Length, LineLength) + (line.Length < LineLength ? 1 : 0)), $"the line has {line.Length} characters; it must have {LineLength}");
        }
        else if (!acceptBadChecksums && line[^1] != '0' + ChecksumOf(line))
        {
            fields.Refuse(new Place(lineNumber, LineLength), $"the checksum is {FieldParser.Quoted(line[^1..])}; the line's digits make {ChecksumOf(line)}");
        }
    }

    /// <summary>Sum of the digits of the first 68 columns, a minus sign counting 1, modulo 10.</summary>
    private static int ChecksumOf(string line)
    {
        int sum = 0;
        foreach (char c in line.AsSpan(0, LineLength - 1))
        {
            sum += c == '-' ? 1 : char.IsAsciiDigit(c) ? c - '0' : 0;
        }

        return sum % 10;
    }

    private ElementSet Parse(string one, int lineOne, string two, int lineTwo, FieldParser fields)
    {
        int catalogNumber = CatalogNumber(one[2..7], new Place(lineOne, 3), fields);
        if (fields.Refusal is null && CatalogNumber(two[2..7], new Place(lineTwo, 3), fields) != catalogNumber)
        {
            fields.Refuse(new Place(lineTwo, 3), $"the catalogue number is {FieldParser.Quoted(two[2..7])}; it must be {FieldParser.Quoted(one[2..7])} as in line 1");
        }

        fields.CheckEphemerisType(one[62..63].Trim(), new Place(lineOne, 63));
        int twoDigits = Year(one[18..20], new Place(lineOne, 19), fields);
        return new ElementSet
        {
            CatalogNumber = catalogNumber,
            Name = name is { } named ? NameOf(named.Text) : "",
            Classification = fields.Classification(one[7..8], new Place(lineOne, 8)),
            InternationalDesignator = Designator(one[9..17]),
            EpochUtc = fields.Epoch(twoDigits < FirstYear ? 2000 + twoDigits : 1900 + twoDigits, Filled(one[20..32]), new Place(lineOne, 21)),
            MeanMotionDotRevPerDay2 = fields.MeanMotionDot(Blank(one[33..43]), new Place(lineOne, 34)),
            MeanMotionDdotRevPerDay3 = fields.MeanMotionDdot(WithExponent(one[44..52]), new Place(lineOne, 45)),
            BStarPerEarthRadius = fields.BStar(WithExponent(one[53..61]), new Place(lineOne, 54)),
            ElementSetNumber = fields.Count(Blank(one[64..68]), new Place(lineOne, 65), "element set number"),
            InclinationDeg = fields.Inclination(two[8..16].Trim(), new Place(lineTwo, 9)),
            RightAscensionOfNodeDeg = fields.Angle(two[17..25].Trim(), new Place(lineTwo, 18), "right ascension of the node"),
            Eccentricity = fields.Eccentricity("0." + Filled(two[26..33]), new Place(lineTwo, 27)),
            ArgumentOfPerigeeDeg = fields.Angle(two[34..42].Trim(), new Place(lineTwo, 35), "argument of perigee"),
            MeanAnomalyDeg = fields.Angle(two[43..51].Trim(), new Place(lineTwo, 44), "mean anomaly"),
            MeanMotionRevPerDay = fields.MeanMotion(two[52..63].Trim(), new Place(lineTwo, 53)),
            RevolutionNumber = fields.Count(Blank(two[63..68]), new Place(lineTwo, 64), "revolution number"),
        };
    }

    /// <summary>Five columns: digits, digits after blanks, or a letter for the first two digits (A is 10; no I, no O).</summary>
    private static int CatalogNumber(string field, Place at, FieldParser fields)
    {
        string text = field.Trim();
        int lead = text.Length == 5 ? AlphaDigits.IndexOf(text[0], StringComparison.Ordinal) : -1;
        return fields.CatalogNumber(lead >= 10 ? lead.ToString(System.Globalization.CultureInfo.InvariantCulture) + text[1..] : text, at);
    }

    private static int Year(string field, Place at, FieldParser fields)
    {
        string text = Filled(field);
        if (char.IsAsciiDigit(text[0]) && char.IsAsciiDigit(text[1]))
        {
            return ((text[0] - '0') * 10) + (text[1] - '0');
        }

        fields.Refuse(at, $"the year of the epoch is {FieldParser.Quoted(field)}; it must be two digits");
        return 0;
    }

    /// <summary>A name without the "0 " that some sources put before it.</summary>
    private static string NameOf(string line) => FieldParser.Printable(line.StartsWith("0 ", StringComparison.Ordinal) ? line[2..] : line).Trim();

    /// <summary>1998-067A from "98067A  "; a designator in another form as it stands, empty when blank.</summary>
    private static string Designator(string field)
    {
        string text = field.Trim();
        return text.Length is >= 6 and <= 8 && text[..5].All(char.IsAsciiDigit)
            ? $"{(string.CompareOrdinal(text[..2], "57") < 0 ? "20" : "19")}{text[..2]}-{text[2..]}"
            : FieldParser.Printable(text);
    }

    private static string Filled(string field) => field.Replace(' ', '0');

    private static string Blank(string field) => field.Trim() is { Length: > 0 } text ? text : "0";

    /// <summary>A field with an implied point and a power of ten, such as " 28098-4", as a number that any parser reads.</summary>
    private static string WithExponent(string field)
    {
        string text = field.Trim();
        if (text.Length == 0)
        {
            return "0";
        }

        string sign = text[0] is '-' or '+' ? text[..1] : "";
        string digits = text[sign.Length..];
        int power = digits.LastIndexOfAny(['-', '+']);
        return power <= 0 ? $"{sign}0.{digits}" : $"{sign}0.{digits[..power].TrimEnd()}e{digits[power..]}";
    }
}
