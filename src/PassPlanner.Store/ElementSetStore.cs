using Dapper;
using Microsoft.Data.Sqlite;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Store;

/// <summary>All element sets of all spacecraft; none is ever replaced.</summary>
public sealed class ElementSetStore(PlannerDatabase database)
{
    private const string SelectSql = """
        SELECT spacecraft_id, catalog_number, name, international_designator, classification, epoch_utc_ticks,
               mean_motion_rev_per_day, eccentricity, inclination_deg, right_ascension_of_node_deg, argument_of_perigee_deg,
               mean_anomaly_deg, b_star_per_earth_radius, mean_motion_dot_rev_per_day2, mean_motion_ddot_rev_per_day3,
               element_set_number, revolution_number, source, received_utc_ticks
        FROM element_set
        """;

    private const string InsertSql = """
        INSERT INTO element_set (
            spacecraft_id, catalog_number, name, international_designator, classification, epoch_utc_ticks,
            mean_motion_rev_per_day, eccentricity, inclination_deg, right_ascension_of_node_deg, argument_of_perigee_deg,
            mean_anomaly_deg, b_star_per_earth_radius, mean_motion_dot_rev_per_day2, mean_motion_ddot_rev_per_day3,
            element_set_number, revolution_number, source, received_utc_ticks)
        VALUES (
            @SpacecraftId, @CatalogNumber, @Name, @InternationalDesignator, @Classification, @EpochUtcTicks,
            @MeanMotionRevPerDay, @Eccentricity, @InclinationDeg, @RightAscensionOfNodeDeg, @ArgumentOfPerigeeDeg,
            @MeanAnomalyDeg, @BStarPerEarthRadius, @MeanMotionDotRevPerDay2, @MeanMotionDdotRevPerDay3,
            @ElementSetNumber, @RevolutionNumber, @Source, @ReceivedUtcTicks)
        ON CONFLICT DO NOTHING
        """;

    /// <summary>All element sets of a spacecraft, by epoch, the latest first.</summary>
    public IReadOnlyList<StoredElementSet> List(string spacecraftId)
    {
        using SqliteConnection connection = database.Open();
        return [.. connection.Query<Row>(
            $"{SelectSql} WHERE spacecraft_id = @spacecraftId ORDER BY epoch_utc_ticks DESC, id DESC", new { spacecraftId }).Select(ToElementSet)];
    }

    /// <summary>The element sets of every spacecraft, by spacecraft.</summary>
    public ILookup<string, ElementSet> All()
    {
        using SqliteConnection connection = database.Open();
        return connection.Query<Row>($"{SelectSql} ORDER BY spacecraft_id, epoch_utc_ticks, id")
            .Select(ToElementSet)
            .ToLookup(s => s.SpacecraftId, s => s.ElementSet, StringComparer.Ordinal);
    }

    /// <summary>Spacecraft by catalogue number, for those that have one.</summary>
    public ILookup<int, string> SpacecraftByCatalogNumber()
    {
        using SqliteConnection connection = database.Open();
        return connection.Query<CatalogRow>("SELECT id, catalog_number FROM spacecraft WHERE catalog_number > 0 ORDER BY id")
            .ToLookup(row => (int)row.CatalogNumber, row => row.Id);
    }

    /// <summary>Adds element sets, all or none; a set that is there already, element by element, is left as it is.</summary>
    /// <param name="sets">Spacecraft and element set.</param>
    /// <param name="source">Where they came from, in words.</param>
    /// <param name="receivedUtc">When.</param>
    /// <returns>For each set, whether it was new.</returns>
    public IReadOnlyList<bool> Add(IReadOnlyList<(string SpacecraftId, ElementSet ElementSet)> sets, string source, UtcInstant receivedUtc) =>
        database.Write((connection, transaction) =>
        {
            bool[] added = new bool[sets.Count];
            for (int i = 0; i < sets.Count; i++)
            {
                added[i] = connection.Execute(InsertSql, ToRow(sets[i].SpacecraftId, sets[i].ElementSet, source, receivedUtc), transaction) == 1;
            }

            return added;
        });

