using System.Reflection;
using System.Text.Json;

namespace PassPlanner.Service.Validation;

/// <summary>
/// Compares JSON with the type it should become, before it is read: unknown members and wrong types, all of them,
/// each with its pointer, its value and what belongs there.
/// </summary>
public static class JsonShape
{
    /// <summary>Adds an error for each place where the JSON does not have the type's shape.</summary>
    public static void Check(JsonElement json, Type type, string pointer, FieldErrors errors)
    {
        string name = pointer.Length > 1 ? Unescape(pointer[(pointer.LastIndexOf('/') + 1)..]) : "the body";
        CheckValue(json, type, name, null, pointer, errors);
    }

    private static void CheckValue(JsonElement json, Type type, string name, QuantityAttribute? quantity, string pointer, FieldErrors errors)
    {
        Type bare = Nullable.GetUnderlyingType(type) ?? type;
        if (bare == typeof(double))
        {
            Expect(json, JsonValueKind.Number, name, NumberInWords(quantity, "a number"), pointer, errors);
        }
        else if (bare == typeof(int))
        {
            if (json.ValueKind != JsonValueKind.Number || !json.TryGetInt32(out _))
            {
                errors.Add(pointer, $"{name} is {Shown(json)}; it must be {NumberInWords(quantity, "a whole number")}");
            }
        }
        else if (bare == typeof(bool))
        {
            if (json.ValueKind is not (JsonValueKind.True or JsonValueKind.False))
            {
                errors.Add(pointer, $"{name} is {Shown(json)}; it must be true or false");
            }
        }
        else if (bare == typeof(string))
        {
            Expect(json, JsonValueKind.String, name, "a text", pointer, errors);
        }
        else if (ItemTypeOf(bare) is { } item)
        {
            CheckItems(json, item, name, quantity, pointer, errors);
        }
        else
        {
            CheckObject(json, bare, name, pointer, errors);
        }
    }

    private static void CheckItems(JsonElement json, Type item, string name, QuantityAttribute? quantity, string pointer, FieldErrors errors)
    {
        if (!Expect(json, JsonValueKind.Array, name, "a list", pointer, errors))
        {
            return;
        }

        int index = 0;
        foreach (JsonElement entry in json.EnumerateArray())
        {
            CheckValue(entry, item, $"{name}[{index}]", quantity, $"{pointer}/{index}", errors);
            index++;
        }
    }

    private static void CheckObject(JsonElement json, Type type, string name, string pointer, FieldErrors errors)
    {
        if (!Expect(json, JsonValueKind.Object, name, "an object", pointer, errors))
        {
            return;
        }

        PropertyInfo[] properties = type.GetProperties(BindingFlags.Public | BindingFlags.Instance);
        foreach (JsonProperty member in json.EnumerateObject())
        {
            string at = $"{pointer}/{Escape(member.Name)}";
            PropertyInfo? property = Array.Find(properties, p => JsonNamingPolicy.CamelCase.ConvertName(p.Name) == member.Name);
            if (property is null)
            {
                string known = string.Join(", ", properties.Select(p => JsonNamingPolicy.CamelCase.ConvertName(p.Name)));
                errors.Add(at, $"{DocumentValidator.Quoted(member.Name)} is not a member of {name}; it has {known}");
            }
            else if (member.Value.ValueKind == JsonValueKind.Null)
            {
                errors.Add(at, $"{member.Name} is null; leave it out instead");
            }
            else
            {
                CheckValue(member.Value, property.PropertyType, member.Name, property.GetCustomAttribute<QuantityAttribute>(), at, errors);
            }
        }
    }

    private static Type? ItemTypeOf(Type type) =>
        type.IsGenericType && type.GetGenericTypeDefinition() == typeof(IReadOnlyList<>) ? type.GetGenericArguments()[0] : null;

    private static bool Expect(JsonElement json, JsonValueKind kind, string name, string wanted, string pointer, FieldErrors errors)
    {
        if (json.ValueKind == kind)
        {
            return true;
        }

        errors.Add(pointer, $"{name} is {Shown(json)}; it must be {wanted}");
        return false;
    }

    private static string NumberInWords(QuantityAttribute? quantity, string kind) =>
        quantity is null ? kind : $"{kind}, {quantity.RangeInWords}";

    private static string Shown(JsonElement json) => json.ValueKind switch
    {
        JsonValueKind.Object => "an object",
        JsonValueKind.Array => "a list",
        JsonValueKind.String => DocumentValidator.Quoted(json.GetString()!),
        _ => json.GetRawText(),
    };

    private static string Escape(string member) =>
        member.Replace("~", "~0", StringComparison.Ordinal).Replace("/", "~1", StringComparison.Ordinal);

    private static string Unescape(string token) =>
        token.Replace("~1", "/", StringComparison.Ordinal).Replace("~0", "~", StringComparison.Ordinal);
}
