using System.Globalization;
using System.Text;
using PassPlanner.Exchange.ElementSets;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Exchange.Tests.ElementSets;

public class ReaderTests(ITestOutputHelper output)
{
    private const double OneCentimetreKm = 1e-5;
    private const double OneMicrometrePerSecondKmPerS = 1e-9;

    private const string Line1 = "1 00005U 58002B   00179.78495062  .00000023  00000-0  28098-4 0  4753";
    private const string Line2 = "2 00005  34.2682 348.7242 1859667 331.7664  19.3264 10.82419157413667";

    /// <summary>Validation. Source: orbit/catalogue.tle and the counts in orbit/SOURCE.md.</summary>
    [Fact]
    public void The_whole_catalogue_is_read()
    {
        ElementSetReading reading = Read("orbit/catalogue.tle.gz");
        output.WriteLine($"{reading.Accepted.Count} sets read, {reading.Refused.Count} refused");
        Assert.Equal(ElementSetFormat.TwoLine, reading.Format);
        Assert.Empty(reading.Refused);
        Assert.Equal(23939, reading.Accepted.Count);
        Assert.Equal(278, reading.Accepted.Count(s => s.ElementSet.CatalogNumber is >= 270000 and <= 270288));
        Assert.Equal(584, reading.Accepted.Count(s => s.ElementSet.InternationalDesignator.Length == 0));
        Assert.DoesNotContain(reading.Accepted, s => s.ElementSet.Name.StartsWith("0 ", StringComparison.Ordinal) || s.ElementSet.Name.Length == 0);
    }

    /// <summary>Validation. Source: orbit/sgp4-verification.tle; orbit/SOURCE.md names the three cases whose checksums are wrong.</summary>
    [Fact]
    public void A_wrong_checksum_is_refused_unless_asked_otherwise()
    {
        Assert.Equal(33, Read("orbit/sgp4-verification.tle", acceptBadChecksums: true).Accepted.Count);
        ElementSetReading strict = Read("orbit/sgp4-verification.tle");
        Assert.Equal(30, strict.Accepted.Count);
        Assert.Equal(3, strict.Refused.Count);
        Assert.All(strict.Refused, r => Assert.Contains("checksum", r.Reason, StringComparison.Ordinal));
        Assert.All(strict.Refused, r => Assert.Equal(69, r.Column));
        Assert.DoesNotContain(strict.Accepted, s => s.ElementSet.CatalogNumber is 33333 or 33334 or 33335);
    }

    /// <summary>Validation. Source: orbit/omm/expected.csv: states made with the published propagator from the same messages.</summary>
    [Fact]
    public void States_from_the_messages_agree_with_the_published_propagator()
    {
        (int rows, double worstKm, double worstKmPerS) = (0, 0, 0);
        foreach (IReadOnlyDictionary<string, string> row in ReferenceData.Rows("orbit/omm/expected.csv"))
        {
            ReadElementSet read = Assert.Single(Read("orbit/omm/" + row["file"]).Accepted);
            Assert.Equal(int.Parse(row["catalog_number"], CultureInfo.InvariantCulture), read.ElementSet.CatalogNumber);
            Assert.True(UtcInstant.TryParse(row["epoch_utc"] + "Z", out UtcInstant epochUtc));
            Assert.Equal(epochUtc, read.ElementSet.EpochUtc);
            Assert.Equal(Sgp4Status.Ok, new Sgp4Propagator(read.ElementSet).TryPropagate(Number(row["minutes_since_epoch_min"]), out TemeState state));
            var positionKm = new Vector3D(Number(row["x_teme_km"]), Number(row["y_teme_km"]), Number(row["z_teme_km"]));
            var velocityKmPerS = new Vector3D(Number(row["vx_teme_km_s"]), Number(row["vy_teme_km_s"]), Number(row["vz_teme_km_s"]));
            worstKm = Math.Max(worstKm, (state.PositionKm - positionKm).Norm);
            worstKmPerS = Math.Max(worstKmPerS, (state.VelocityKmPerS - velocityKmPerS).Norm);
            rows++;
        }

        output.WriteLine($"{rows} states; worst {worstKm:e2} km, {worstKmPerS:e2} km/s");
        Assert.Equal(21, rows);
        Assert.InRange(worstKm, 0, OneCentimetreKm);
        Assert.InRange(worstKmPerS, 0, 2 * OneMicrometrePerSecondKmPerS);
    }

