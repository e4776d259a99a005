using Dapper;
using Microsoft.Data.Sqlite;
using PassPlanner.Physics.Time;

namespace PassPlanner.Store;

/// <summary>
/// Stations or spacecraft: a row for each profile and a row for each of its revisions. An edit adds a revision and
/// never touches the earlier ones.
/// </summary>
public sealed class ProfileStore(PlannerDatabase database, ProfileKind kind)
{
    private const string DeleteDemoSql = """
        DELETE FROM element_set WHERE spacecraft_id IN (SELECT id FROM spacecraft WHERE is_demo = 1);
        DELETE FROM spacecraft WHERE is_demo = 1;
        DELETE FROM station WHERE is_demo = 1;
        """;

    /// <summary>Table names come from the enumeration, never from a request.</summary>
    private readonly string table = kind == ProfileKind.Station ? "station" : "spacecraft";

    private string SelectSql => $"""
        SELECT p.id, r.revision, r.document_json, r.saved_utc_ticks, p.is_demo
        FROM {table} p JOIN {table}_revision r ON r.profile_id = p.id
        """;

    /// <summary>Removes every demo profile with its element sets, in one transaction; answers whether there was any.</summary>
    public static bool DeleteDemo(PlannerDatabase database) => database.Write((connection, transaction) =>
        connection.Execute(DeleteDemoSql, transaction: transaction) > 0);

    /// <summary>Profiles by identifier, at their current revision.</summary>
    /// <param name="afterId">Where to go on: the last identifier of the page before; empty for the first page.</param>
    /// <param name="limit">Greatest number of profiles.</param>
    public IReadOnlyList<StoredProfile> List(string afterId = "", int limit = int.MaxValue)
    {
        using SqliteConnection connection = database.Open();
        return [.. connection.Query<Row>(
            $"{SelectSql} AND r.revision = p.current_revision WHERE p.id > @afterId ORDER BY p.id LIMIT @limit",
            new { afterId, limit }).Select(ToProfile)];
    }

    /// <summary>Number of profiles.</summary>
    public int Count()
    {
        using SqliteConnection connection = database.Open();
        return connection.ExecuteScalar<int>($"SELECT count(*) FROM {table}");
    }

    /// <summary>A profile at its current revision, or nothing.</summary>
    public StoredProfile? Find(string id)
    {
        using SqliteConnection connection = database.Open();
        return connection.QuerySingleOrDefault<Row>(
            $"{SelectSql} AND r.revision = p.current_revision WHERE p.id = @id", new { id }) is { } row ? ToProfile(row) : null;
    }

    /// <summary>A profile at one of its revisions, or nothing.</summary>
    public StoredProfile? FindRevision(string id, int revision)
    {
        using SqliteConnection connection = database.Open();
        return connection.QuerySingleOrDefault<Row>(
            $"{SelectSql} WHERE p.id = @id AND r.revision = @revision", new { id, revision }) is { } row ? ToProfile(row) : null;
    }

    /// <summary>All revisions of a profile, latest first; empty when there is no such profile.</summary>
    public IReadOnlyList<StoredProfile> Revisions(string id)
    {
        using SqliteConnection connection = database.Open();
        return [.. connection.Query<Row>($"{SelectSql} WHERE p.id = @id ORDER BY r.revision DESC", new { id }).Select(ToProfile)];
    }

    /// <summary>Adds a profile at revision 1.</summary>
    /// <param name="id">Identifier.</param>
    /// <param name="documentJson">Document.</param>
    /// <param name="catalogNumber">Catalogue number of a spacecraft, 0 for none; not used for stations.</param>
    /// <param name="isDemo">Whether it belongs to the demo scenario.</param>
    /// <param name="savedUtc">When.</param>
    /// <returns><see cref="SaveOutcome.Done"/> or <see cref="SaveOutcome.Exists"/>.</returns>
    public SaveOutcome Create(string id, string documentJson, int catalogNumber, bool isDemo, UtcInstant savedUtc) =>
        database.Write<SaveOutcome>((connection, transaction) =>
        {
            if (CurrentRevision(connection, transaction, id) is not null)
            {
                return new SaveOutcome.Exists();
            }

            string sql = kind == ProfileKind.Station
                ? "INSERT INTO station (id, current_revision, is_demo) VALUES (@id, 1, @isDemo)"
                : "INSERT INTO spacecraft (id, current_revision, is_demo, catalog_number) VALUES (@id, 1, @isDemo, @catalogNumber)";
            connection.Execute(sql, new { id, isDemo, catalogNumber }, transaction);
            AddRevision(connection, transaction, id, 1, documentJson, savedUtc);
            return new SaveOutcome.Done(1);
        });

