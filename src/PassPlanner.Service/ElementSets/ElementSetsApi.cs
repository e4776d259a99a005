using Microsoft.AspNetCore.Http.HttpResults;
using Microsoft.AspNetCore.Http.Metadata;
using PassPlanner.Exchange.ElementSets;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Service.Passes;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Spacecraft;
using PassPlanner.Service.Validation;
using PassPlanner.Store;

namespace PassPlanner.Service.ElementSets;

/// <summary>Element sets: two-line text and orbit mean-elements messages (CCSDS 502.0-B) in KVN, XML, JSON and CSV.</summary>
public static class ElementSetsApi
{
    private const long GreatestBodyBytes = 32 * 1024 * 1024;

    private static readonly string[] ContentTypes = ["text/plain", "application/json", "application/xml", "text/csv"];

    /// <summary>Maps the routes.</summary>
    public static void MapElementSets(this IEndpointRouteBuilder routes)
    {
        routes.MapGet("/spacecraft/{id}/element-sets", List).WithTags("Element sets")
            .Problems(404);
        Accepting(routes.MapPost("/spacecraft/{id}/element-sets", AddToOne)).Problems(400, 404, 413, 422);
        Accepting(routes.MapPost("/element-sets", AddToAll)).Problems(400, 413, 422);
    }

    private static RouteHandlerBuilder Accepting(RouteHandlerBuilder route) => route
        .WithTags("Element sets")
        
        .WithMetadata(new AcceptsMetadata(ContentTypes, typeof(string)))
        .WithMetadata(new Microsoft.AspNetCore.Mvc.RequestSizeLimitAttribute(GreatestBodyBytes));

    /// <summary>Lists the element sets of a spacecraft</summary>
    /// <remarks>All of them, the latest epoch first.</remarks>
    private static Ok<ProfileList<ElementSetResponse>> List(string id, SpacecraftProfiles profiles, ElementSetStore store, TimeProvider clock)
    {
        profiles.Get(id);
        var nowUtc = UtcInstant.From(clock.GetUtcNow());
        IReadOnlyList<StoredElementSet> sets = store.List(id);
        StoredElementSet? serving = sets.FirstOrDefault(s => s.ElementSet.EpochUtc <= nowUtc) ?? (sets.Count > 0 ? sets[^1] : null);
        return TypedResults.Ok(new ProfileList<ElementSetResponse> { Items = [.. sets.Select(s => Describe(s, nowUtc, ReferenceEquals(s, serving)))] });
    }

    /// <summary>Adds element sets to a spacecraft</summary>
    /// <remarks>
    /// Every set must carry the spacecraft's catalogue number, when it has one. A bad line is answered with its number,
    /// column and reason; the others are kept.
    /// </remarks>
    private static async Task<Ok<ElementSetUpload>> AddToOne(
        string id,
        HttpRequest request,
        SpacecraftProfiles profiles,
        ElementSetStore store,
        TimeProvider clock,
        [AsParameters] UploadParameters parameters)
    {
        int? ownNumber = profiles.Get(id).CatalogNumber;
        return await AddAsync(request, store, clock, number => ownNumber is null || ownNumber == number ? [id] : []);
    }

    /// <summary>Adds a whole file of element sets</summary>
    /// <remarks>Sets are matched to spacecraft by catalogue number.</remarks>
    private static async Task<Ok<ElementSetUpload>> AddToAll(
        HttpRequest request, ElementSetStore store, TimeProvider clock, [AsParameters] UploadParameters parameters)
    {
        ILookup<int, string> byNumber = store.SpacecraftByCatalogNumber();
        return await AddAsync(request, store, clock, number => byNumber[number]);
    }

