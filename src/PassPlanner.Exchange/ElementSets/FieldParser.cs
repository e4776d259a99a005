using System.Globalization;
using PassPlanner.Physics.Time;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>
/// Turns the fields of one element set into numbers within their ranges, and keeps the first thing that is wrong. The
/// ranges are the same for every form.
/// </summary>
internal sealed class FieldParser
{
    private const NumberStyles Decimal = NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent;

    /// <summary>The first thing that is wrong; nothing while all is well.</summary>
    public RefusedLine? Refusal { get; private set; }

    /// <summary>Notes what is wrong, unless something was wrong before.</summary>
    public void Refuse(Place at, string reason) => Refusal ??= new RefusedLine(at.LineNumber, at.Column, reason);

    /// <summary>Catalogue number, 1 to 999,999,999.</summary>
    public int CatalogNumber(string text, Place at) => Whole(text, at, "catalogue number", 1, 999_999_999);

    /// <summary>Mean motion, above 0 and at most 20 revolutions a day.</summary>
    public double MeanMotion(string text, Place at)
    {
        double value = Number(text, at, "mean motion", 0, 20, "revolutions a day");
        if (Refusal is null && value == 0)
        {
            Refuse(at, "the mean motion is 0; it must be above 0 and at most 20 revolutions a day");
        }

        return value;
    }

    /// <summary>Eccentricity, 0 to below 1.</summary>
    public double Eccentricity(string text, Place at)
    {
        double value = Number(text, at, "eccentricity", 0, 1, "");
        if (Refusal is null && value == 1)
        {
            Refuse(at, "the eccentricity is 1; it must be at least 0 and below 1");
        }

        return value;
    }

    /// <summary>Inclination, 0 to 180 degrees.</summary>
    public double Inclination(string text, Place at) => Number(text, at, "inclination", 0, 180, "degrees");

    /// <summary>An angle, -360 to 360 degrees, brought to 0 to below 360.</summary>
    public double Angle(string text, Place at, string name)
    {
        double value = Number(text, at, name, -360, 360, "degrees");
        double turned = value - (360 * Math.Floor(value / 360));

        // A tiny negative angle comes to 360 by rounding.
        return turned < 360 ? turned : 0;
    }

    /// <summary>Drag term B*, -100 to 100 per Earth radius.</summary>
    public double BStar(string text, Place at) => Number(text, at, "drag term B*", -100, 100, "per Earth radius");

    /// <summary>First derivative of the mean motion as element sets print it, -100 to 100 rev/day^2.</summary>
    public double MeanMotionDot(string text, Place at) => Number(text, at, "first derivative of the mean motion", -100, 100, "rev/day^2");

    /// <summary>Second derivative of the mean motion as element sets print it, -1000 to 1000 rev/day^3.</summary>
    public double MeanMotionDdot(string text, Place at) => Number(text, at, "second derivative of the mean motion", -1000, 1000, "rev/day^3");

    /// <summary>Ephemeris type: blank, or 0 to 3, which all are read as SGP4; 4 is for another theory, whose elements would give a wrong orbit.</summary>
    public void CheckEphemerisType(string text, Place at)
    {
        if (text.Length > 0 && text is not ("0" or "1" or "2" or "3"))
        {
            Refuse(at, $"the ephemeris type is {Quoted(text)}; it must be blank or 0 to 3: elements of another type are not for SGP4");
        }
    }

    /// <summary>Classification: one letter, U when blank.</summary>
    public char Classification(string text, Place at)
    {
        string letter = text.Trim(' ');
        if (letter.Length == 0)
        {
            return 'U';
        }

        if (letter.Length > 1 || !char.IsAsciiLetter(letter[0]))
        {
            Refuse(at, $"the classification is {Quoted(letter)}; it must be one letter: U, C or S");
        }

        return letter[0];
    }

    /// <summary>A name or a designator without control and format characters.</summary>
    public static string Printable(string text) =>
        new([.. text.Where(c => char.GetUnicodeCategory(c) is not (UnicodeCategory.Control or UnicodeCategory.Format))]);

    /// <summary>A count, 0 to 999,999,999.</summary>
    public int Count(string text, Place at, string name) => Whole(text, at, name, 0, 999_999_999);

    /// <summary>An epoch from a year and a day with fraction.</summary>
    public UtcInstant Epoch(int year, string dayText, Place at)
    {
        int days = DateTime.IsLeapYear(year) ? 366 : 365;
        if (!decimal.TryParse(dayText, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out decimal day) || day < 1 || day >= days + 1)
        {
            Refuse(at, $"the day of the epoch is {Quoted(dayText)}; it must be at least 1 and below {days + 1} in {year}");
            return default;
        }

        long ticksOfYear = UtcInstant.FromCalendar(year, 1, 1).Ticks;
        return Checked(new UtcInstant(ticksOfYear + (long)decimal.Round((day - 1) * TimeSpan.TicksPerDay)), at);
    }

