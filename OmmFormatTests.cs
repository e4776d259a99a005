using System.Text;
using PassPlanner.Exchange.ElementSets;
using PassPlanner.Physics.Orbits;
using PassPlanner.Tests;
using static PassPlanner.Exchange.Tests.ElementSets.Reading;

namespace PassPlanner.Exchange.Tests.ElementSets;

/// <summary>What each way of writing messages allows and refuses; the good ones are tests/reference/orbit/omm (SOURCE.md there).</summary>
public sealed class OmmFormatTests
{
    private static readonly string Json = File.ReadAllText(ReferenceData.PathOf("orbit/omm/vanguard1.json")).Trim();

    private static readonly string Xml = File.ReadAllText(ReferenceData.PathOf("orbit/omm/vanguard1.xml"));

    private static readonly string[] Csv = File.ReadAllLines(ReferenceData.PathOf("orbit/omm/vanguard1.csv"));

    [Fact]
    public void Json_may_be_one_object_or_an_array_with_numbers_as_strings()
    {
        string single = Json[1..^1];
        string strings = single.Replace("0.1841322", "\"0.1841322\"", StringComparison.Ordinal).Replace(": 5,", ": \" 5\",", StringComparison.Ordinal);
        ElementSet set = Assert.Single(Of(Json).Accepted).Elements;
        Assert.Equal(set, Assert.Single(Of("\uFEFF" + single).Accepted).Elements);
        Assert.Equal([set, set], Of($"[{strings},{single}]").Accepted.Select(x => x.Elements));
    }

    [Fact]
    public void Bad_json_sets_are_refused_where_they_stand_and_the_others_read()
    {
        string single = Json[1..^1];
        string bad = single.Replace("0.1841322", "true", StringComparison.Ordinal);
        ElementSetReading reading = Of($"[{bad},\n7, [1],\n{single}, {{}}]");
        Assert.Equal([(6, 21), (20, 1), (20, 4), (39, 4)], reading.Refused.Select(x => (x.LineNumber, x.Column)));
        Assert.Contains("ECCENTRICITY must be a number or a string", reading.Refused[0].Reason, StringComparison.Ordinal);
        Assert.Equal(21, Assert.Single(reading.Accepted).LineNumber);
    }