    private static async Task<Ok<ElementSetUpload>> AddAsync(
        HttpRequest request, ElementSetStore store, TimeProvider clock, Func<int, IEnumerable<string>> spacecraftOf)
    {
        var query = new QueryReader(request.Query);
        bool acceptBadChecksums = query.Flag("acceptBadChecksums");
        query.Finish("acceptBadChecksums");
        using var body = new MemoryStream();
        await request.Body.CopyToAsync(body, request.HttpContext.RequestAborted);
        body.Position = 0;
        ElementSetReading reading = ElementSetReader.Read(body, new ElementSetReaderOptions { AcceptBadChecksums = acceptBadChecksums });
        if (reading.Accepted.Count == 0)
        {
            throw new RequestProblemException(
                StatusCodes.Status422UnprocessableEntity,
                ProblemTypes.InvalidInput,
                "No element set could be read",
                reading.Refused.Count == 0 ? "The body holds no element set" : $"Line {reading.Refused[0].LineNumber}, column {reading.Refused[0].Column}: {reading.Refused[0].Reason}",
                [.. reading.Refused.Take(100).Select(r => new FieldError($"#/line/{r.LineNumber}", $"line {r.LineNumber}, column {r.Column}: {r.Reason}"))]);
        }

        var matched = reading.Accepted.SelectMany(set => spacecraftOf(set.ElementSet.CatalogNumber).Select(id => (Read: set, Id: id))).ToList();
        IReadOnlyList<bool> added = matched.Count == 0
            ? []
            : store.Add([.. matched.Select(m => (m.Id, m.Read.ElementSet))], $"upload, {WordsFor(reading.Format)}", UtcInstant.From(clock.GetUtcNow()));
        return TypedResults.Ok(new ElementSetUpload
        {
            Accepted = [.. matched.Where((_, i) => added[i]).Select(m => Describe(m.Read, m.Id))],
            Unchanged = [.. matched.Where((_, i) => !added[i]).Select(m => Describe(m.Read, m.Id))],
            Unmatched = [.. reading.Accepted.Where(set => !spacecraftOf(set.ElementSet.CatalogNumber).Any()).Select(set => Describe(set, null))],
            Refused = [.. reading.Refused.Select(r => new RefusedLineResponse { LineNumber = r.LineNumber, Column = r.Column, Reason = r.Reason })],
        });
    }

    private static string WordsFor(ElementSetFormat format) => format switch
    {
        ElementSetFormat.OmmKvn => "OMM KVN",
        ElementSetFormat.OmmXml => "OMM XML",
        ElementSetFormat.OmmJson => "OMM JSON",
        ElementSetFormat.OmmCsv => "OMM CSV",
        _ => "two lines",
    };

    private static UploadedSet Describe(ReadElementSet read, string? spacecraft) => new()
    {
        LineNumber = read.LineNumber,
        Spacecraft = spacecraft,
        CatalogNumber = read.ElementSet.CatalogNumber,
        Name = read.ElementSet.Name,
        EpochUtc = read.ElementSet.EpochUtc.ToString(),
    };

    private static ElementSetResponse Describe(StoredElementSet stored, UtcInstant nowUtc, bool isServing) => new()
    {
        EpochUtc = stored.ElementSet.EpochUtc.ToString(),
        AgeH = Math.Round(nowUtc.SecondsSince(stored.ElementSet.EpochUtc) / 3600, 3),
        LimitH = Math.Round(ElementSetAge.LimitHours(ElementSetAge.ClassOf(stored.ElementSet)), 1),
        CatalogNumber = stored.ElementSet.CatalogNumber,
        Name = stored.ElementSet.Name,
        MeanMotionRevPerDay = stored.ElementSet.MeanMotionRevPerDay,
        Eccentricity = stored.ElementSet.Eccentricity,
        InclinationDeg = stored.ElementSet.InclinationDeg,
        RightAscensionOfNodeDeg = stored.ElementSet.RightAscensionOfNodeDeg,
        ArgumentOfPerigeeDeg = stored.ElementSet.ArgumentOfPerigeeDeg,
        MeanAnomalyDeg = stored.ElementSet.MeanAnomalyDeg,
        BStarPerEarthRadius = stored.ElementSet.BStarPerEarthRadius,
        Source = stored.Source,
        ReceivedUtc = new UtcInstant(stored.ReceivedUtcTicks).ToString(),
        IsServing = isServing,
    };
}
