using PassPlanner.Exchange.ElementSets;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using static PassPlanner.Exchange.Tests.ElementSets.Reading;

namespace PassPlanner.Exchange.Tests.ElementSets;

/// <summary>What CCSDS 502.0-B-3 (tables 4-2 and 4-3, sections 7.3 to 7.5) asks of a message, tried by hand-made KVN messages.</summary>
public sealed class OmmMessageTests
{
    private const string Good = """
        CCSDS_OMM_VERS = 3.0
        OBJECT_NAME = ALPHA [TEST]
        OBJECT_ID = 2020-001A
        CENTER_NAME = EARTH
        REF_FRAME = TEME
        TIME_SYSTEM = UTC
        MEAN_ELEMENT_THEORY = SGP4
        EPOCH = 2020-064T10:34:41.4264
        MEAN_MOTION = 15.5 [rev/day]
        ECCENTRICITY = 0.001
        INCLINATION = 97.5 [deg]
        RA_OF_ASC_NODE = 10
        ARG_OF_PERICENTER = 20
        MEAN_ANOMALY = 30
        NORAD_CAT_ID = 123456789
        BSTAR = 0.0001 [1/ER]

        """;

    [Fact]
    public void A_message_without_what_is_optional_is_read()
    {
        ElementSet set = Assert.Single(Of(Good).Accepted).Elements;
        Assert.Equal(("ALPHA [TEST]", 123_456_789, 'U', 0, 0), (set.Name, set.CatalogNumber, set.Classification, set.ElementSetNumber, set.RevolutionNumber));
        Assert.Equal((0.0, 0.0), (set.MeanMotionDotRevPerDay2, set.MeanMotionDdotRevPerDay3));
    }

    [Theory]
    [InlineData("2020-064T10:34:41.4264Z")]
    [InlineData("2020-03-04T10:34:41.4264")]
    [InlineData("2020-03-04T10:34:41.4264Z")]
    [InlineData("2020-03-04T10:34:41.42640000000000000000000000001")]
    public void Epochs_may_be_calendar_dates_or_days_of_the_year_with_or_without_z(string epoch) =>
        Assert.Equal(
            UtcInstant.FromCalendar(2020, 3, 4, 10, 34, 41.4264),
            Assert.Single(Of(Good.Replace("2020-064T10:34:41.4264", epoch, StringComparison.Ordinal)).Accepted).Elements.EpochUtc);

    [Fact]
    public void Epochs_are_rounded_to_a_tenth_of_a_microsecond()
    {
        string text = Good.Replace("41.4264", "41.12345675", StringComparison.Ordinal);
        Assert.Equal(1_234_568, Assert.Single(Of(text).Accepted).Elements.EpochUtc.Ticks % UtcInstant.TicksPerSecond);
    }

    [Fact]
    public void Comments_covariances_and_user_fields_are_passed_over_and_many_messages_read()
    {
        string text = $"{Good}COMMENT = not a value\nCOV_REF_FRAME = RSW\nCX_X = 1\nUSER_DEFINED_EPOCH = x\n\nCOMMENT next\n{Good}";
        ElementSetReading reading = Of(text);
        Assert.Empty(reading.Refused);
        Assert.Equal([1, 23], reading.Accepted.Select(x => x.LineNumber));
    }

