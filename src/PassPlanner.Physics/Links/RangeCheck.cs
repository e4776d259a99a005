using System.Globalization;

namespace PassPlanner.Physics.Links;

/// <summary>Refuses values outside a range, NaN and infinities among them, by an exception that names member, value, unit and range.</summary>
internal static class RangeCheck
{
    public static double Within(double value, double minimum, double maximum, string member, string unit) =>
        value >= minimum && value <= maximum
            ? value
            : throw Refusal(value, member, unit, string.Create(CultureInfo.InvariantCulture, $"from {minimum} to {maximum}"));

    public static double AboveZero(double value, double maximum, string member, string unit) =>
        value > 0 && value <= maximum
            ? value
            : throw Refusal(value, member, unit, string.Create(CultureInfo.InvariantCulture, $"above 0 and at most {maximum}"));

    public static double? WithinIfGiven(double? value, double minimum, double maximum, string member, string unit) =>
        value is { } given ? Within(given, minimum, maximum, member, unit) : null;

    public static double? AboveZeroIfGiven(double? value, double maximum, string member, string unit) =>
        value is { } given ? AboveZero(given, maximum, member, unit) : null;

    public static ArgumentOutOfRangeException Refusal(double value, string member, string unit, string range) => new(
        member,
        value,
        string.Create(CultureInfo.InvariantCulture, $"{member} is {value}; it must be {range}{(unit.Length == 0 ? "" : " " + unit)}"));
}
