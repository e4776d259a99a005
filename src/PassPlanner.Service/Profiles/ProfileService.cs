using System.Text.Json;
using PassPlanner.Physics.Time;
using PassPlanner.Service.Passes;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Validation;
using PassPlanner.Store;

namespace PassPlanner.Service.Profiles;

/// <summary>What stations and spacecraft have in common between the API and the store: checks, revisions, conflicts.</summary>
/// <typeparam name="TDocument">Document of the API.</typeparam>
/// <typeparam name="TProfile">Profile that the planner computes with.</typeparam>
public abstract class ProfileService<TDocument, TProfile>(ProfileStore store, TimeProvider clock, string noun)
    where TDocument : class
    where TProfile : class
{
    private const int GreatestLimit = 1000;

    /// <summary>Number of profiles.</summary>
    public int Count() => store.Count();

    /// <summary>A page of the documents.</summary>
    public ProfileList<TDocument> List(IQueryCollection query)
    {
        var reader = new QueryReader(query);
        int limit = reader.Whole("limit", 1, GreatestLimit, "items") ?? GreatestLimit;
        string afterId = reader.Text("cursor") ?? "";
        reader.Finish("limit", "cursor");
        IReadOnlyList<StoredProfile> found = store.List(afterId, limit + 1);
        return new ProfileList<TDocument>
        {
            Items = [.. found.Take(limit).Select(Read)],
            Next = found.Count > limit ? found[limit - 1].Id : null,
        };
    }

    /// <summary>Every profile as the planner computes with it.</summary>
    public IReadOnlyList<(TProfile Profile, bool IsDemo)> Profiles() => [.. store.List().Select(stored => (Mapped(stored), stored.IsDemo))];

    /// <summary>A document at its current revision.</summary>
    public TDocument Get(string id) => Read(store.Find(id) ?? throw NoSuch(id));

    /// <summary>A document at one of its revisions.</summary>
    public TDocument GetRevision(string id, int revision) => Read(store.FindRevision(id, revision)
        ?? throw RequestProblemException.NotFound($"There is no revision {revision} of {noun} {DocumentValidator.Quoted(id)}"));

    /// <summary>The revisions of a profile, latest first.</summary>
    public ProfileList<RevisionResponse> Revisions(string id)
    {
        IReadOnlyList<StoredProfile> found = store.Revisions(id);
        return found.Count == 0 ? throw NoSuch(id) : new ProfileList<RevisionResponse>
        {
            Items = [.. found.Select(r => new RevisionResponse { Revision = r.Revision, SavedUtc = new UtcInstant(r.SavedUtcTicks).ToString() })],
        };
    }

    /// <summary>Checks and adds a document.</summary>
    public TDocument Create(TDocument document, bool isDemo = false)
    {
        TDocument complete = Checked(WithIdentifiers(document));

        // WithIdentifiers has just filled it in.
        string id = IdOf(complete)!;
        return store.Create(id, Write(complete), CatalogNumberOf(complete), isDemo, Now) switch
        {
            SaveOutcome.Exists => throw new RequestProblemException(
                StatusCodes.Status409Conflict,
                ProblemTypes.AlreadyExists,
                "It exists already",
                $"There is a {noun} {DocumentValidator.Quoted(id)} already; give another id, or change it with PUT"),
            _ => Get(id),
        };
    }

    /// <summary>Checks a document and adds it as a new revision.</summary>
    public TDocument Update(string id, int expectedRevision, TDocument document)
    {
        TDocument complete = WithIdentifiers(document);
        if (IdOf(document) is { } own && own != id)
        {
            throw RequestProblemException.InvalidMember("id", $"id is {DocumentValidator.Quoted(own)}; it must be {DocumentValidator.Quoted(id)}, as in the address, or be left out");
        }

        complete = Checked(WithId(complete, id));
        return store.Update(id, expectedRevision, Write(complete), CatalogNumberOf(complete), Now) switch
        {
            SaveOutcome.Missing => throw NoSuch(id),
            SaveOutcome.Conflict conflict => throw Conflict(id, expectedRevision, conflict.CurrentRevision),
            _ => Get(id),
        };
    }

    /// <summary>Deletes a profile.</summary>
    public void Delete(string id, HttpRequest request)
    {
        int? expected = EntityTag.Optional(request);
        var reader = new QueryReader(request.Query);
        bool cascade = reader.Flag("cascade");
        reader.Finish("cascade");
        switch (store.Delete(id, expected, cascade))
        {
            case SaveOutcome.Missing:
                throw NoSuch(id);
            case SaveOutcome.Conflict conflict:
                throw Conflict(id, expected!.Value, conflict.CurrentRevision);
            case SaveOutcome.Dependents dependents:
                throw new RequestProblemException(
                    StatusCodes.Status409Conflict,
                    ProblemTypes.HasDependents,
                    "Something depends on it",
                    $"{noun} {DocumentValidator.Quoted(id)} has {dependents.ElementSets} element set{(dependents.ElementSets == 1 ? "" : "s")}; cascade=true deletes them as well");
            default:
                break;
        }
    }

    /// <summary>The document with the identifiers that it left out.</summary>
    protected abstract TDocument WithIdentifiers(TDocument document);

    /// <summary>Identifier of a document; nothing when it gives none.</summary>
    protected abstract string? IdOf(TDocument document);

    /// <summary>Catalogue number of a document; 0 for none.</summary>
    protected virtual int CatalogNumberOf(TDocument document) => 0;

    /// <summary>The document with an identifier.</summary>
    protected abstract TDocument WithId(TDocument document, string id);

    /// <summary>The document with what the service writes.</summary>
    protected abstract TDocument WithRevision(TDocument document, int revision, string savedUtc, bool isDemo);

    /// <summary>Builds the profile; nothing, and errors, when members do not fit together.</summary>
    protected abstract TProfile? Map(TDocument document, int revision, FieldErrors errors);

    private UtcInstant Now => UtcInstant.From(clock.GetUtcNow());

    private static string Write(TDocument document) => JsonSerializer.Serialize(document, WireFormat.Options);

    private TDocument Checked(TDocument document)
    {
        var errors = new FieldErrors();
        Map(document, 1, errors);
        return errors.Any ? throw RequestProblemException.InvalidInput(errors.Items) : document;
    }

    private TDocument Read(StoredProfile stored)
    {
        TDocument document = JsonSerializer.Deserialize<TDocument>(stored.DocumentJson, WireFormat.Options)!;
        return WithRevision(document, stored.Revision, new UtcInstant(stored.SavedUtcTicks).ToString(), stored.IsDemo);
    }

    private TProfile Mapped(StoredProfile stored)
    {
        var errors = new FieldErrors();
        TDocument document = JsonSerializer.Deserialize<TDocument>(stored.DocumentJson, WireFormat.Options)!;
        return Map(document, stored.Revision, errors)
            ?? throw new InvalidDataException($"The stored {noun} {stored.Id}, revision {stored.Revision}, is not valid: {errors.Items[0].Detail}");
    }

    private RequestProblemException NoSuch(string id) => RequestProblemException.NotFound($"There is no {noun} {DocumentValidator.Quoted(id)}");

    private RequestProblemException Conflict(string id, int expected, int current) => new(
        StatusCodes.Status412PreconditionFailed,
        ProblemTypes.RevisionConflict,
        "It has changed since",
        $"{noun} {DocumentValidator.Quoted(id)} stands at revision {current}, not {expected}; read it again and repeat the change");
}
