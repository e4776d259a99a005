using System.Text.RegularExpressions;
using Microsoft.Data.Sqlite;
using PassPlanner.Tests;

namespace PassPlanner.Store.Tests;

public partial class SchemaTests
{
    private const string SchemaSql = "SELECT sql FROM sqlite_master WHERE sql IS NOT NULL AND name NOT LIKE 'SchemaVersions%' AND name NOT LIKE 'sqlite%' ORDER BY name";

    [Fact]
    public void The_written_schema_is_what_the_migrations_make()
    {
        using var temporary = new TemporaryDatabase();
        using var connection = new SqliteConnection("Data Source=:memory:");
        connection.Open();
        using SqliteCommand command = connection.CreateCommand();
        command.CommandText = File.ReadAllText(Path.Combine(ReferenceData.PathOf(".."), "..", "db", "schema.sql"));
        command.ExecuteNonQuery();
        command.CommandText = SchemaSql;
        using SqliteDataReader reader = command.ExecuteReader();
        var written = new List<string>();
        while (reader.Read())
        {
            written.Add(Normal(reader.GetString(0)));
        }

        Assert.NotEmpty(written);
        Assert.Equal(written, temporary.Rows(SchemaSql).Select(Normal));
    }

    [Fact]
    public void Every_table_is_strict_and_the_journal_is_write_ahead()
    {
        using var temporary = new TemporaryDatabase();
        IReadOnlyList<string> tables = temporary.Rows("SELECT name, strict FROM pragma_table_list WHERE type = 'table' AND name NOT LIKE 'sqlite%' AND name NOT LIKE 'SchemaVersions%'");
        Assert.Equal(7, tables.Count);
        Assert.All(tables, table => Assert.EndsWith("|1", table, StringComparison.Ordinal));
        Assert.Equal("wal", Assert.Single(temporary.Rows("PRAGMA journal_mode")));
    }

    [Fact]
    public void Migrating_again_changes_nothing()
    {
        using var temporary = new TemporaryDatabase();
        IReadOnlyList<string> before = temporary.Rows(SchemaSql);
        temporary.Database.Migrate();
        Assert.Equal(before, temporary.Rows(SchemaSql));
        Assert.True(temporary.Database.IsReadable());
    }

    private static string Normal(string sql) => WhiteSpace().Replace(sql, " ").Trim();

    [GeneratedRegex(@"\s+")]
    private static partial Regex WhiteSpace();
}