    /// <summary>Validation. Source: the printed values of CCSDS 502.0-B-3, annex G.</summary>
    [Theory]
    [InlineData("ccsds-502-annex-g7.kvn", ElementSetFormat.OmmKvn)]
    [InlineData("ccsds-502-annex-g8.kvn", ElementSetFormat.OmmKvn)]
    [InlineData("ccsds-502-annex-g9.kvn", ElementSetFormat.OmmKvn)]
    [InlineData("ccsds-502-annex-g10.xml", ElementSetFormat.OmmXml)]
    public void The_examples_of_the_standard_are_read(string file, ElementSetFormat format)
    {
        ElementSetReading reading = Read("orbit/omm/" + file);
        Assert.Equal(format, reading.Format);
        Assert.Empty(reading.Refused);
        ElementSet set = Assert.Single(reading.Accepted).ElementSet;
        Assert.Equal(23581, set.CatalogNumber);
        Assert.Equal("1995-025A", set.InternationalDesignator);
        Assert.Equal(1.00273272, set.MeanMotionRevPerDay);
        Assert.Equal(0.0005013, set.Eccentricity);
        Assert.Equal(3.0539, set.InclinationDeg);
        Assert.Equal(81.7939, set.RightAscensionOfNodeDeg);
        Assert.Equal(249.2363, set.ArgumentOfPerigeeDeg);
        Assert.Equal(150.1602, set.MeanAnomalyDeg);
        Assert.Equal(0.0001, set.BStarPerEarthRadius);
        Assert.Equal(-0.00000113, set.MeanMotionDotRevPerDay2);
        Assert.Equal(925, set.ElementSetNumber);
        Assert.Equal(4316, set.RevolutionNumber);
    }

    /// <summary>Validation. Source: orbit/omm/vanguard1.*: the same object in three forms.</summary>
    [Theory]
    [InlineData("vanguard1.csv", ElementSetFormat.OmmCsv)]
    [InlineData("vanguard1.xml", ElementSetFormat.OmmXml)]
    [InlineData("vanguard1.json", ElementSetFormat.OmmJson)]
    public void The_form_is_told_from_the_text(string file, ElementSetFormat format)
    {
        ElementSetReading reading = Read("orbit/omm/" + file);
        Assert.Equal(format, reading.Format);
        Assert.Equal("VANGUARD 1", Assert.Single(reading.Accepted).ElementSet.Name);
    }

    [Fact]
    public void Every_field_of_two_lines_is_read_by_its_columns()
    {
        ElementSet set = Assert.Single(ReadText(Line1 + "\n" + Line2).Accepted).ElementSet;
        Assert.Equal(5, set.CatalogNumber);
        Assert.Equal('U', set.Classification);
        Assert.Equal("1958-002B", set.InternationalDesignator);
        Assert.Equal(UtcInstant.FromCalendar(2000, 6, 27, 18, 50, 19.733568), set.EpochUtc);
        Assert.Equal(0.00000023, set.MeanMotionDotRevPerDay2);
        Assert.Equal(0, set.MeanMotionDdotRevPerDay3);
        Assert.Equal(0.28098e-4, set.BStarPerEarthRadius);
        Assert.Equal(475, set.ElementSetNumber);
        Assert.Equal(34.2682, set.InclinationDeg);
        Assert.Equal(348.7242, set.RightAscensionOfNodeDeg);
        Assert.Equal(0.1859667, set.Eccentricity);
        Assert.Equal(331.7664, set.ArgumentOfPerigeeDeg);
        Assert.Equal(19.3264, set.MeanAnomalyDeg);
        Assert.Equal(10.82419157, set.MeanMotionRevPerDay);
        Assert.Equal(41366, set.RevolutionNumber);
    }

