using Microsoft.Extensions.FileProviders;
using PassPlanner.Service.Problems;

namespace PassPlanner.Service.Web;

/// <summary>Serves the built front end, and its first page for every address that the front end routes itself.</summary>
public static class Dashboard
{
    private static readonly string[] NotPages = ["/api", "/openapi", "/health"];

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

    /// <summary>Answers pages with the first page, and anything else that does not exist with a problem.</summary>
    public static void MapDashboardFallback(this WebApplication app) => app.MapFallback((HttpContext context) =>
    {
        PathString path = context.Request.Path;
        IFileInfo index = app.Environment.WebRootFileProvider.GetFileInfo("index.html");
        bool isPage = HttpMethods.IsGet(context.Request.Method)
            && !Path.HasExtension(path)
            && !NotPages.Any(prefix => path.StartsWithSegments(prefix, StringComparison.Ordinal));
        if (!isPage || !index.Exists)
        {
            throw RequestProblemException.NotFound($"There is nothing at {path}");
        }

        context.Response.Headers.CacheControl = "no-cache";
        return TypedResults.Stream(index.CreateReadStream(), "text/html; charset=utf-8");
    }).ExcludeFromDescription();
}
