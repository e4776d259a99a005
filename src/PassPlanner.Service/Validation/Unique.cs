namespace PassPlanner.Service.Validation;

/// <summary>Refuses identifiers that occur twice in one list.</summary>
public static class Unique
{
    /// <summary>Adds an error for each identifier that an earlier entry has.</summary>
    public static void Check(IEnumerable<string?>? ids, string pointer, string member, FieldErrors errors)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        int index = 0;
        foreach (string? id in ids ?? [])
        {
            if (id is not null && !seen.Add(id))
            {
                errors.Add($"{pointer}/{index}/{member}", $"{member} is {DocumentValidator.Quoted(id)} twice; it must occur once");
            }

            index++;
        }
    }
}
