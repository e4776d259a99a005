namespace PassPlanner.Browser.Tests;

/// <summary>All browser tests share one Chromium and run one after another.</summary>
[CollectionDefinition("Browser")]
public sealed class SharedBrowser : ICollectionFixture<BrowserFixture>
{
}
