using PassPlanner.Service.Profiles;
using PassPlanner.Service.Validation;
using PassPlanner.Store;

namespace PassPlanner.Service.Spacecraft;

/// <summary>Spacecraft between the API and the store.</summary>
public sealed class SpacecraftProfiles(PlannerDatabase database, TimeProvider clock)
    : ProfileService<SpacecraftDocument, Planning.Profiles.Spacecraft>(new ProfileStore(database, ProfileKind.Spacecraft), clock, "spacecraft")
{
    /// <inheritdoc/>
    protected override SpacecraftDocument WithIdentifiers(SpacecraftDocument document) => SpacecraftMapper.WithIdentifiers(document);

    /// <inheritdoc/>
    protected override string? IdOf(SpacecraftDocument document) => document.Id;

    /// <inheritdoc/>
    protected override int CatalogNumberOf(SpacecraftDocument document) => document.CatalogNumber ?? 0;

    /// <inheritdoc/>
    protected override SpacecraftDocument WithId(SpacecraftDocument document, string id) => document with { Id = id };

    /// <inheritdoc/>
    protected override SpacecraftDocument WithRevision(SpacecraftDocument document, int revision, string savedUtc, bool isDemo) =>
        document with { Revision = revision, SavedUtc = savedUtc, IsDemo = isDemo };

    /// <inheritdoc/>
    protected override Planning.Profiles.Spacecraft? Map(SpacecraftDocument document, int revision, FieldErrors errors) =>
        SpacecraftMapper.Map(document, revision, errors);
}