    [Theory]
    [InlineData("CENTER_NAME = EARTH", "CENTER_NAME = MARS", 4, 15, "CENTER_NAME is \"MARS\"; SGP4 element sets have EARTH.")]
    [InlineData("REF_FRAME = TEME", "REF_FRAME = EME2000", 5, 13, "REF_FRAME is \"EME2000\"; SGP4 element sets have TEME.")]
    [InlineData("TIME_SYSTEM = UTC", "TIME_SYSTEM = GPS", 6, 15, "TIME_SYSTEM is \"GPS\"; SGP4 element sets have UTC.")]
    [InlineData("THEORY = SGP4", "THEORY = SGP4-XP", 7, 23, "MEAN_ELEMENT_THEORY is \"SGP4-XP\"; SGP4 element sets have SGP4 or SGP/SGP4.")]
    [InlineData("2020-064", "2019-366", 8, 9, "date and time")]
    [InlineData("2020-064", "2020-02-30", 8, 9, "date and time")]
    [InlineData("10:34", "24:00", 8, 9, "date and time")]
    [InlineData("2020-064", "1956-366", 8, 9, "it must be from 1957-01-01T00:00:00Z to before 2100-01-01T00:00:00Z")]
    [InlineData("2020-064", "2100-001", 8, 9, "it must be from 1957-01-01T00:00:00Z to before 2100-01-01T00:00:00Z")]
    [InlineData("15.5 ", "0 ", 9, 15, "mean motion")]
    [InlineData("15.5 ", "20.01 ", 9, 15, "above 0 and at most 20 rev/day")]
    [InlineData("rev/day]", "rad/s]", 9, 15, "The unit of MEAN_MOTION is \"rad/s\"; it must be rev/day.")]
    [InlineData("0.001\n", "1\n", 10, 16, "at least 0 and below 1")]
    [InlineData("0.001\n", "-1E-9\n", 10, 16, "eccentricity")]
    [InlineData("97.5", "NaN", 11, 15, "not a number")]
    [InlineData("97.5", "1E999", 11, 15, "at least 0 and at most 180 deg")]
    [InlineData("RA_OF_ASC_NODE = 10", "RA_OF_ASC_NODE = -361", 12, 18, "at least -360 and at most 360 deg")]
    [InlineData("ARG_OF_PERICENTER = 20", "ARG_OF_PERICENTER = 2,0", 13, 21, "argument of perigee")]
    [InlineData("MEAN_ANOMALY = 30", "MEAN_ANOMALY = ", 1, 1, "MEAN_ANOMALY is missing")]
    [InlineData("123456789", "1234567890", 15, 16, "whole number from 1 to 999999999")]
    [InlineData("123456789", "0", 15, 16, "whole number from 1 to 999999999")]
    [InlineData("BSTAR = 0.0001", "BSTAR = 101", 16, 9, "1/Earth radius")]
    [InlineData("BSTAR = 0.0001 [1/ER]", "BTERM = 0.0001", 1, 1, "BSTAR is missing")]
    [InlineData("BSTAR", "MEAN_MOTION_DOT = 11\nBSTAR", 16, 19, "rev/day^2")]
    [InlineData("BSTAR", "MEAN_MOTION_DDOT = 101\nBSTAR", 16, 20, "rev/day^3")]
    [InlineData("BSTAR", "EPHEMERIS_TYPE = 4\nBSTAR", 16, 18, "ephemeris type")]
    [InlineData("BSTAR", "CLASSIFICATION_TYPE = SECRET\nBSTAR", 16, 23, "classification")]
    [InlineData("BSTAR", "ELEMENT_SET_NO = -1\nBSTAR", 16, 18, "element set number")]
    [InlineData("BSTAR", "REV_AT_EPOCH = 1.5\nBSTAR", 16, 16, "revolution number")]
    [InlineData("BSTAR", "ECCENTRICITY = 0.5\nBSTAR", 16, 16, "ECCENTRICITY is given twice; it stands in line 10 already.")]
    [InlineData("BSTAR", "BSTAR 0.1\nBSTAR", 16, 1, "KEYWORD = value")]
    [InlineData("CCSDS_OMM_VERS", "CCSDS_OPM_VERS", 1, 1, "orbit mean-elements message begins with CCSDS_OMM_VERS")]
    [InlineData("ALPHA [TEST]", "A\u0007", 2, 15, "printable")]
    public void A_bad_message_is_refused_by_line_column_and_reason(string old, string changed, int lineNumber, int column, string reason)
    {
        string bad = Good.Replace(old, changed, StringComparison.Ordinal);
        ElementSetReading reading = Of(bad + Good, ElementSetFormat.OmmKvn);
        RefusedLine refusal = Assert.Single(reading.Refused);
        Assert.Equal((lineNumber, column), (refusal.LineNumber, refusal.Column));
        Assert.Contains(reason, refusal.Reason, StringComparison.Ordinal);
        Assert.Single(reading.Accepted);
    }
}
