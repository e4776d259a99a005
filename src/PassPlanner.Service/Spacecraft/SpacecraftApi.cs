using Microsoft.AspNetCore.Http.HttpResults;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>Spacecraft.</summary>
public static class SpacecraftApi
{
    private const string Path = "/api/v1/spacecraft";

    /// <summary>Maps the routes.</summary>
    public static void MapSpacecraft(this IEndpointRouteBuilder routes)
    {
        RouteGroupBuilder group = routes.MapGroup("/spacecraft").WithTags("Spacecraft");
        group.MapGet("", List).Problems(400);
        group.MapPost("", Create).Problems(400, 409);
        group.MapGet("/{id}", Get).Problems(404);
        group.MapPut("/{id}", Update).Problems(400, 404, 412, 428);
        group.MapDelete("/{id}", Delete).Problems(404, 409, 412);
        group.MapGet("/{id}/revisions", Revisions).Problems(404);
        group.MapGet("/{id}/revisions/{revision:int}", Revision).Problems(404);
    }

    /// <summary>Lists the spacecraft</summary>
    private static Ok<ProfileList<SpacecraftDocument>> List(HttpRequest request, SpacecraftProfiles profiles, [AsParameters] ListParameters parameters) =>
        TypedResults.Ok(profiles.List(request.Query));

    /// <summary>Adds a spacecraft</summary>
    /// <remarks>The identifier is made from the name when left out. Element sets are posted to its own address.</remarks>
    private static Created<SpacecraftDocument> Create(Submitted<SpacecraftDocument> body, SpacecraftProfiles profiles, HttpResponse response)
    {
        SpacecraftDocument created = profiles.Create(body.Document);
        response.Headers.ETag = EntityTag.Of(created.Revision!.Value);
        return TypedResults.Created($"{Path}/{created.Id}", created);
    }

    /// <summary>Reads a spacecraft</summary>
    private static Ok<SpacecraftDocument> Get(string id, SpacecraftProfiles profiles, HttpResponse response)
    {
        SpacecraftDocument found = profiles.Get(id);
        response.Headers.ETag = EntityTag.Of(found.Revision!.Value);
        return TypedResults.Ok(found);
    }

    /// <summary>Changes a spacecraft</summary>
    /// <remarks>Needs If-Match with the ETag of the revision that was read; makes a new revision, and keeps the earlier ones.</remarks>
    private static Ok<SpacecraftDocument> Update(
        string id, Submitted<SpacecraftDocument> body, SpacecraftProfiles profiles, HttpRequest request, HttpResponse response)
    {
        SpacecraftDocument updated = profiles.Update(id, EntityTag.Required(request), body.Document);
        response.Headers.ETag = EntityTag.Of(updated.Revision!.Value);
        return TypedResults.Ok(updated);
    }

    /// <summary>Deletes a spacecraft</summary>
    /// <remarks>Refused while it has element sets, unless cascade=true.</remarks>
    private static NoContent Delete(string id, SpacecraftProfiles profiles, HttpRequest request, [AsParameters] DeleteParameters parameters)
    {
        profiles.Delete(id, request);
        return TypedResults.NoContent();
    }

    /// <summary>Lists the revisions of a spacecraft</summary>
    private static Ok<ProfileList<RevisionResponse>> Revisions(string id, SpacecraftProfiles profiles) => TypedResults.Ok(profiles.Revisions(id));

    /// <summary>Reads an earlier revision of a spacecraft</summary>
    private static Ok<SpacecraftDocument> Revision(string id, int revision, SpacecraftProfiles profiles) => TypedResults.Ok(profiles.GetRevision(id, revision));
}