    [Theory]
    [InlineData("")]
    [InlineData("VANGUARD 1\n")]
    [InlineData("0 VANGUARD 1\n")]
    [InlineData("0 VANGUARD 1   \r\n")]
    [InlineData("\uFEFF0 VANGUARD 1\r\n\r\n# a comment\r\n")]
    public void Names_line_ends_and_marks_do_not_matter(string before)
    {
        foreach (string end in new[] { "\n", "\r\n" })
        {
            ElementSetReading reading = ReadText(before + Line1 + end + Line2 + "  " + end);
            Assert.Empty(reading.Refused);
            ReadElementSet read = Assert.Single(reading.Accepted);
            Assert.Equal(before.Contains("VANGUARD", StringComparison.Ordinal) ? "VANGUARD 1" : "", read.ElementSet.Name);
            Assert.Equal(1, read.LineNumber);
        }
    }

    [Theory]
    [InlineData("57", 1957)]
    [InlineData("99", 1999)]
    [InlineData("00", 2000)]
    [InlineData("56", 2056)]
    public void Two_digit_years_turn_at_57(string year, int expected)
    {
        ElementSet set = Assert.Single(ReadText(WithChecksum(Replaced(Line1, 19, year)) + "\n" + Line2).Accepted).ElementSet;
        Assert.Equal(expected, set.EpochUtc.ToDateTimeOffset().Year);
    }

    [Theory]
    [InlineData("A0005", 100005)]
    [InlineData("T0288", 270288)]
    [InlineData("Z9999", 339999)]
    [InlineData("    5", 5)]
    public void Catalogue_numbers_come_with_letters_and_blanks(string field, int expected)
    {
        ElementSet set = Assert.Single(ReadText(WithChecksum(Replaced(Line1, 3, field)) + "\n" + WithChecksum(Replaced(Line2, 3, field))).Accepted).ElementSet;
        Assert.Equal(expected, set.CatalogNumber);
    }

    [Theory]
    [InlineData(1, 3, "I0005", "catalogue number is \"I0005\"")]
    [InlineData(1, 19, "x0", "year of the epoch")]
    [InlineData(1, 21, "367.00000000", "it must be at least 1 and below 367 in 2000")]
    [InlineData(1, 54, " 2x098-4", "drag term B*")]
    [InlineData(1, 63, "4", "the ephemeris type is \"4\"")]
    [InlineData(2, 9, "190.0000", "inclination is 190; it must be from 0 to 180 degrees")]
    [InlineData(2, 9, "        ", "inclination is \"\"; it must be a number")]
    [InlineData(2, 18, "36O.0000", "right ascension of the node is \"36O.0000\"")]
    [InlineData(2, 53, " 0.00000000", "mean motion is 0; it must be above 0")]
    [InlineData(2, 53, "99.00000000", "mean motion is 99; it must be from 0 to 20 revolutions a day")]
    public void A_bad_field_is_refused_with_line_column_and_reason(int line, int column, string field, string reason)
    {
        string one = line == 1 ? WithChecksum(Replaced(Line1, column, field)) : Line1;
        string two = line == 2 ? WithChecksum(Replaced(Line2, column, field)) : Line2;
        ElementSetReading reading = ReadText("first\n" + one + "\n" + two + "\nsecond\n" + Line1 + "\n" + Line2);
        RefusedLine refused = Assert.Single(reading.Refused);
        Assert.Equal(line + 1, refused.LineNumber);
        Assert.Equal(column, refused.Column);
        Assert.Contains(reason, refused.Reason, StringComparison.Ordinal);
        Assert.Equal("second", Assert.Single(reading.Accepted).ElementSet.Name);
    }

