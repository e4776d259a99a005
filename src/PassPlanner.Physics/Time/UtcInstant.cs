using System.Globalization;

namespace PassPlanner.Physics.Time;

/// <summary>
/// An instant of UTC, in ticks of 100 ns since 1970-01-01T00:00:00Z, counting every day as 86,400 s
/// (leap seconds do not appear, as in element-set epochs). The default value is 1970-01-01T00:00:00Z.
/// </summary>
public readonly record struct UtcInstant(long Ticks) : IComparable<UtcInstant>
{
    /// <summary>Ticks in one second.</summary>
    public const long TicksPerSecond = TimeSpan.TicksPerSecond;

    /// <summary>The first instant accepted anywhere: 1957-01-01, the year of the first spacecraft.</summary>
    public static readonly UtcInstant Earliest = FromCalendar(1957, 1, 1);

    /// <summary>The first instant no longer accepted: 2100-01-01.</summary>
    public static readonly UtcInstant Latest = FromCalendar(2100, 1, 1);

    /// <summary>The instant of a calendar date and time of day, UTC.</summary>
    public static UtcInstant FromCalendar(int year, int month, int day, int hour = 0, int minute = 0, double second = 0)
    {
        var minutes = new DateTime(year, month, day, hour, minute, 0, DateTimeKind.Utc);
        return new UtcInstant(minutes.Ticks - DateTime.UnixEpoch.Ticks).AddSeconds(second);
    }

    /// <summary>The instant of a day number in a year; day 1.0 is 1 January, 00:00.</summary>
    /// <param name="year">Calendar year.</param>
    /// <param name="dayOfYear">Day of year with fraction, from 1.</param>
    public static UtcInstant FromDayOfYear(int year, double dayOfYear)
    {
        long start = new DateTime(year, 1, 1, 0, 0, 0, DateTimeKind.Utc).Ticks - DateTime.UnixEpoch.Ticks;
        return new UtcInstant(start + (long)Math.Round((dayOfYear - 1) * TimeSpan.TicksPerDay));
    }

    /// <summary>The instant of a clock reading.</summary>
    public static UtcInstant From(DateTimeOffset clock) => new(clock.UtcTicks - DateTime.UnixEpoch.Ticks);

    /// <summary>Reads an ISO 8601 instant that ends in Z, such as 2026-03-18T04:12:20Z or with a fraction of a second.</summary>
    public static bool TryParse(string? text, out UtcInstant instant)
    {
        instant = default;
        if (text is null
            || !text.EndsWith('Z')
            || text.Length < 17
            || text[10] != 'T'
            || !DateTimeOffset.TryParse(
                text,
                CultureInfo.InvariantCulture,
                DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal,
                out DateTimeOffset clock))
        {
            return false;
        }

        instant = From(clock);
        return true;
    }

    /// <summary>This instant moved by a number of seconds, to the nearest tick.</summary>
    public UtcInstant AddSeconds(double seconds) => new(Ticks + (long)Math.Round(seconds * TicksPerSecond));

    /// <summary>Seconds from another instant to this one.</summary>
    public double SecondsSince(UtcInstant other) => (Ticks - other.Ticks) / (double)TicksPerSecond;

    /// <summary>The last whole second at or before this instant.</summary>
    public UtcInstant FloorToSecond()
    {
        long remainder = Ticks % TicksPerSecond;
        return new UtcInstant(Ticks - (remainder < 0 ? remainder + TicksPerSecond : remainder));
    }

    /// <summary>The first whole second at or after this instant.</summary>
    public UtcInstant CeilingToSecond()
    {
        UtcInstant floor = FloorToSecond();
        return floor == this ? this : new UtcInstant(floor.Ticks + TicksPerSecond);
    }

    /// <summary>The same instant on the UT1 scale.</summary>
    /// <param name="ut1MinusUtcS">UT1-UTC, s; 0 when no table is loaded.</param>
    public JulianDateUt1 ToUt1(double ut1MinusUtcS)
    {
        long days = Math.DivRem(Ticks, TimeSpan.TicksPerDay, out long ticksOfDay);
        return new JulianDateUt1(2440587.5 + days, ((ticksOfDay / (double)TicksPerSecond) + ut1MinusUtcS) / 86400.0);
    }

    /// <summary>The clock reading of this instant, for hosts and calendars.</summary>
    public DateTimeOffset ToDateTimeOffset() => new(Ticks + DateTime.UnixEpoch.Ticks, TimeSpan.Zero);

    /// <summary>ISO 8601 with Z: whole seconds, or milliseconds where there are any.</summary>
    public override string ToString()
    {
        long milliseconds = (long)Math.Round(Ticks / (double)TimeSpan.TicksPerMillisecond, MidpointRounding.AwayFromZero);
        var clock = new DateTime((milliseconds * TimeSpan.TicksPerMillisecond) + DateTime.UnixEpoch.Ticks, DateTimeKind.Utc);
        string format = milliseconds % 1000 == 0 ? "yyyy-MM-dd'T'HH:mm:ss'Z'" : "yyyy-MM-dd'T'HH:mm:ss.fff'Z'";
        return clock.ToString(format, CultureInfo.InvariantCulture);
    }

    /// <inheritdoc/>
    public int CompareTo(UtcInstant other) => Ticks.CompareTo(other.Ticks);

    /// <summary>Earlier than.</summary>
    public static bool operator <(UtcInstant left, UtcInstant right) => left.Ticks < right.Ticks;

    /// <summary>Later than.</summary>
    public static bool operator >(UtcInstant left, UtcInstant right) => left.Ticks > right.Ticks;

    /// <summary>Not later than.</summary>
    public static bool operator <=(UtcInstant left, UtcInstant right) => left.Ticks <= right.Ticks;

    /// <summary>Not earlier than.</summary>
    public static bool operator >=(UtcInstant left, UtcInstant right) => left.Ticks >= right.Ticks;
}
