using System.Xml;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>Reads messages in XML, alone or several in one (CCSDS 502.0-B-3, section 8). No document type, nothing from outside.</summary>
internal static class OmmXmlReader
{
    private const long MostCharacters = 64L * 1024 * 1024;

    public static void Read(string text, ReadingSink sink)
    {
        var settings = new XmlReaderSettings
        {
            DtdProcessing = DtdProcessing.Prohibit,
            XmlResolver = null,
            MaxCharactersInDocument = MostCharacters,
            IgnoreComments = true,
            IgnoreProcessingInstructions = true,
        };
        try
        {
            using var source = new StringReader(text);
            using var reader = XmlReader.Create(source, settings);
            ReadMessages(reader, sink);
        }
        catch (XmlException bad)
        {
            sink.Refuse(Math.Max(1, bad.LineNumber), Math.Max(1, bad.LinePosition), "the text is not XML from here on: " + Sentence(bad));
        }
    }

    private static void ReadMessages(XmlReader reader, ReadingSink sink)
    {
        var lines = (IXmlLineInfo)reader;
        OmmMessage? message = null;
        bool found = false;
        string element = "";
        string? unit = null;
        while (reader.Read())
        {
            switch (reader.NodeType)
            {
                case XmlNodeType.Element when reader.LocalName == "omm":
                    message = new OmmMessage(lines.LineNumber);
                    break;
                case XmlNodeType.Element:
                    (element, unit) = (reader.LocalName, reader.GetAttribute("units"));
                    break;
                case XmlNodeType.Text or XmlNodeType.CDATA:
                    message?.Set(element, reader.Value.Trim(), new Place(lines.LineNumber, lines.LinePosition), unit);
                    break;
                case XmlNodeType.EndElement when reader.LocalName == "omm":
                    message?.Finish(sink, needsMetadata: true);
                    found = true;
                    message = null;
                    break;
                case XmlNodeType.EndElement:
                    element = "";
                    break;
                default:
                    break;
            }
        }

        if (!found)
        {
            sink.Refuse(1, 1, "there is no omm element in the text");
        }
    }

    /// <summary>What is wrong, without the place, which is told apart.</summary>
    private static string Sentence(XmlException bad)
    {
        int place = bad.Message.LastIndexOf(" Line ", StringComparison.Ordinal);
        return place > 0 ? bad.Message[..place] : bad.Message;
    }
}
