using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace PassPlanner.Browser.Tests;

/// <summary>A page and the errors that it wrote to the console.</summary>
internal sealed class Tab(IPage page, List<string> errors) : IAsyncDisposable
{
    public IPage Page { get; } = page;

    /// <summary>The headline, once it is there.</summary>
    public ILocator Headline => Page.Locator("main h1").First;

    public void AssertNoErrors() => Assert.Empty(errors);

    /// <summary>WCAG 2.1 A and AA by axe-core.</summary>
    public async Task AssertAccessibleAsync()
    {
        AxeResult result = await Page.RunAxe(new AxeRunOptions { RunOnly = new RunOnlyOptions { Type = "tag", Values = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa"] } });
        Assert.True(result.Violations.Length == 0, string.Join("; ", result.Violations.Select(v => $"{v.Id}: {v.Nodes[0].Html}")));
    }

    public async ValueTask DisposeAsync() => await Page.Context.DisposeAsync();
}