    /// <summary>
    /// An epoch such as 2020-064T10:34:41.4264 or 2020-03-04T10:34:41.4264, with or without Z (CCSDS 301.0-B, ASCII time
    /// codes A and B).
    /// </summary>
    public UtcInstant Epoch(string text, Place at)
    {
        string[] parts = text.TrimEnd('Z').Split('T');
        string[] date = parts[0].Split('-');
        if (parts.Length == 2
            && date.Length is 2 or 3
            && TryDigits(date[0], 4, out int year) && year is >= 1957 and < 2100
            && TryDayOfYear(year, date, out int dayOfYear)
            && TryTimeOfDay(parts[1], out long ticksOfDay))
        {
            long ticksOfYear = UtcInstant.FromCalendar(year, 1, 1).Ticks;
            return Checked(new UtcInstant(ticksOfYear + ((dayOfYear - 1) * TimeSpan.TicksPerDay) + ticksOfDay), at);
        }

        Refuse(at, $"the epoch is {Quoted(text)}; it must be an instant of 1957 to 2099 such as 2020-03-04T10:34:41.4264 or 2020-064T10:34:41.4264");
        return default;
    }

    /// <summary>A value as it may stand in a reason: quoted, cut when long, without control characters.</summary>
    public static string Quoted(string text)
    {
        string shown = new([.. text.Select(c => char.IsControl(c) ? '\u00b7' : c)]);
        return "\"" + (shown.Length > 40 ? shown[..40] + "\u2026" : shown) + "\"";
    }

    private double Number(string text, Place at, string name, double minimum, double maximum, string unit)
    {
        string range = FormattableString.Invariant($"from {minimum} to {maximum}{(unit.Length == 0 ? "" : " " + unit)}");
        if (!double.TryParse(text, Decimal, CultureInfo.InvariantCulture, out double value) || !double.IsFinite(value))
        {
            Refuse(at, $"the {name} is {Quoted(text)}; it must be a number {range}");
            return 0;
        }

        if (value < minimum || value > maximum)
        {
            Refuse(at, FormattableString.Invariant($"the {name} is {value}; it must be {range}"));
        }

        return value;
    }

    private int Whole(string text, Place at, string name, int minimum, int maximum)
    {
        if (!int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out int value) || value < minimum || value > maximum)
        {
            Refuse(at, FormattableString.Invariant($"the {name} is {Quoted(text)}; it must be a whole number from {minimum} to {maximum}"));
            return 0;
        }

        return value;
    }

    private UtcInstant Checked(UtcInstant epoch, Place at)
    {
        if (epoch < UtcInstant.Earliest || epoch >= UtcInstant.Latest)
        {
            Refuse(at, $"the epoch is {epoch}; it must be from {UtcInstant.Earliest} to before {UtcInstant.Latest}");
        }

        return epoch;
    }

    private static bool TryDayOfYear(int year, string[] date, out int dayOfYear)
    {
        dayOfYear = 0;
        if (date.Length == 2)
        {
            return TryDigits(date[1], 3, out dayOfYear) && dayOfYear >= 1 && dayOfYear <= (DateTime.IsLeapYear(year) ? 366 : 365);
        }

        if (!TryDigits(date[1], 2, out int month) || month is < 1 or > 12
            || !TryDigits(date[2], 2, out int day) || day < 1 || day > DateTime.DaysInMonth(year, month))
        {
            return false;
        }

        dayOfYear = new DateTime(year, month, day, 0, 0, 0, DateTimeKind.Utc).DayOfYear;
        return true;
    }

    private static bool TryTimeOfDay(string text, out long ticks)
    {
        ticks = 0;
        string[] parts = text.Split(':');
        if (parts.Length != 3
            || !TryDigits(parts[0], 2, out int hour) || hour > 23
            || !TryDigits(parts[1], 2, out int minute) || minute > 59
            || !decimal.TryParse(parts[2], NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out decimal second) || second >= 60)
        {
            return false;
        }

        ticks = (((hour * 60L) + minute) * TimeSpan.TicksPerMinute) + (long)decimal.Round(second * TimeSpan.TicksPerSecond);
        return true;
    }

    private static bool TryDigits(string text, int count, out int value)
    {
        value = 0;
        return text.Length == count && int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out value);
    }
}
