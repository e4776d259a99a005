using System.Collections;
using System.Globalization;
using System.Reflection;
using System.Text.Json;

namespace PassPlanner.Service.Validation;

/// <summary>Checks a document against the attributes of its members: presence, range, length, choice, count.</summary>
public static class DocumentValidator
{
    /// <summary>Adds an error for each member out of bounds, with its pointer below the given one.</summary>
    public static void Validate(object document, string pointer, FieldErrors errors)
    {
        foreach (PropertyInfo property in document.GetType().GetProperties(BindingFlags.Public | BindingFlags.Instance))
        {
            string name = JsonNamingPolicy.CamelCase.ConvertName(property.Name);
            CheckMember(property, name, property.GetValue(document), pointer + "/" + name, errors);
        }
    }

    private static void CheckMember(PropertyInfo property, string name, object? value, string pointer, FieldErrors errors)
    {
        foreach (Attribute attribute in property.GetCustomAttributes())
        {
            switch (attribute)
            {
                case QuantityAttribute quantity:
                    CheckQuantity(quantity, name, value, pointer, errors);
                    break;
                case ChoiceAttribute choice:
                    CheckChoice(choice, name, (string?)value, pointer, errors);
                    break;
                case LabelAttribute label:
                    CheckLabel(label, name, (string?)value, pointer, errors);
                    break;
                case IdentifierAttribute identifier:
                    CheckIdentifier(identifier, name, (string?)value, pointer, errors);
                    break;
                case ListAttribute list:
                    CheckList(list, name, (IEnumerable?)value, pointer, errors);
                    break;
                case PartAttribute part when value is null:
                    if (part.Required)
                    {
                        errors.Add(pointer, $"{name} is missing");
                    }

                    break;
                case PartAttribute:
                    Validate(value!, pointer, errors);
                    break;
                default:
                    break;
            }
        }
    }

    private static void CheckQuantity(QuantityAttribute quantity, string name, object? value, string pointer, FieldErrors errors)
    {
        switch (value)
        {
            case null when quantity.Required:
                errors.Add(pointer, $"{name} is missing; it must be {quantity.RangeInWords}");
                break;
            case null:
                break;
            case IEnumerable<double> numbers:
                CheckNumbers(quantity, name, [.. numbers], pointer, errors);
                break;
            default:
                CheckNumber(quantity, name, Convert.ToDouble(value, CultureInfo.InvariantCulture), pointer, errors);
                break;
        }
    }

    private static void CheckNumbers(QuantityAttribute quantity, string name, double[] numbers, string pointer, FieldErrors errors)
    {
        if (quantity.Count > 0 && numbers.Length != quantity.Count)
        {
            errors.Add(pointer, $"{name} has {numbers.Length} numbers; it must have {quantity.Count}");
            return;
        }

        for (int i = 0; i < numbers.Length; i++)
        {
            CheckNumber(quantity, $"{name}[{i}]", numbers[i], $"{pointer}/{i}", errors);
        }
    }

    private static void CheckNumber(QuantityAttribute quantity, string name, double value, string pointer, FieldErrors errors)
    {
        if (!quantity.Allows(value))
        {
            errors.Add(pointer, FormattableString.Invariant($"{name} is {value}; it must be {quantity.RangeInWords}"));
        }
    }

    private static void CheckChoice(ChoiceAttribute choice, string name, string? value, string pointer, FieldErrors errors)
    {
        string allowed = string.Join(", ", choice.Words);
        if (value is null)
        {
            if (choice.Required)
            {
                errors.Add(pointer, $"{name} is missing; it must be one of {allowed}");
            }
        }
        else if (!choice.Words.Contains(value, StringComparer.Ordinal))
        {
            errors.Add(pointer, $"{name} is {Quoted(value)}; it must be one of {allowed}");
        }
    }

    private static void CheckLabel(LabelAttribute label, string name, string? value, string pointer, FieldErrors errors)
    {
        if (string.IsNullOrWhiteSpace(value))
        {
            if (label.Required || value is not null)
            {
                errors.Add(pointer, $"{name} is {(value is null ? "missing" : "blank")}; it must have 1 to {label.MaximumLength} characters");
            }
        }
        else if (value.Length > label.MaximumLength)
        {
            errors.Add(pointer, $"{name} has {value.Length} characters; it must have 1 to {label.MaximumLength}");
        }
        else if (value.Any(IsInvisible))
        {
            errors.Add(pointer, $"{name} has a control character or one that turns the direction of writing; it must have none");
        }
    }

    /// <summary>Control characters, and the marks and overrides of direction (Unicode, bidirectional formatting) that would turn the sentences around a name.</summary>
    private static bool IsInvisible(char c) => char.IsControl(c) || c is (>= '\u202a' and <= '\u202e') or (>= '\u2066' and <= '\u2069');

    private static void CheckIdentifier(IdentifierAttribute identifier, string name, string? value, string pointer, FieldErrors errors)
    {
        if (value is null)
        {
            if (identifier.Required)
            {
                errors.Add(pointer, $"{name} is missing; it must have 1 to 64 of a-z, 0-9 and hyphen");
            }
        }
        else if (!Identifiers.IsValid(value))
        {
            errors.Add(pointer, $"{name} is {Quoted(value)}; it must have 1 to 64 of a-z, 0-9 and hyphen");
        }
    }

    private static void CheckList(ListAttribute list, string name, IEnumerable? value, string pointer, FieldErrors errors)
    {
        if (value is null)
        {
            if (list.Required)
            {
                errors.Add(pointer, $"{name} is missing; it must have {list.MinimumCount} to {list.MaximumCount} entries");
            }

            return;
        }

        object?[] entries = [.. value.Cast<object?>()];
        if (entries.Length < list.MinimumCount || entries.Length > list.MaximumCount)
        {
            errors.Add(pointer, $"{name} has {entries.Length} entries; it must have {list.MinimumCount} to {list.MaximumCount}");
            return;
        }

        for (int i = 0; i < entries.Length; i++)
        {
            switch (entries[i])
            {
                case null:
                    errors.Add($"{pointer}/{i}", $"{name}[{i}] is null; it must be an object");
                    break;
                case double or string:
                    break;
                case { } entry:
                    Validate(entry, $"{pointer}/{i}", errors);
                    break;
            }
        }
    }

    /// <summary>A value as it may stand in an answer: quoted, and cut when long.</summary>
    internal static string Quoted(string value) => "\"" + (value.Length > 60 ? value[..60] + "…" : value) + "\"";
}
