using System.Globalization;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Time.Testing;

namespace PassPlanner.Browser.Tests;

/// <summary>The real service on a real port and a database file of its own, at a clock that stands still.</summary>
internal sealed class LiveService : WebApplicationFactory<Program>
{
    private readonly string directory = Directory.CreateTempSubdirectory("pass-planner-browser-").FullName;
    private readonly bool demo;
    private bool isGone;

    public LiveService(bool demo = true)
    {
        this.demo = demo;
        UseKestrel(0);
        StartServer();
    }

    public Uri Address => ClientOptions.BaseAddress;

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseSetting("Data:Directory", directory);
        builder.UseSetting("Demo:Enabled", demo ? "true" : "false");
        builder.UseSetting("Logging:LogLevel:Default", "Warning");
        builder.ConfigureServices(services => services.AddSingleton<TimeProvider>(
            new FakeTimeProvider(DateTimeOffset.Parse("2026-03-18T04:12:20Z", CultureInfo.InvariantCulture))));
    }

    protected override void Dispose(bool disposing)
    {
        if (disposing && !isGone)
        {
            isGone = true;
            Services.GetRequiredService<PassPlanner.Store.PlannerDatabase>().ReleaseFile();
            base.Dispose(disposing);
            Directory.Delete(directory, recursive: true);
        }
    }
}
