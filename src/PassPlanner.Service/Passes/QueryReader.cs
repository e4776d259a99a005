using System.Globalization;
using PassPlanner.Physics.Time;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Passes;

/// <summary>Reads the members of a query; collects what is wrong and answers all of it in one problem.</summary>
public sealed class QueryReader(IQueryCollection query)
{
    private readonly FieldErrors errors = new();

    /// <summary>A text, or nothing.</summary>
    public string? Text(string name) => query.TryGetValue(name, out var values) && values.ToString() is { Length: > 0 } text ? text : null;

    /// <summary>One of a few words, or nothing.</summary>
    public string? Choice(string name, params string[] words)
    {
        string? text = Text(name);
        if (text is not null && !words.Contains(text, StringComparer.Ordinal))
        {
            errors.Add("#/" + name, $"{name} is {DocumentValidator.Quoted(text)}; it must be one of {string.Join(", ", words)}");
        }

        return text;
    }

    /// <summary>An instant between 1957 and 2100, or nothing.</summary>
    public UtcInstant? Instant(string name) => Text(name) is { } text ? Instant(name, text, errors) : null;

    /// <summary>A number in a range, or nothing.</summary>
    public double? Number(string name, double minimum, double maximum, string unit)
    {
        if (Text(name) is not { } text)
        {
            return null;
        }

        if (!double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double value)
            || !double.IsFinite(value) || value < minimum || value > maximum)
        {
            errors.Add("#/" + name, FormattableString.Invariant(
                $"{name} is {DocumentValidator.Quoted(text)}; it must be a number from {minimum} to {maximum} {unit}"));
            return null;
        }

        return value;
    }

    /// <summary>A whole number in a range, or nothing.</summary>
    public int? Whole(string name, int minimum, int maximum, string unit)
    {
        if (Number(name, minimum, maximum, unit) is not { } value)
        {
            return null;
        }

        if (value != Math.Floor(value))
        {
            errors.Add("#/" + name, FormattableString.Invariant($"{name} is {value}; it must be a whole number from {minimum} to {maximum} {unit}"));
        }

        return (int)value;
    }

    /// <summary>true or false; false when left out.</summary>
    public bool Flag(string name) => Choice(name, "true", "false") == "true";

    /// <summary>Adds an error found elsewhere.</summary>
    public void Refuse(string name, string detail) => errors.Add("#/" + name, detail);

    /// <summary>Refuses members that the address does not know, then answers all errors, if any.</summary>
    public void Finish(params string[] known)
    {
        foreach (string name in query.Keys.Where(name => !known.Contains(name, StringComparer.Ordinal)))
        {
            errors.Add("#/" + name, $"{DocumentValidator.Quoted(name)} is not a parameter here; there are {string.Join(", ", known)}");
        }

        if (errors.Any)
        {
            throw RequestProblemException.InvalidInput(errors.Items);
        }
    }

    /// <summary>An instant of an address.</summary>
    public static UtcInstant InstantOfPath(string name, string text)
    {
        var errors = new FieldErrors();
        UtcInstant? instant = Instant(name, text, errors);
        return instant ?? throw RequestProblemException.InvalidInput(errors.Items);
    }

    private static UtcInstant? Instant(string name, string text, FieldErrors errors)
    {
        if (!UtcInstant.TryParse(text, out UtcInstant instant))
        {
            errors.Add("#/" + name, $"{name} is {DocumentValidator.Quoted(text)}; it must be an ISO 8601 UTC instant such as 2026-03-18T04:12:20Z");
            return null;
        }

        if (instant < UtcInstant.Earliest || instant >= UtcInstant.Latest)
        {
            errors.Add("#/" + name, $"{name} is {instant}; it must be from {UtcInstant.Earliest} to before {UtcInstant.Latest}");
            return null;
        }

        return instant;
    }
}
