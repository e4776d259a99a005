using Microsoft.AspNetCore.Http.HttpResults;
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
        group.MapGet("", List).Problems(400);
        group.MapPost("", Create).Problems(400, 409);
        group.MapGet("/{id}", Get).Problems(404);
        group.MapPut("/{id}", Update).Problems(400, 404, 412, 428);
        group.MapDelete("/{id}", Delete).Problems(404, 409, 412);
        group.MapGet("/{id}/revisions", Revisions).Problems(404);
        group.MapGet("/{id}/revisions/{revision:int}", Revision).Problems(404);
    }

    /// <summary>Lists the stations</summary>
    private static Ok<ProfileList<StationDocument>> List(HttpRequest request, StationProfiles profiles, [AsParameters] ListParameters parameters) =>
        TypedResults.Ok(profiles.List(request.Query));

    /// <summary>Adds a station</summary>
    /// <remarks>The identifier is made from the name when left out.</remarks>
    private static Created<StationDocument> Create(Submitted<StationDocument> body, StationProfiles profiles, HttpResponse response)
    {
        StationDocument created = profiles.Create(body.Document);
        response.Headers.ETag = EntityTag.Of(created.Revision!.Value);
        return TypedResults.Created($"{Path}/{created.Id}", created);
    }

    /// <summary>Reads a station</summary>
    private static Ok<StationDocument> Get(string id, StationProfiles profiles, HttpResponse response)
    {
        StationDocument found = profiles.Get(id);
        response.Headers.ETag = EntityTag.Of(found.Revision!.Value);
        return TypedResults.Ok(found);
    }

    /// <summary>Changes a station</summary>
    /// <remarks>Needs If-Match with the ETag of the revision that was read; makes a new revision, and keeps the earlier ones.</remarks>
    private static Ok<StationDocument> Update(string id, Submitted<StationDocument> body, StationProfiles profiles, HttpRequest request, HttpResponse response)
    {
        StationDocument updated = profiles.Update(id, EntityTag.Required(request), body.Document);
        response.Headers.ETag = EntityTag.Of(updated.Revision!.Value);
        return TypedResults.Ok(updated);
    }

    /// <summary>Deletes a station</summary>
    private static NoContent Delete(string id, StationProfiles profiles, HttpRequest request, [AsParameters] DeleteParameters parameters)
    {
        profiles.Delete(id, request);
        return TypedResults.NoContent();
    }

    /// <summary>Lists the revisions of a station</summary>
    private static Ok<ProfileList<RevisionResponse>> Revisions(string id, StationProfiles profiles) => TypedResults.Ok(profiles.Revisions(id));

    /// <summary>Reads an earlier revision of a station</summary>
    private static Ok<StationDocument> Revision(string id, int revision, StationProfiles profiles) => TypedResults.Ok(profiles.GetRevision(id, revision));
}
