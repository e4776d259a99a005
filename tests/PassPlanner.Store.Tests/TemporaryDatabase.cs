using Microsoft.Data.Sqlite;

namespace PassPlanner.Store.Tests;

/// <summary>A migrated database in a folder of its own, gone when the test ends.</summary>
internal sealed class TemporaryDatabase : IDisposable
{
    private readonly string directory = Directory.CreateTempSubdirectory("pass-planner-store-").FullName;

    public TemporaryDatabase()
    {
        FilePath = Path.Combine(directory, "test.db");
        Database = new PlannerDatabase(FilePath);
        Database.Migrate();
    }

    public string FilePath { get; }

    public PlannerDatabase Database { get; }

    /// <summary>The rows of a query as text, for looking past the stores.</summary>
    public IReadOnlyList<string> Rows(string sql)
    {
        using var connection = new SqliteConnection($"Data Source={FilePath};Pooling=False");
        connection.Open();
        using SqliteCommand command = connection.CreateCommand();
        command.CommandText = sql;
        using SqliteDataReader reader = command.ExecuteReader();
        var rows = new List<string>();
        while (reader.Read())
        {
            rows.Add(string.Join('|', Enumerable.Range(0, reader.FieldCount).Select(i => reader.GetValue(i).ToString())));
        }

        return rows;
    }

    public void Dispose()
    {
        Database.ReleaseFile();
        Directory.Delete(directory, recursive: true);
    }
}
