using Dapper;
using DbUp;
using DbUp.Engine;
using Microsoft.Data.Sqlite;

namespace PassPlanner.Store;

/// <summary>The SQLite database file: connections, migrations, and the version of its content.</summary>
public sealed class PlannerDatabase
{
    private const string ReadVersionSql = "SELECT version FROM content_version WHERE id = 1";
    private const string CountChangesSql = "SELECT total_changes()";
    private const string RaiseVersionSql = "UPDATE content_version SET version = version + 1 WHERE id = 1";

    private readonly string connectionString;

    static PlannerDatabase() => DefaultTypeMap.MatchNamesWithUnderscores = true;

    /// <summary>Names the file; it is made by <see cref="Migrate"/> when it does not exist.</summary>
    public PlannerDatabase(string filePath)
    {
        connectionString = new SqliteConnectionStringBuilder
        {
            DataSource = filePath,
            ForeignKeys = true,
            Pooling = true,
        }.ToString();
    }

    /// <summary>Applies the migrations that the file has not seen, each in a transaction, and turns on write-ahead logging.</summary>
    /// <exception cref="InvalidOperationException">A migration failed; the file is as it was before that migration.</exception>
    public void Migrate()
    {
        using (SqliteConnection connection = Open())
        {
            connection.Execute("PRAGMA journal_mode = WAL");
        }

        DatabaseUpgradeResult result = DeployChanges.To
            .SqliteDatabase(connectionString)
            .WithScriptsEmbeddedInAssembly(typeof(PlannerDatabase).Assembly)
            .WithTransactionPerScript()
            .LogToNowhere()
            .Build()
            .PerformUpgrade();
        if (!result.Successful)
        {
            throw new InvalidOperationException($"Migration {result.ErrorScript?.Name} failed", result.Error);
        }
    }

    /// <summary>Whether the database answers; a cheap check for a health probe.</summary>
    public bool IsReadable()
    {
        try
        {
            return ContentVersion() >= 0;
        }
        catch (SqliteException)
        {
            return false;
        }
    }

    /// <summary>A number that rises with every write: what was derived at one value holds for as long as it stays.</summary>
    public long ContentVersion()
    {
        using SqliteConnection connection = Open();
        return connection.ExecuteScalar<long>(ReadVersionSql);
    }

    /// <summary>Closes the connections kept open for reuse, so that the file can be moved or deleted.</summary>
    public void ReleaseFile() => SqliteConnection.ClearPool(new SqliteConnection(connectionString));

    internal SqliteConnection Open()
    {
        var connection = new SqliteConnection(connectionString);
        connection.Open();
        return connection;
    }

    /// <summary>Runs a write in an immediate transaction; an exception leaves nothing of it behind.</summary>
    internal T Write<T>(Func<SqliteConnection, SqliteTransaction, T> work)
    {
        using SqliteConnection connection = Open();
        using SqliteTransaction transaction = connection.BeginTransaction(deferred: false);
        long changesBefore = connection.ExecuteScalar<long>(CountChangesSql, transaction: transaction);
        T outcome = work(connection, transaction);
        if (connection.ExecuteScalar<long>(CountChangesSql, transaction: transaction) != changesBefore)
        {
            connection.Execute(RaiseVersionSql, transaction: transaction);
        }

        transaction.Commit();
        return outcome;
    }
}
