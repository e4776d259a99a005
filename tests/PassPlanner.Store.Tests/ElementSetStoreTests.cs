using Microsoft.Data.Sqlite;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Store.Tests;

public class ElementSetStoreTests
{
    /// <summary>No member has its default value, and no double is round.</summary>
    internal static readonly ElementSet Sample = new()
    {
        CatalogNumber = 799500123,
        Name = "LARK 1 ☂",
        InternationalDesignator = "2026-001AB",
        Classification = 'C',
        EpochUtc = new UtcInstant(17_738_123_456_789_012),
        MeanMotionRevPerDay = 15.120000000000001,
        Eccentricity = 0.1 + 0.2,
        InclinationDeg = 97.46720000000001,
        RightAscensionOfNodeDeg = 359.99999999999994,
        ArgumentOfPerigeeDeg = 1.7533000000000003,
        MeanAnomalyDeg = 1.0 / 3,
        BStarPerEarthRadius = -1.7177e-4,
        MeanMotionDotRevPerDay2 = 2.906e-5,
        MeanMotionDdotRevPerDay3 = -5e-324,
        ElementSetNumber = 999,
        RevolutionNumber = 7636,
    };

    private static readonly UtcInstant Now = UtcInstant.FromCalendar(2026, 3, 16);

    [Fact]
    public void Every_member_is_read_to_the_last_bit()
    {
        using TemporaryDatabase temporary = WithSpacecraft("a");
        var store = new ElementSetStore(temporary.Database);
        Assert.Equal([true], store.Add([("a", Sample)], "upload, two lines", Now));
        StoredElementSet read = Assert.Single(store.List("a"));
        Assert.Equal(Sample, read.ElementSet);
        Assert.Equal(("a", "upload, two lines", Now.Ticks), (read.SpacecraftId, read.Source, read.ReceivedUtcTicks));
        Assert.Equal(Sample, Assert.Single(store.All()["a"]));
    }

    [Fact]
    public void All_sets_are_kept_and_the_same_one_is_not_kept_twice()
    {
        using TemporaryDatabase temporary = WithSpacecraft("a");
        var store = new ElementSetStore(temporary.Database);
        ElementSet later = Sample with { EpochUtc = Sample.EpochUtc.AddSeconds(3600) };
        ElementSet refined = Sample with { BStarPerEarthRadius = 2e-4 };
        Assert.Equal([true, true, true, false], store.Add([("a", Sample), ("a", later), ("a", refined), ("a", Sample)], "test", Now));
        Assert.Equal(later.EpochUtc, store.List("a")[0].ElementSet.EpochUtc);
        Assert.Equal(3, store.List("a").Count);
    }

    [Fact]
    public void A_set_out_of_range_leaves_none_of_its_upload_behind()
    {
        using TemporaryDatabase temporary = WithSpacecraft("a");
        var store = new ElementSetStore(temporary.Database);
        Assert.Throws<SqliteException>(() => store.Add([("a", Sample), ("a", Sample with { Eccentricity = 1, EpochUtc = Now })], "test", Now));
        Assert.Throws<SqliteException>(() => store.Add([("nobody", Sample)], "test", Now));
        Assert.Empty(store.List("a"));
    }

    [Fact]
    public void Spacecraft_are_found_by_catalogue_number()
    {
        using TemporaryDatabase temporary = WithSpacecraft("a");
        var profiles = new ProfileStore(temporary.Database, ProfileKind.Spacecraft);
        profiles.Create("b", "{}", 5, false, Now);
        profiles.Create("c", "{}", 7, false, Now);
        profiles.Update("c", 1, "{}", 5, Now);
        ILookup<int, string> byNumber = new ElementSetStore(temporary.Database).SpacecraftByCatalogNumber();
        Assert.Equal(["b", "c"], byNumber[5]);
        Assert.Empty(byNumber[0]);
    }

    private static TemporaryDatabase WithSpacecraft(string id)
    {
        var temporary = new TemporaryDatabase();
        new ProfileStore(temporary.Database, ProfileKind.Spacecraft).Create(id, "{}", 0, false, Now);
        return temporary;
    }
}