    [Theory]
    [InlineData(Line1, 1, "without a line 2")]
    [InlineData(Line2, 1, "without a line 1")]
    [InlineData("good morning", 1, "neither line 1 nor line 2")]
    [InlineData(Line1 + "\n" + Line1 + "\n" + Line2, 1, "without a line 2")]
    public void Lines_without_their_partner_are_refused(string text, int lineNumber, string reason)
    {
        RefusedLine refused = Assert.Single(ReadText(text).Refused);
        Assert.Equal(lineNumber, refused.LineNumber);
        Assert.Contains(reason, refused.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void A_line_that_was_cut_short_is_refused_where_it_ends()
    {
        RefusedLine refused = Assert.Single(ReadText(Line1[..50] + "\n" + Line2).Refused);
        Assert.Equal((1, 51), (refused.LineNumber, refused.Column));
        Assert.Contains("50 characters; it must have 69", refused.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Lines_of_two_objects_do_not_make_one()
    {
        RefusedLine refused = Assert.Single(ReadText(Line1 + "\n" + WithChecksum(Replaced(Line2, 3, "00006"))).Refused);
        Assert.Equal((2, 3), (refused.LineNumber, refused.Column));
    }

    [Theory]
    [InlineData("TIME_SYSTEM = UTC", "TIME_SYSTEM = TAI", "TIME_SYSTEM is \"TAI\"; it must be UTC")]
    [InlineData("REF_FRAME = TEME", "REF_FRAME = GCRF", "REF_FRAME is \"GCRF\"; it must be TEME")]
    [InlineData("MEAN_ELEMENT_THEORY = SGP/SGP4", "MEAN_ELEMENT_THEORY = DSST", "it must be SGP4 or SGP/SGP4")]
    [InlineData("ECCENTRICITY = 0.0005013", "ECCENTRICITY = 1.5", "eccentricity is 1.5; it must be from 0 to 1")]
    [InlineData("BSTAR = 0.0001", "COMMENT none", "BSTAR is missing")]
    [InlineData("INCLINATION = 3.0539", "INCLINATION = 3.0539 [rad]", "the unit of INCLINATION is \"rad\"; it must be deg")]
    [InlineData("EPHEMERIS_TYPE = 0", "EPHEMERIS_TYPE = 4", "the ephemeris type is \"4\"")]
    [InlineData("EPOCH = 2020-064T10:34:41.4264", "EPOCH = 2020-13-01T00:00:00", "the epoch is \"2020-13-01T00:00:00\"")]
    [InlineData("NORAD_CAT_ID = 23581", "NORAD_CAT_ID = 1234567890", "whole number from 1 to 999999999")]
    public void A_message_that_cannot_be_used_is_refused_with_its_reason(string what, string by, string reason)
    {
        string text = File.ReadAllText(ReferenceData.PathOf("orbit/omm/ccsds-502-annex-g7.kvn"));
        Assert.Contains(what, text, StringComparison.Ordinal);
        ElementSetReading reading = ReadText(text.Replace(what, by, StringComparison.Ordinal) + "\n" + text);
        Assert.Contains(reason, Assert.Single(reading.Refused).Reason, StringComparison.Ordinal);
        Assert.Single(reading.Accepted);
    }

    [Fact]
    public void An_attribute_of_XML_that_states_another_unit_is_refused()
    {
        string text = File.ReadAllText(ReferenceData.PathOf("orbit/omm/vanguard1.xml")).Replace("<INCLINATION>", "<INCLINATION units=\"rad\">", StringComparison.Ordinal);
        Assert.Contains("it must be deg", Assert.Single(ReadText(text).Refused).Reason, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(" 0")]
    [InlineData("00")]
    public void A_year_may_be_padded_with_a_blank(string year)
    {
        ElementSet set = Assert.Single(ReadText(WithChecksum(Replaced(Line1, 19, year)) + "\n" + Line2).Accepted).ElementSet;
        Assert.Equal(UtcInstant.FromCalendar(2000, 6, 27, 18, 50, 19.733568), set.EpochUtc);
    }

    [Fact]
    public void Numbers_of_nine_digits_are_taken_from_a_message()
    {
        string text = File.ReadAllText(ReferenceData.PathOf("orbit/omm/ccsds-502-annex-g7.kvn")).Replace("NORAD_CAT_ID = 23581", "NORAD_CAT_ID = 799500123", StringComparison.Ordinal);
        Assert.Equal(799500123, Assert.Single(ReadText(text).Accepted).ElementSet.CatalogNumber);
    }

    [Fact]
    public void An_escape_that_is_no_character_loses_its_own_message_alone()
    {
        string good = File.ReadAllText(ReferenceData.PathOf("orbit/omm/vanguard1.json")).Trim().TrimStart('[').TrimEnd(']');
        string bad = good.Replace("\"2025-02-14", "\"\\ud8002025-02-14", StringComparison.Ordinal);
        ElementSetReading reading = ReadText($"[{bad},{good}]");
        Assert.Contains(reading.Refused, r => r.Reason.Contains("an escape that stands for no character", StringComparison.Ordinal));
        Assert.Single(reading.Accepted);
    }

    [Fact]
    public void A_classification_that_is_no_letter_is_refused()
    {
        RefusedLine refused = Assert.Single(ReadText(WithChecksum(Replaced(Line1, 8, "\0")) + "\n" + Line2).Refused);
        Assert.Equal((1, 8), (refused.LineNumber, refused.Column));
    }

    [Fact]
    public void A_tiny_negative_angle_is_zero_not_a_whole_turn()
    {
        string text = File.ReadAllText(ReferenceData.PathOf("orbit/omm/ccsds-502-annex-g7.kvn")).Replace("MEAN_ANOMALY = 150.1602", "MEAN_ANOMALY = -1e-20", StringComparison.Ordinal);
        Assert.Equal(0, Assert.Single(ReadText(text).Accepted).ElementSet.MeanAnomalyDeg);
    }

    [Theory]
    [InlineData("TIME_SYSTEM = UTC")]
    [InlineData("REF_FRAME = TEME")]
    [InlineData("MEAN_ELEMENT_THEORY = SGP/SGP4")]
    public void A_message_in_KVN_must_say_what_the_standard_asks(string line)
    {
        string text = File.ReadAllText(ReferenceData.PathOf("orbit/omm/ccsds-502-annex-g7.kvn")).Replace(line, "COMMENT", StringComparison.Ordinal);
        Assert.Contains("is missing", Assert.Single(ReadText(text).Refused).Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void XML_without_a_message_says_so() => Assert.Contains("no omm element", Assert.Single(ReadText("<a/>").Refused).Reason, StringComparison.Ordinal);

    [Fact]
    public void A_document_type_is_not_followed()
    {
        ElementSetReading reading = ReadText("<?xml version=\"1.0\"?>\n<!DOCTYPE omm [<!ENTITY a \"aaaa\">]>\n<omm><NORAD_CAT_ID>&a;</NORAD_CAT_ID></omm>");
        Assert.Empty(reading.Accepted);
        Assert.Contains("not XML", Assert.Single(reading.Refused).Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void A_text_that_is_too_long_is_refused_whole()
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(Line1 + "\n" + Line2));
        ElementSetReading reading = ElementSetReader.Read(stream, new ElementSetReaderOptions { MaximumCharacters = 100 });
        Assert.Empty(reading.Accepted);
        Assert.Contains("more than 100 characters", Assert.Single(reading.Refused).Reason, StringComparison.Ordinal);
    }

    private static string Replaced(string line, int column, string field) => line[..(column - 1)] + field + line[(column - 1 + field.Length)..];

    private static string WithChecksum(string line)
    {
        int sum = line[..68].Sum(c => c == '-' ? 1 : char.IsAsciiDigit(c) ? c - '0' : 0);
        return line[..68] + (char)('0' + (sum % 10));
    }

    private static ElementSetReading Read(string file, bool acceptBadChecksums = false)
    {
        using Stream stream = ReferenceData.Open(file);
        return ElementSetReader.Read(stream, new ElementSetReaderOptions { AcceptBadChecksums = acceptBadChecksums });
    }

    private static ElementSetReading ReadText(string text)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(text));
        return ElementSetReader.Read(stream, new ElementSetReaderOptions());
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
