using System.Reflection;
using System.Text.Json;

namespace PassPlanner.Service.Validation;

/// <summary>Members of a document whose "kind" decides which of the others it takes.</summary>
public static class KindMembers
{
    /// <summary>Adds an error for each member that is given and does not belong to the kind.</summary>
    public static void RefuseOthers(object document, string kind, string[] members, string pointer, FieldErrors errors)
    {
        foreach (PropertyInfo property in document.GetType().GetProperties(BindingFlags.Public | BindingFlags.Instance))
        {
            string name = JsonNamingPolicy.CamelCase.ConvertName(property.Name);
            if (name != "kind" && property.GetValue(document) is not null && !members.Contains(name, StringComparer.Ordinal))
            {
                errors.Add($"{pointer}/{name}", $"{name} does not belong to the kind {kind}, which takes {(members.Length == 0 ? "no other member" : string.Join(", ", members))}");
            }
        }
    }

    /// <summary>A number that the kind needs; nothing, and an error, when it is missing.</summary>
    public static double? Require(double? value, string name, string kind, string pointer, FieldErrors errors)
    {
        if (value is null)
        {
            AddMissing(name, kind, pointer, errors);
        }

        return value;
    }

    /// <summary>A member that the kind needs; nothing, and an error, when it is missing.</summary>
    public static T? Require<T>(T? value, string name, string kind, string pointer, FieldErrors errors)
        where T : class
    {
        if (value is null)
        {
            AddMissing(name, kind, pointer, errors);
        }

        return value;
    }

    private static void AddMissing(string name, string kind, string pointer, FieldErrors errors) =>
        errors.Add($"{pointer}/{name}", $"{name} is missing; the kind {kind} needs it");
}
