using PassPlanner.Physics.Time;

namespace PassPlanner.Store.Tests;

public class WaveformStoreTests
{
    [Fact]
    public void A_waveform_is_kept_once_and_deleted_once()
    {
        using var temporary = new TemporaryDatabase();
        var store = new WaveformStore(temporary.Database);
        UtcInstant now = UtcInstant.FromCalendar(2026, 3, 16);
        Assert.True(store.Create("ours", """{"name":"Ours"}""", now));
        Assert.False(store.Create("ours", """{"name":"Other"}""", now));
        Assert.Equal(new StoredWaveform { Id = "ours", DocumentJson = """{"name":"Ours"}""" }, Assert.Single(store.List()));
        Assert.True(store.Delete("ours"));
        Assert.False(store.Delete("ours"));
        Assert.Empty(store.List());
    }
}
