using Microsoft.Extensions.FileProviders;
using PassPlanner.Service.Problems;

namespace PassPlanner.Service.Web;

/// <summary>Serves the built front end, and its first page for every address that the front end routes itself.</summary>
public static class Dashboard
{
    /// <summary>Serves the files: those with a hash in their name for good, the others checked at each visit.</summary>
    public static void UseDashboard(this WebApplication app)
    {
        app.UseDefaultFiles();
        app.UseStaticFiles(new StaticFileOptions
        {
            OnPrepareResponse = context => context.Context.Response.Headers.CacheControl =
                context.Context.Request.Path.StartsWithSegments("/assets", StringComparison.Ordinal)
                    ? "public, max-age=31536000, immutable"
                    : "no-cache",
        });
    }

    /// <summary>Answers every page that the front end routes itself with the first page.</summary>
    public static void MapDashboardPages(this WebApplication app) => app.MapGet(
        "{*path:regex(^(?:pass/.*|(?!api|openapi|health)[^.]*)$)}",
        (HttpContext context) =>
        {
            IFileInfo index = app.Environment.WebRootFileProvider.GetFileInfo("index.html");
            if (!index.Exists)
            {
                throw RequestProblemException.NotFound("The front end has not been built");
            }

            context.Response.Headers.CacheControl = "no-cache";
            return TypedResults.Stream(index.CreateReadStream(), "text/html; charset=utf-8");
        }).ExcludeFromDescription();
}
