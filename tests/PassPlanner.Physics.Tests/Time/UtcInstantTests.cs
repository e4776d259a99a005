using CsCheck;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Tests.Time;

public sealed class UtcInstantTests
{
    private static readonly Gen<UtcInstant> Instants = Gen.Long[UtcInstant.Earliest.Ticks, UtcInstant.Latest.Ticks].Select(ticks => new UtcInstant(ticks));

    [Fact]
    public void The_Julian_date_of_J2000_is_2451545()
    {
        JulianDateUt1 date = UtcInstant.FromCalendar(2000, 1, 1, 12).ToUt1(0.0);
        Assert.Equal(new JulianDateUt1(2451544.5, 0.5), date);
    }

    [Fact]
    public void UT1_minus_UTC_moves_the_fraction_of_the_day()
    {
        const double MicrosecondInDays = 1e-6 / 86400.0;
        Gen.Select(Instants, Gen.Double[-1.0, 1.0]).Sample((instant, ut1MinusUtcS) =>
        {
            JulianDateUt1 utc = instant.ToUt1(0.0);
            JulianDateUt1 ut1 = instant.ToUt1(ut1MinusUtcS);
            double days = ut1.Day - utc.Day + (ut1.FractionOfDay - utc.FractionOfDay);
            Assert.Equal(ut1MinusUtcS / 86400.0, days, MicrosecondInDays);
        });
    }

    [Fact]
    public void A_day_number_in_a_year_is_the_calendar_date()
    {
        Assert.Equal(UtcInstant.FromCalendar(2022, 1, 22, 12), UtcInstant.FromDayOfYear(2022, 22.5));
        Assert.Equal(UtcInstant.FromCalendar(2024, 12, 31), UtcInstant.FromDayOfYear(2024, 366.0));
        Assert.Equal(UtcInstant.FromCalendar(1957, 10, 4), UtcInstant.FromDayOfYear(1957, 277.0));
    }

    [Fact]
    public void An_instant_of_whole_milliseconds_survives_its_text()
        => Instants.Sample(instant =>
        {
            var whole = new UtcInstant(instant.Ticks / TimeSpan.TicksPerMillisecond * TimeSpan.TicksPerMillisecond);
            Assert.True(UtcInstant.TryParse(whole.ToString(), out UtcInstant read));
            Assert.Equal(whole, read);
        });

    [Theory]
    [InlineData("2022-01-23T00:00:00")]
    [InlineData("2022-01-23T00:00:00+01:00")]
    [InlineData("2022-01-23 00:00:00Z")]
    [InlineData("2022-13-23T00:00:00Z")]
    [InlineData("now")]
    [InlineData("")]
    [InlineData(null)]
    public void A_text_that_is_no_UTC_instant_is_refused(string? text) => Assert.False(UtcInstant.TryParse(text, out _));

    [Fact]
    public void Floor_and_ceiling_are_whole_seconds_around_the_instant()
        => Instants.Sample(instant =>
        {
            UtcInstant floor = instant.FloorToSecond();
            UtcInstant ceiling = instant.CeilingToSecond();
            Assert.True(floor <= instant && instant <= ceiling);
            Assert.True(ceiling.SecondsSince(floor) is 0.0 or 1.0);
            Assert.Equal(0, floor.Ticks % UtcInstant.TicksPerSecond);
        });

    [Fact]
    public void A_window_holds_its_start_and_not_its_end()
    {
        UtcInstant start = UtcInstant.FromCalendar(2026, 1, 1);
        var window = new TimeWindow(start, start.AddSeconds(60));
        Assert.Equal(60.0, window.DurationS);
        Assert.True(window.Contains(start));
        Assert.False(window.Contains(window.EndUtc));
        Assert.False(window.Overlaps(new TimeWindow(window.EndUtc, window.EndUtc.AddSeconds(1))));
        Assert.True(window.Overlaps(new TimeWindow(start.AddSeconds(59), start.AddSeconds(61))));
    }
}