    /// <summary>Adds a revision to a profile; a demo profile that is edited becomes the operator's own.</summary>
    /// <returns><see cref="SaveOutcome.Done"/>, <see cref="SaveOutcome.Missing"/> or <see cref="SaveOutcome.Conflict"/>.</returns>
    public SaveOutcome Update(string id, int expectedRevision, string documentJson, int catalogNumber, UtcInstant savedUtc) =>
        database.Write<SaveOutcome>((connection, transaction) =>
        {
            if (CurrentRevision(connection, transaction, id) is not { } current)
            {
                return new SaveOutcome.Missing();
            }

            if (current != expectedRevision)
            {
                return new SaveOutcome.Conflict(current);
            }

            string catalog = kind == ProfileKind.Spacecraft ? ", catalog_number = @catalogNumber" : "";
            connection.Execute(
                $"UPDATE {table} SET current_revision = @revision{catalog} WHERE id = @id",
                new { id, revision = current + 1, catalogNumber },
                transaction);
            AddRevision(connection, transaction, id, current + 1, documentJson, savedUtc);
            return new SaveOutcome.Done(current + 1);
        });

    /// <summary>Deletes a profile with its revisions.</summary>
    /// <param name="id">Identifier.</param>
    /// <param name="expectedRevision">Revision that the caller has read; nothing for any.</param>
    /// <param name="cascade">Whether its element sets go as well.</param>
    /// <returns>
    /// <see cref="SaveOutcome.Done"/>, <see cref="SaveOutcome.Missing"/>, <see cref="SaveOutcome.Conflict"/> or
    /// <see cref="SaveOutcome.Dependents"/>.
    /// </returns>
    public SaveOutcome Delete(string id, int? expectedRevision, bool cascade) => database.Write<SaveOutcome>((connection, transaction) =>
    {
        if (CurrentRevision(connection, transaction, id) is not { } current)
        {
            return new SaveOutcome.Missing();
        }

        if (expectedRevision is { } expected && expected != current)
        {
            return new SaveOutcome.Conflict(current);
        }

        if (kind == ProfileKind.Spacecraft)
        {
            int sets = connection.ExecuteScalar<int>("SELECT count(*) FROM element_set WHERE spacecraft_id = @id", new { id }, transaction);
            if (sets > 0 && !cascade)
            {
                return new SaveOutcome.Dependents(sets);
            }

            connection.Execute("DELETE FROM element_set WHERE spacecraft_id = @id", new { id }, transaction);
        }

        connection.Execute($"DELETE FROM {table} WHERE id = @id", new { id }, transaction);
        return new SaveOutcome.Done(0);
    });

    private int? CurrentRevision(SqliteConnection connection, SqliteTransaction transaction, string id) =>
        connection.ExecuteScalar<int?>($"SELECT current_revision FROM {table} WHERE id = @id", new { id }, transaction);

    private void AddRevision(
        SqliteConnection connection, SqliteTransaction transaction, string id, int revision, string documentJson, UtcInstant savedUtc) =>
        connection.Execute(
            $"INSERT INTO {table}_revision (profile_id, revision, document_json, saved_utc_ticks) VALUES (@id, @revision, @documentJson, @ticks)",
            new { id, revision, documentJson, ticks = savedUtc.Ticks },
            transaction);

    private static StoredProfile ToProfile(Row row) => new()
    {
        Id = row.Id,
        Revision = checked((int)row.Revision),
        DocumentJson = row.DocumentJson,
        SavedUtcTicks = row.SavedUtcTicks,
        IsDemo = row.IsDemo == 1,
    };

    private sealed record Row
    {
        public required string Id { get; init; }

        public required long Revision { get; init; }

        public required string DocumentJson { get; init; }

        public required long SavedUtcTicks { get; init; }

        public required long IsDemo { get; init; }
    }
}
