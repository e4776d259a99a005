using System.Text;

namespace PassPlanner.Service.Validation;

/// <summary>Identifiers of profiles: 1 to 64 of a-z, 0-9 and hyphen, made from the name when left out.</summary>
public static class Identifiers
{
    private const int MaximumLength = 64;

    /// <summary>Whether a text is an identifier.</summary>
    public static bool IsValid(string text) =>
        text.Length is >= 1 and <= MaximumLength && text.All(c => c is >= 'a' and <= 'z' or >= '0' and <= '9' or '-');

    /// <summary>An identifier made from a name: lower case, and a hyphen for each run of other characters.</summary>
    public static string FromName(string name)
    {
        var identifier = new StringBuilder();
        foreach (char c in name.ToLowerInvariant())
        {
            if (c is >= 'a' and <= 'z' or >= '0' and <= '9')
            {
                identifier.Append(c);
            }
            else if (identifier.Length > 0 && identifier[^1] != '-')
            {
                identifier.Append('-');
            }

            if (identifier.Length == MaximumLength)
            {
                break;
            }
        }

        string trimmed = identifier.ToString().Trim('-');
        return trimmed.Length == 0 ? "unnamed" : trimmed;
    }
}
