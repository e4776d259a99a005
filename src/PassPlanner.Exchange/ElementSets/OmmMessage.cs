using PassPlanner.Physics.Orbits;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>
/// The keywords of one orbit mean-elements message (CCSDS 502.0-B-3, tables 4-1 to 4-3) and where they stand. Keywords
/// that do not matter here are passed over.
/// </summary>
internal sealed class OmmMessage(int lineNumber)
{
    /// <summary>Units of the keywords that may state one (table 4-3); a message that states another is refused.</summary>
    private static readonly Dictionary<string, string> Units = new(StringComparer.OrdinalIgnoreCase)
    {
        ["MEAN_MOTION"] = "rev/day",
        ["INCLINATION"] = "deg",
        ["RA_OF_ASC_NODE"] = "deg",
        ["ARG_OF_PERICENTER"] = "deg",
        ["MEAN_ANOMALY"] = "deg",
        ["BSTAR"] = "1/ER",
        ["MEAN_MOTION_DOT"] = "rev/day**2",
        ["MEAN_MOTION_DDOT"] = "rev/day**3",
    };

    private readonly Dictionary<string, (string Value, Place At)> keywords = new(StringComparer.OrdinalIgnoreCase);

    private RefusedLine? wrongUnit;

    public int LineNumber { get; } = lineNumber;

    /// <summary>Sets a keyword; the last of two wins. An empty value counts as absent.</summary>
    public void Set(string keyword, string value, Place at, string? unit = null)
    {
        if (unit is not null && Units.TryGetValue(keyword, out string? expected) && !string.Equals(unit, expected, StringComparison.OrdinalIgnoreCase))
        {
            wrongUnit ??= new RefusedLine(at.LineNumber, at.Column, $"the unit of {keyword} is {FieldParser.Quoted(unit)}; it must be {expected}");
        }

        if (value.Length > 0)
        {
            keywords[keyword] = (value, at);
        }
    }

    /// <summary>Hands the element set on, or the first thing that is wrong with it.</summary>
    /// <param name="sink">Where to.</param>
    /// <param name="needsMetadata">Whether the message must say its frame, time system and theory, as the standard asks of KVN and XML.</param>
    public void Finish(ReadingSink sink, bool needsMetadata)
    {
        var fields = new FieldParser();
        ElementSet set = Build(fields, needsMetadata);
        if ((wrongUnit ?? fields.Refusal) is { } refusal)
        {
            sink.Refuse(refusal);
        }
        else
        {
            sink.Accept(set, LineNumber);
        }
    }

    private ElementSet Build(FieldParser fields, bool needsMetadata)
    {
        Expect("TIME_SYSTEM", fields, needsMetadata, "UTC");
        Expect("REF_FRAME", fields, needsMetadata, "TEME");
        Expect("CENTER_NAME", fields, needsMetadata, "EARTH");
        Expect("MEAN_ELEMENT_THEORY", fields, needsMetadata, "SGP4", "SGP/SGP4");
        if (keywords.TryGetValue("EPHEMERIS_TYPE", out (string Value, Place At) type))
        {
            fields.CheckEphemerisType(type.Value, type.At);
        }

        return new ElementSet
        {
            CatalogNumber = Required("NORAD_CAT_ID", fields, fields.CatalogNumber),
            Name = Text("OBJECT_NAME"),
            InternationalDesignator = Text("OBJECT_ID"),
            Classification = keywords.TryGetValue("CLASSIFICATION_TYPE", out (string Value, Place At) letter) ? fields.Classification(letter.Value, letter.At) : 'U',
            EpochUtc = Required("EPOCH", fields, fields.Epoch),
            MeanMotionRevPerDay = Required("MEAN_MOTION", fields, fields.MeanMotion),
            Eccentricity = Required("ECCENTRICITY", fields, fields.Eccentricity),
            InclinationDeg = Required("INCLINATION", fields, fields.Inclination),
            RightAscensionOfNodeDeg = Required("RA_OF_ASC_NODE", fields, (text, at) => fields.Angle(text, at, "right ascension of the node")),
            ArgumentOfPerigeeDeg = Required("ARG_OF_PERICENTER", fields, (text, at) => fields.Angle(text, at, "argument of perigee")),
            MeanAnomalyDeg = Required("MEAN_ANOMALY", fields, (text, at) => fields.Angle(text, at, "mean anomaly")),
            BStarPerEarthRadius = Required("BSTAR", fields, fields.BStar),
            MeanMotionDotRevPerDay2 = Optional("MEAN_MOTION_DOT", fields.MeanMotionDot),
            MeanMotionDdotRevPerDay3 = Optional("MEAN_MOTION_DDOT", fields.MeanMotionDdot),
            ElementSetNumber = Optional("ELEMENT_SET_NO", (text, at) => fields.Count(text, at, "element set number")),
            RevolutionNumber = Optional("REV_AT_EPOCH", (text, at) => fields.Count(text, at, "revolution number")),
        };
    }

    private string Text(string keyword) => keywords.TryGetValue(keyword, out (string Value, Place At) found) ? FieldParser.Printable(found.Value) : "";

    private T? Optional<T>(string keyword, Func<string, Place, T> parse) =>
        keywords.TryGetValue(keyword, out (string Value, Place At) found) ? parse(found.Value, found.At) : default;

    private T? Required<T>(string keyword, FieldParser fields, Func<string, Place, T> parse)
    {
        if (keywords.TryGetValue(keyword, out (string Value, Place At) found))
        {
            return parse(found.Value, found.At);
        }

        fields.Refuse(new Place(LineNumber, 1), $"{keyword} is missing from the message that begins here");
        return default;
    }

    private void Expect(string keyword, FieldParser fields, bool isNeeded, params string[] allowed)
    {
        if (!keywords.TryGetValue(keyword, out (string Value, Place At) found))
        {
            if (isNeeded)
            {
                fields.Refuse(new Place(LineNumber, 1), $"{keyword} is missing from the message that begins here; it must be {string.Join(" or ", allowed)}");
            }
        }
        else if (!allowed.Contains(found.Value, StringComparer.OrdinalIgnoreCase))
        {
            fields.Refuse(found.At, $"{keyword} is {FieldParser.Quoted(found.Value)}; it must be {string.Join(" or ", allowed)}");
        }
    }
}
