using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Problems;

/// <summary>Tells the API description which problems a route answers with.</summary>
public static class ProblemEndpoints
{
    private const string ContentType = "application/problem+json";

    /// <summary>Declares problems by status.</summary>
    public static RouteHandlerBuilder Problems(this RouteHandlerBuilder route, params int[] statuses)
    {
        foreach (int status in statuses)
        {
            route.Produces<ProblemDetails>(status, ContentType);
        }

        return route;
    }
}
