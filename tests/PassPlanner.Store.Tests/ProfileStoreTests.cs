using Microsoft.Data.Sqlite;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Store.Tests;

public class ProfileStoreTests
{
    private const string First = """{"name":"Ærø \u202e 北","n":1}""";
    private const string Second = """{"name":"Second"}""";
    private static readonly UtcInstant Monday = UtcInstant.FromCalendar(2026, 3, 16, 8, 30, 1.5);
    private static readonly UtcInstant Tuesday = UtcInstant.FromCalendar(2026, 3, 17);

    public static TheoryData<ProfileKind> Kinds => new() { ProfileKind.Station, ProfileKind.Spacecraft };

    [Theory]
    [MemberData(nameof(Kinds))]
    public void A_profile_is_read_as_it_was_written(ProfileKind kind)
    {
        using var temporary = new TemporaryDatabase();
        var store = new ProfileStore(temporary.Database, kind);
        Assert.Equal(new SaveOutcome.Done(1), store.Create("a-1", First, 799500123, true, Monday));
        StoredProfile expected = new() { Id = "a-1", Revision = 1, DocumentJson = First, SavedUtcTicks = Monday.Ticks, IsDemo = true };
        Assert.Equal(expected, store.Find("a-1"));
        Assert.Equal(expected, Assert.Single(store.List()));
        Assert.Equal(1, store.Count());
        Assert.Null(store.Find("a-2"));
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void An_edit_adds_a_revision_and_touches_no_earlier_one(ProfileKind kind)
    {
        using var temporary = new TemporaryDatabase();
        var store = new ProfileStore(temporary.Database, kind);
        store.Create("a", First, 0, false, Monday);
        Assert.Equal(new SaveOutcome.Done(2), store.Update("a", 1, Second, 5, Tuesday));
        Assert.Equal(Second, store.Find("a")!.DocumentJson);
        Assert.Equal(First, store.FindRevision("a", 1)!.DocumentJson);
        Assert.Equal([(2, Tuesday.Ticks), (1, Monday.Ticks)], store.Revisions("a").Select(r => (r.Revision, r.SavedUtcTicks)));
        Assert.Null(store.FindRevision("a", 3));
        Assert.Equal(new SaveOutcome.Conflict(2), store.Update("a", 1, First, 0, Tuesday));
        Assert.Equal(Second, store.Find("a")!.DocumentJson);
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void What_cannot_be_written_changes_nothing(ProfileKind kind)
    {
        using var temporary = new TemporaryDatabase();
        var store = new ProfileStore(temporary.Database, kind);
        store.Create("a", First, 0, false, Monday);
        Assert.Equal(new SaveOutcome.Exists(), store.Create("a", Second, 0, false, Tuesday));
        Assert.Equal(new SaveOutcome.Conflict(1), store.Update("a", 2, Second, 0, Tuesday));
        Assert.Equal(new SaveOutcome.Conflict(1), store.Delete("a", 2, false));
        Assert.Equal(new SaveOutcome.Missing(), store.Update("b", 1, Second, 0, Tuesday));
        Assert.Equal(new SaveOutcome.Missing(), store.Delete("b", null, false));
        Assert.Throws<SqliteException>(() => store.Create("c", "{ no json", 0, false, Tuesday));
        Assert.Throws<SqliteException>(() => store.Update("a", 1, "{ no json", 0, Tuesday));
        Assert.Throws<SqliteException>(() => store.Create(new string('x', 65), First, 0, false, Tuesday));
        Assert.Equal(First, Assert.Single(store.List()).DocumentJson);
        Assert.Equal(1, store.Find("a")!.Revision);
    }

    [Fact]
    public void A_list_goes_on_after_an_identifier()
    {
        using var temporary = new TemporaryDatabase();
        var store = new ProfileStore(temporary.Database, ProfileKind.Station);
        foreach (string id in new[] { "c", "a", "b", "d" })
        {
            store.Create(id, First, 0, false, Monday);
        }

        Assert.Equal(["a", "b"], store.List("", 2).Select(p => p.Id));
        Assert.Equal(["c", "d"], store.List("b", 5).Select(p => p.Id));
    }

    [Fact]
    public void A_spacecraft_with_element_sets_goes_only_with_them()
    {
        using var temporary = new TemporaryDatabase();
        var store = new ProfileStore(temporary.Database, ProfileKind.Spacecraft);
        var sets = new ElementSetStore(temporary.Database);
        store.Create("a", First, 5, false, Monday);
        sets.Add([("a", ElementSetStoreTests.Sample)], "test", Monday);
        Assert.Equal(new SaveOutcome.Dependents(1), store.Delete("a", null, false));
        Assert.Single(sets.List("a"));
        Assert.Equal(new SaveOutcome.Done(0), store.Delete("a", 1, true));
        Assert.Empty(sets.List("a"));
        Assert.Empty(temporary.Rows("SELECT * FROM spacecraft_revision"));
    }

    [Fact]
    public void The_demo_goes_at_once_and_nothing_else_does()
    {
        using var temporary = new TemporaryDatabase();
        var stations = new ProfileStore(temporary.Database, ProfileKind.Station);
        var spacecraft = new ProfileStore(temporary.Database, ProfileKind.Spacecraft);
        var sets = new ElementSetStore(temporary.Database);
        stations.Create("demo", First, 0, true, Monday);
        stations.Create("own", First, 0, false, Monday);
        spacecraft.Create("demo", First, 0, true, Monday);
        spacecraft.Create("own", First, 0, false, Monday);
        sets.Add([("demo", ElementSetStoreTests.Sample), ("own", ElementSetStoreTests.Sample)], "test", Monday);
        Assert.True(ProfileStore.DeleteDemo(temporary.Database));
        Assert.Equal("own", Assert.Single(stations.List()).Id);
        Assert.Equal("own", Assert.Single(spacecraft.List()).Id);
        Assert.Equal("own", Assert.Single(sets.All()).Key);
        Assert.False(ProfileStore.DeleteDemo(temporary.Database));
    }

    [Fact]
    public void Writers_at_the_same_time_lose_nothing()
    {
        using var temporary = new TemporaryDatabase();
        var store = new ProfileStore(temporary.Database, ProfileKind.Station);
        store.Create("a", First, 0, false, Monday);
        Parallel.For(0, 8, writer =>
        {
            for (int done = 0; done < 10;)
            {
                done += store.Update("a", store.Find("a")!.Revision, $$"""{"writer":{{writer}},"n":{{done}}}""", 0, Tuesday) is SaveOutcome.Done ? 1 : 0;
            }
        });
        Assert.Equal(81, store.Find("a")!.Revision);
        Assert.Equal(80, store.Revisions("a").Select(r => r.DocumentJson).Where(d => d != First).Distinct().Count());
    }

    [Fact]
    public void The_version_of_the_content_rises_with_writes_and_with_nothing_else()
    {
        using var temporary = new TemporaryDatabase();
        var store = new ProfileStore(temporary.Database, ProfileKind.Station);
        long before = temporary.Database.ContentVersion();
        store.Create("a", First, 0, false, Monday);
        long after = temporary.Database.ContentVersion();
        Assert.True(after > before);
        store.List();
        store.Find("a");
        store.Delete("nobody", null, false);
        store.Create("a", Second, 0, false, Monday);
        Assert.Equal(after, temporary.Database.ContentVersion());
    }
}
