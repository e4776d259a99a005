using Dapper;
using Microsoft.Data.Sqlite;
using PassPlanner.Physics.Time;

namespace PassPlanner.Store;

/// <summary>The operator's own waveforms.</summary>
public sealed class WaveformStore(PlannerDatabase database)
{
    /// <summary>Waveforms by identifier.</summary>
    public IReadOnlyList<StoredWaveform> List()
    {
        using SqliteConnection connection = database.Open();
        return [.. connection.Query<StoredWaveform>("SELECT id, document_json FROM waveform ORDER BY id")];
    }

    /// <summary>Adds a waveform; answers false when there is one with this identifier already.</summary>
    public bool Create(string id, string documentJson, UtcInstant savedUtc) => database.Write((connection, transaction) => connection.Execute(
        "INSERT INTO waveform (id, document_json, saved_utc_ticks) VALUES (@id, @documentJson, @ticks) ON CONFLICT DO NOTHING",
        new { id, documentJson, ticks = savedUtc.Ticks },
        transaction) == 1);

    /// <summary>Deletes a waveform; answers false when there is none with this identifier.</summary>
    public bool Delete(string id) => database.Write((connection, transaction) =>
        connection.Execute("DELETE FROM waveform WHERE id = @id", new { id }, transaction) == 1);
}
