using PassPlanner.Store;

namespace PassPlanner.Service.Health;

/// <summary>Probes for whatever keeps the service running.</summary>
public static class HealthApi
{
    /// <summary>Maps the routes, outside the API.</summary>
    public static void MapHealth(this IEndpointRouteBuilder routes)
    {
        routes.MapGet("/health", Ready).ExcludeFromDescription();
        routes.MapGet("/health/live", () => TypedResults.Text("live")).ExcludeFromDescription();
        routes.MapGet("/health/ready", Ready).ExcludeFromDescription();
    }

    /// <summary>Whether the database answers.</summary>
    private static IResult Ready(PlannerDatabase database) => database.IsReadable()
        ? TypedResults.Text("ready")
        : TypedResults.Problem(detail: "The database cannot be read", statusCode: StatusCodes.Status503ServiceUnavailable, title: "Not ready");
}
