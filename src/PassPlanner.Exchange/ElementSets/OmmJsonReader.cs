using System.Text;
using System.Text.Json;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>Reads messages in JSON: one object of keywords, or a list of them; numbers may be written as texts.</summary>
internal static class OmmJsonReader
{
    public static void Read(string text, ReadingSink sink)
    {
        byte[] bytes = Encoding.UTF8.GetBytes(text);
        var lines = new LineIndex(bytes);
        var reader = new Utf8JsonReader(bytes, new JsonReaderOptions { MaxDepth = 16, CommentHandling = JsonCommentHandling.Skip });
        try
        {
            ReadMessages(ref reader, lines, sink);
        }
        catch (JsonException bad)
        {
            sink.Refuse((int)(bad.LineNumber ?? 0) + 1, (int)(bad.BytePositionInLine ?? 0) + 1, "the text is not JSON from here on");
        }
    }

    private static void ReadMessages(ref Utf8JsonReader reader, LineIndex lines, ReadingSink sink)
    {
        OmmMessage? message = null;
        string keyword = "";
        while (reader.Read())
        {
            Place at = lines.PlaceOf(reader.TokenStartIndex);
            switch (reader.TokenType)
            {
                case JsonTokenType.StartObject when message is null:
                    message = new OmmMessage(at.LineNumber);
                    break;
                case JsonTokenType.StartObject or JsonTokenType.StartArray when message is not null:
                    reader.Skip();
                    break;
                case JsonTokenType.PropertyName:
                    keyword = TextOf(ref reader, at, sink);
                    break;
                case JsonTokenType.String or JsonTokenType.Number when message is not null:
                    string value = reader.TokenType == JsonTokenType.String ? TextOf(ref reader, at, sink) : Encoding.UTF8.GetString(reader.ValueSpan);
                    message.Set(keyword, value.Trim(), at);
                    break;
                case JsonTokenType.EndObject:
                    message?.Finish(sink, needsMetadata: false);
                    message = null;
                    break;
                case JsonTokenType.StartArray or JsonTokenType.EndArray or JsonTokenType.Null or JsonTokenType.True or JsonTokenType.False when message is not null || reader.CurrentDepth == 0:
                    break;
                case JsonTokenType.StartArray or JsonTokenType.EndArray:
                    break;
                default:
                    sink.Refuse(at.LineNumber, at.Column, "a list of element sets holds objects, not values");
                    break;
            }
        }
    }

    /// <summary>A text; empty, and refused, when it has an escape that stands for no character.</summary>
    private static string TextOf(ref Utf8JsonReader reader, Place at, ReadingSink sink)
    {
        try
        {
            return reader.GetString()!;
        }
        catch (InvalidOperationException)
        {
            sink.Refuse(at.LineNumber, at.Column, "the text has an escape that stands for no character");
            return "";
        }
    }
}
