using System.IO.Compression;

namespace PassPlanner.Tests;

/// <summary>The outside values under tests/reference; each folder's SOURCE.md says where they come from.</summary>
internal static class ReferenceData
{
    private static readonly string Root = FindRoot();

    public static string PathOf(string relativePath) => Path.Combine(Root, relativePath);

    public static Stream Open(string relativePath)
    {
        FileStream file = File.OpenRead(PathOf(relativePath));
        return relativePath.EndsWith(".gz", StringComparison.Ordinal)
            ? new GZipStream(file, CompressionMode.Decompress)
            : file;
    }

    /// <summary>The rows of a CSV file as values by column name; quoted fields may hold commas, not line breaks.</summary>
    public static IReadOnlyList<IReadOnlyDictionary<string, string>> Rows(string relativePath)
    {
        using var reader = new StreamReader(Open(relativePath));
        string[] header = Split(reader.ReadLine()!);
        var rows = new List<IReadOnlyDictionary<string, string>>();
        while (reader.ReadLine() is { } line)
        {
            if (line.Length > 0)
            {
                string[] fields = Split(line);
                rows.Add(header.Select((name, i) => (name, fields[i])).ToDictionary(x => x.name, x => x.Item2));
            }
        }

        return rows;
    }

    private static string[] Split(string line)
    {
        var fields = new List<string>();
        var field = new System.Text.StringBuilder();
        bool quoted = false;
        foreach (char c in line)
        {
            if (c == '"')
            {
                quoted = !quoted;
            }
            else if (c == ',' && !quoted)
            {
                fields.Add(field.ToString());
                field.Clear();
            }
            else
            {
                field.Append(c);
            }
        }

        fields.Add(field.ToString());
        return [.. fields];
    }

    private static string FindRoot()
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            string candidate = Path.Combine(folder.FullName, "tests", "reference");
            if (Directory.Exists(candidate))
            {
                return candidate;
            }
        }

        throw new DirectoryNotFoundException("tests/reference was not found above " + AppContext.BaseDirectory);
    }
}
