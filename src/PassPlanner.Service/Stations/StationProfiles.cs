using PassPlanner.Planning.Profiles;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Validation;
using PassPlanner.Store;

namespace PassPlanner.Service.Stations;

/// <summary>Stations between the API and the store.</summary>
public sealed class StationProfiles(PlannerDatabase database, TimeProvider clock)
    : ProfileService<StationDocument, Station>(new ProfileStore(database, ProfileKind.Station), clock, "station")
{
    /// <inheritdoc/>
    protected override StationDocument WithIdentifiers(StationDocument document) => StationMapper.WithIdentifiers(document);

    /// <inheritdoc/>
    protected override string? IdOf(StationDocument document) => document.Id;

    /// <inheritdoc/>
    protected override StationDocument WithId(StationDocument document, string id) => document with { Id = id };

    /// <inheritdoc/>
    protected override StationDocument WithRevision(StationDocument document, int revision, string savedUtc, bool isDemo) =>
        document with { Revision = revision, SavedUtc = savedUtc, IsDemo = isDemo };

    /// <inheritdoc/>
    protected override Station? Map(StationDocument document, int revision, FieldErrors errors) => StationMapper.Map(document, revision, errors);
}
