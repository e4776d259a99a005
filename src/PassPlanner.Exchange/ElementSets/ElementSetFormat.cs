namespace PassPlanner.Exchange.ElementSets;

/// <summary>Form in which element sets are written.</summary>
public enum ElementSetFormat
{
    /// <summary>Two lines of 69 columns, with or without a line of name before them.</summary>
    TwoLine,

    /// <summary>Orbit mean-elements message as keyword = value notation (CCSDS 502.0-B-3, section 4).</summary>
    OmmKvn,

    /// <summary>Orbit mean-elements message as XML (CCSDS 502.0-B-3, section 8).</summary>
    OmmXml,

    /// <summary>Orbit mean-elements messages as JSON, one object with the keywords of the message or a list of them (common practice).</summary>
    OmmJson,

    /// <summary>Orbit mean-elements messages as CSV with the keywords of the message as header (common practice).</summary>
    OmmCsv,
}