    private static StoredElementSet ToElementSet(Row row) => new(
        row.SpacecraftId,
        new ElementSet
        {
            CatalogNumber = checked((int)row.CatalogNumber),
            Name = row.Name,
            InternationalDesignator = row.InternationalDesignator,
            Classification = row.Classification[0],
            EpochUtc = new UtcInstant(row.EpochUtcTicks),
            MeanMotionRevPerDay = row.MeanMotionRevPerDay,
            Eccentricity = row.Eccentricity,
            InclinationDeg = row.InclinationDeg,
            RightAscensionOfNodeDeg = row.RightAscensionOfNodeDeg,
            ArgumentOfPerigeeDeg = row.ArgumentOfPerigeeDeg,
            MeanAnomalyDeg = row.MeanAnomalyDeg,
            BStarPerEarthRadius = row.BStarPerEarthRadius,
            MeanMotionDotRevPerDay2 = row.MeanMotionDotRevPerDay2,
            MeanMotionDdotRevPerDay3 = row.MeanMotionDdotRevPerDay3,
            ElementSetNumber = checked((int)row.ElementSetNumber),
            RevolutionNumber = checked((int)row.RevolutionNumber),
        },
        row.Source,
        row.ReceivedUtcTicks);

    private static Row ToRow(string spacecraftId, ElementSet set, string source, UtcInstant receivedUtc) => new()
    {
        SpacecraftId = spacecraftId,
        CatalogNumber = set.CatalogNumber,
        Name = set.Name,
        InternationalDesignator = set.InternationalDesignator,
        Classification = set.Classification.ToString(),
        EpochUtcTicks = set.EpochUtc.Ticks,
        MeanMotionRevPerDay = set.MeanMotionRevPerDay,
        Eccentricity = set.Eccentricity,
        InclinationDeg = set.InclinationDeg,
        RightAscensionOfNodeDeg = set.RightAscensionOfNodeDeg,
        ArgumentOfPerigeeDeg = set.ArgumentOfPerigeeDeg,
        MeanAnomalyDeg = set.MeanAnomalyDeg,
        BStarPerEarthRadius = set.BStarPerEarthRadius,
        MeanMotionDotRevPerDay2 = set.MeanMotionDotRevPerDay2,
        MeanMotionDdotRevPerDay3 = set.MeanMotionDdotRevPerDay3,
        ElementSetNumber = set.ElementSetNumber,
        RevolutionNumber = set.RevolutionNumber,
        Source = source,
        ReceivedUtcTicks = receivedUtc.Ticks,
    };

    private sealed record CatalogRow
    {
        public required string Id { get; init; }

        public required long CatalogNumber { get; init; }
    }

    private sealed record Row
    {
        public required string SpacecraftId { get; init; }

        public required long CatalogNumber { get; init; }

        public required string Name { get; init; }

        public required string InternationalDesignator { get; init; }

        public required string Classification { get; init; }

        public required long EpochUtcTicks { get; init; }

        public required double MeanMotionRevPerDay { get; init; }

        public required double Eccentricity { get; init; }

        public required double InclinationDeg { get; init; }

        public required double RightAscensionOfNodeDeg { get; init; }

        public required double ArgumentOfPerigeeDeg { get; init; }

        public required double MeanAnomalyDeg { get; init; }

        public required double BStarPerEarthRadius { get; init; }

        public required double MeanMotionDotRevPerDay2 { get; init; }

        public required double MeanMotionDdotRevPerDay3 { get; init; }

        public required long ElementSetNumber { get; init; }

        public required long RevolutionNumber { get; init; }

        public required string Source { get; init; }

        public required long ReceivedUtcTicks { get; init; }
    }
}
