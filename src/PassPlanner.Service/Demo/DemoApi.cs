using Microsoft.AspNetCore.Http.HttpResults;
using PassPlanner.Service.Problems;

namespace PassPlanner.Service.Demo;

/// <summary>The demo scenario.</summary>
public static class DemoApi
{
    /// <summary>Maps the routes.</summary>
    public static void MapDemo(this IEndpointRouteBuilder routes) =>
        routes.MapDelete("/demo", Remove).WithTags("Demo").Problems(404);

    /// <summary>Removes the demo scenario</summary>
    /// <remarks>Its stations, spacecraft and element sets, in one transaction; nothing else.</remarks>
    private static NoContent Remove(DemoLoader demo) => demo.Remove()
        ? TypedResults.NoContent()
        : throw RequestProblemException.NotFound("There is no demo scenario");
}