    [Theory]
    [InlineData("\"MEAN_MOTION\": 10.85873516", "\"MEAN_MOTION\": 10.85873516,\n\"mean_motion\": 1", 6, 16, "given twice")]
    [InlineData("VANGUARD 1", "\\ud800", 2, 20, "must be a number or a string")]
    [InlineData("10.85873516", "{\"a\":[1]}", 5, 20, "must be a number or a string")]
    [InlineData("10.85873516", "null", 1, 2, "MEAN_MOTION is missing")]
    public void A_bad_member_of_a_json_set_is_refused(string old, string changed, int lineNumber, int column, string reason)
    {
        RefusedLine refusal = OnlyRefusal(Of(Json.Replace(old, changed, StringComparison.Ordinal)));
        Assert.Equal((lineNumber, column), (refusal.LineNumber, refusal.Column));
        Assert.Contains(reason, refusal.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Sets_before_broken_json_are_kept()
    {
        ElementSetReading reading = Of($"[{Json[1..^1]},\n{{\"EPOCH\" 3");
        Assert.Single(reading.Accepted);
        Assert.Equal(20, Assert.Single(reading.Refused).LineNumber);
    }

    [Fact]
    public void An_ndm_may_hold_many_messages_and_the_bad_ones_are_refused_alone()
    {
        int start = Xml.IndexOf("<omm", StringComparison.Ordinal);
        int end = Xml.IndexOf("</ndm>", StringComparison.Ordinal);
        string message = Xml[start..end];
        string bad = message.Replace("<INCLINATION>34.2443", "<INCLINATION units=\"rad\">0.6", StringComparison.Ordinal);
        ElementSetReading reading = Of($"{Xml[..end]}<opm/><omm/>{bad}<!-- {message} -->{message}</ndm>\n");
        Assert.Equal([(5, 2), (5, 8), (6, 451)], reading.Refused.Select(x => (x.LineNumber, x.Column)));
        Assert.Contains("The unit of INCLINATION is \"rad\"; it must be deg.", reading.Refused[2].Reason, StringComparison.Ordinal);
        Assert.Equal(2, reading.Accepted.Count);
    }

    [Fact]
    public void A_document_type_is_refused_before_any_of_its_entities_is_read()
    {
        string text = Xml.Replace("<ndm", "<!DOCTYPE ndm [<!ENTITY a SYSTEM \"file:///etc/hostname\">]>\n<ndm", StringComparison.Ordinal);
        RefusedLine refusal = OnlyRefusal(Of(text.Replace("VANGUARD 1", "&a;", StringComparison.Ordinal)));
        Assert.Equal(2, refusal.LineNumber);
    }

    [Theory]
    [InlineData("<html></html>", "outermost element must be omm or ndm")]
    [InlineData("<ndm><omm>", "not well-formed XML")]
    [InlineData("<omm>", "not well-formed XML")]
    [InlineData("<ndm/>", "holds no element set")]
    public void Xml_that_holds_no_message_is_refused(string text, string reason) =>
        Assert.Contains(reason, OnlyRefusal(Of(text)).Reason, StringComparison.Ordinal);

    [Fact]
    public void Xml_nested_without_end_is_refused() =>
        Assert.Contains(
            "more than 32 deep",
            OnlyRefusal(Of("<ndm>" + new StringBuilder().Insert(0, "<omm>", 100_000))).Reason,
            StringComparison.Ordinal);

    [Fact]
    public void The_columns_of_a_table_may_stand_in_any_order()
    {
        string Reversed(string line) => string.Join(", ", line.Split(',').Reverse().Select(x => $"\"{x}\""));
        ElementSetReading reading = Of($"{Reversed(Csv[0])}\r\n{Reversed(Csv[1])}\r\n");
        Assert.Equal(Assert.Single(Of(string.Join('\n', Csv)).Accepted).Elements, Assert.Single(reading.Accepted).Elements);
    }

    [Fact]
    public void Bad_records_of_a_table_are_refused_where_they_stand_and_the_others_read()
    {
        string bad = Csv[1].Replace("34.2443", "180.5", StringComparison.Ordinal);
        ElementSetReading reading = Of($"\uFEFF{Csv[0]}\n{bad}\n\n# note\n{Csv[1]},1\n\"{Csv[1]}\n{Csv[1]}\n");
        Assert.Equal([(2, 69), (5, 1), (6, 1)], reading.Refused.Select(x => (x.LineNumber, x.Column)));
        Assert.Contains("inclination is \"180.5\"", reading.Refused[0].Reason, StringComparison.Ordinal);
        Assert.Contains("18 fields; the header has 17", reading.Refused[1].Reason, StringComparison.Ordinal);
        Assert.Equal(7, Assert.Single(reading.Accepted).LineNumber);
    }

    [Fact]
    public void A_table_without_a_column_that_is_needed_is_refused_once()
    {
        string text = string.Join('\n', Csv).Replace("BSTAR", "DRAG", StringComparison.Ordinal);
        Assert.Contains("BSTAR is missing from the header", OnlyRefusal(Of(text)).Reason, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", ElementSetFormat.TwoLine)]
    [InlineData("[ALPHA]\n", ElementSetFormat.TwoLine)]
    [InlineData("\n # x\n  [ {\n", ElementSetFormat.OmmJson)]
    [InlineData("COMMENT x\n", ElementSetFormat.OmmKvn)]
    [InlineData("OBJECT_NAME = x\n", ElementSetFormat.OmmKvn)]
    [InlineData("\uFEFF<x", ElementSetFormat.OmmXml)]
    [InlineData("EPOCH,MEAN_MOTION\n", ElementSetFormat.OmmCsv)]
    public void The_format_is_told_from_the_first_line_that_says_anything(string text, ElementSetFormat format)
    {
        ElementSetReading reading = Of(text);
        Assert.Equal(format, reading.Format);
        Assert.NotEmpty(reading.Refused);
    }

    [Fact]
    public void A_given_format_is_not_guessed()
    {
        ElementSetReading reading = Of(Json, ElementSetFormat.OmmCsv);
        Assert.Equal(ElementSetFormat.OmmCsv, reading.Format);
        Assert.Empty(reading.Accepted);
    }

    [Fact]
    public void Sets_beyond_the_greatest_number_are_refused_once()
    {
        string set = $"{Line1}\n{Line2}\n";
        ElementSetReading reading = Of($"{set}{Line2}\n{set}{set}", maximumSets: 2);
        Assert.Single(reading.Accepted);
        Assert.Equal([3, 4], reading.Refused.Select(x => x.LineNumber));
        Assert.Equal("The file holds more than 2 element sets; the rest was not read.", reading.Refused[1].Reason);
    }

    [Fact]
    public void Options_outside_their_range_are_a_mistake_of_the_caller()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Of("", maximumSets: 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Of("", (ElementSetFormat)9));
    }
}
