using System.Diagnostics.CodeAnalysis;
using Microsoft.Playwright;

namespace PassPlanner.Browser.Tests;

/// <summary>One Chromium for all tests; each test opens pages of its own.</summary>
[SuppressMessage("Design", "CA1001", Justification = "xunit calls IAsyncLifetime.DisposeAsync, which disposes of it.")]
public sealed class BrowserFixture : IAsyncLifetime
{
    private static readonly string[] Arguments =
    [
        "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync",
    ];

    private readonly LiveService demo = new();
    private IPlaywright? playwright;
    private IBrowser? browser;

    /// <summary>A service with the demo scenario, for tests that change nothing.</summary>
    internal LiveService Demo => demo;

    public async Task InitializeAsync()
    {
        playwright = await Playwright.CreateAsync();
        browser = await playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = Environment.GetEnvironmentVariable("CHROMIUM_PATH") is { Length: > 0 } path ? path : "/usr/bin/chromium",
            Args = Arguments,
        });
    }

    public async Task DisposeAsync()
    {
        if (browser is not null)
        {
            await browser.DisposeAsync();
        }

        playwright?.Dispose();
        demo.Dispose();
    }

    /// <summary>A new page of a service; what it writes to the console as an error is kept.</summary>
    internal async Task<Tab> OpenAsync(LiveService service, string path, int widthPx = 1440, ColorScheme scheme = ColorScheme.Light)
    {
        IBrowserContext context = await browser!.NewContextAsync(new BrowserNewContextOptions
        {
            BaseURL = service.Address.ToString(),
            ViewportSize = new ViewportSize { Width = widthPx, Height = widthPx < 600 ? 844 : 1000 },
            ColorScheme = scheme,
            ReducedMotion = ReducedMotion.Reduce,
        });
        IPage page = await context.NewPageAsync();
        var errors = new List<string>();
        page.Console += (_, message) =>
        {
            if (message.Type == "error")
            {
                errors.Add(message.Text);
            }
        };
        page.PageError += (_, error) => errors.Add(error);
        await page.GotoAsync(path);
        return new Tab(page, errors);
    }
}
