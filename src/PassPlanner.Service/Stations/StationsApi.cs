using PassPlanner.Service.Problems;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>Stations.</summary>
public static class StationsApi
{
    private const string Path = "/api/v1/stations";

    /// <summary>Maps the routes.</summary>
    public static void MapStations(this IEndpointRouteBuilder routes)
    {
        RouteGroupBuilder group = routes.MapGroup("/stations").WithTags("Stations");
        group.MapGet("", List).Produces<ProfileList<StationDocument>>().Problems(400);
        group.MapPost("", Create).Produces<StationDocument>(201).Problems(400, 409);
        group.MapGet("/{id}", Get).Produces<StationDocument>().Problems(404);
        group.MapPut("/{id}", Update).Produces<StationDocument>().Problems(400, 404, 412, 428);
        group.MapDelete("/{id}", Delete).Produces(204).Problems(404, 409, 412);
        group.MapGet("/{id}/revisions", Revisions).Produces<ProfileList<RevisionResponse>>().Problems(404);
        group.MapGet("/{id}/revisions/{revision:int}", Revision).Produces<StationDocument>().Problems(404);
    }

    /// <summary>Lists the stations</summary>
    private static IResult List(HttpRequest request, StationProfiles profiles, [AsParameters] ListParameters parameters) =>
        TypedResults.Ok(profiles.List(request.Query));

    /// <summary>Adds a station</summary>
    /// <remarks>The identifier is made from the name when left out.</remarks>
    private static IResult Create(Submitted<StationDocument> body, StationProfiles profiles, HttpResponse response)
    {
        StationDocument created = profiles.Create(body.Document);
        response.Headers.ETag = EntityTag.Of(created.Revision!.Value);
        return TypedResults.Created($"{Path}/{created.Id}", created);
    }

    /// <summary>Reads a station</summary>
    private static IResult Get(string id, StationProfiles profiles, HttpResponse response)
    {
        StationDocument found = profiles.Get(id);
        response.Headers.ETag = EntityTag.Of(found.Revision!.Value);
        return TypedResults.Ok(found);
    }

    /// <summary>Changes a station</summary>
    /// <remarks>Needs If-Match with the ETag of the revision that was read; makes a new revision, and keeps the earlier ones.</remarks>
    private static IResult Update(string id, Submitted<StationDocument> body, StationProfiles profiles, HttpRequest request, HttpResponse response)
    {
        StationDocument updated = profiles.Update(id, EntityTag.Required(request), body.Document);
        response.Headers.ETag = EntityTag.Of(updated.Revision!.Value);
        return TypedResults.Ok(updated);
    }

    /// <summary>Deletes a station</summary>
    private static IResult Delete(string id, StationProfiles profiles, HttpRequest request, [AsParameters] DeleteParameters parameters)
    {
        profiles.Delete(id, request);
        return TypedResults.NoContent();
    }

    /// <summary>Lists the revisions of a station</summary>
    private static IResult Revisions(string id, StationProfiles profiles) => TypedResults.Ok(profiles.Revisions(id));

    /// <summary>Reads an earlier revision of a station</summary>
    private static IResult Revision(string id, int revision, StationProfiles profiles) => TypedResults.Ok(profiles.GetRevision(id, revision));
}
