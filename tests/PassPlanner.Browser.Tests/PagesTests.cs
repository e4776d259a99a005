using System.Globalization;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;
using Microsoft.Playwright;

namespace PassPlanner.Browser.Tests;

[Collection("Browser")]
public partial class PagesTests(BrowserFixture browser)
{
    public static TheoryData<string, int, ColorScheme> AllPages
    {
        get
        {
            var pages = new TheoryData<string, int, ColorScheme>();
            foreach (string path in new[] { "/", "PASS", "/stations", "/stations/isenvarde", "/stations/new", "/spacecraft", "/spacecraft/lark-1", "/spacecraft/new", "/nowhere" })
            {
                foreach (int widthPx in new[] { 1440, 390 })
                {
                    pages.Add(path, widthPx, ColorScheme.Light);
                    pages.Add(path, widthPx, ColorScheme.Dark);
                }
            }

            return pages;
        }
    }

    [Theory]
    [MemberData(nameof(AllPages))]
    public async Task Every_page_is_accessible_fits_its_screen_and_writes_no_error(string path, int widthPx, ColorScheme scheme)
    {
        LiveService service = browser.Demo;
        await using Tab tab = await browser.OpenAsync(service, path == "PASS" ? await FirstPassAsync(service) : path, widthPx, scheme);
        await Assertions.Expect(tab.Headline).ToBeVisibleAsync();
        await tab.AssertAccessibleAsync();
        int overflowPx = await tab.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
        Assert.Equal(0, overflowPx);
        tab.AssertNoErrors();
    }

    [Fact]
    public async Task The_first_page_answers_with_the_passes_that_the_service_counts()
    {
        LiveService service = browser.Demo;
        await using Tab tab = await browser.OpenAsync(service, "/");
        await Assertions.Expect(tab.Headline).ToContainTextAsync(new Regex(@"^\d+ of \d+ passes close before 08:00"));
        await Assertions.Expect(tab.Page.Locator("a.lane-pass").First).ToBeVisibleAsync();
        int shown = int.Parse(FirstNumbers().Match(await tab.Headline.InnerTextAsync()).Groups[2].Value, CultureInfo.InvariantCulture);
        JsonNode answer = await JsonAsync(service, "/api/v1/passes?link=downlink&fromUtc=2026-03-18T04:12:20Z&toUtc=2026-03-18T08:00:00Z");
        int passes = answer["items"]!.AsArray().Select(p => $"{p!["spacecraft"]} {p["station"]} {p["aosUtc"]}").Distinct().Count();
        Assert.Equal(passes, shown);
    }

    [Fact]
    public async Task A_pass_is_opened_by_keyboard_and_shows_its_budget()
    {
        LiveService service = browser.Demo;
        await using Tab tab = await browser.OpenAsync(service, "/");
        ILocator pass = tab.Page.Locator("a.lane-pass[tabindex='0']");
        await pass.FocusAsync();
        await tab.Page.Keyboard.PressAsync("ArrowRight");
        await tab.Page.Keyboard.PressAsync("Enter");
        await tab.Page.WaitForURLAsync("**/pass/**");
        ILocator ladder = tab.Page.Locator(".ladder").First;
        await Assertions.Expect(ladder).ToContainTextAsync("Free-space loss");
        await Assertions.Expect(ladder).ToContainTextAsync("Margin at the cursor");
        tab.AssertNoErrors();
    }

    [Fact]
    public async Task The_cursor_moves_by_the_arrow_keys_and_the_budget_follows()
    {
        LiveService service = browser.Demo;
        await using Tab tab = await browser.OpenAsync(service, await FirstPassAsync(service));
        ILocator heading = tab.Page.GetByRole(AriaRole.Heading, new PageGetByRoleOptions { NameRegex = new Regex("^Budget at") });
        await Assertions.Expect(heading).ToBeVisibleAsync();
        string before = await heading.InnerTextAsync();
        await tab.Page.GetByRole(AriaRole.Slider).First.FocusAsync();
        await tab.Page.Keyboard.PressAsync("Home");
        await Assertions.Expect(heading).Not.ToHaveTextAsync(before);
        string atStart = await heading.InnerTextAsync();
        await tab.Page.Keyboard.PressAsync("ArrowRight");
        await Assertions.Expect(heading).Not.ToHaveTextAsync(atStart);
    }

    [Fact]
    public async Task Closing_only_leaves_out_the_passes_that_do_not_close()
    {
        LiveService service = browser.Demo;
        await using Tab tab = await browser.OpenAsync(service, "/");
        await tab.Page.GetByRole(AriaRole.Radio, new PageGetByRoleOptions { Name = "24\u00a0h" }).CheckAsync();
        ILocator shortfalls = tab.Page.Locator("tbody").GetByText("Does not close", new LocatorGetByTextOptions { Exact = true });
        await Assertions.Expect(shortfalls.First).ToBeVisibleAsync();
        await tab.Page.GetByRole(AriaRole.Radio, new PageGetByRoleOptions { Name = "Closing only" }).CheckAsync();
        await Assertions.Expect(shortfalls).ToHaveCountAsync(0);
    }

    [Fact]
    public async Task The_demo_is_removed_by_its_button_and_the_page_says_how_to_begin()
    {
        using var service = new LiveService();
        await using Tab tab = await browser.OpenAsync(service, "/");
        await tab.Page.GetByRole(AriaRole.Button, new PageGetByRoleOptions { Name = "Remove demo" }).ClickAsync();
        await tab.Page.GetByRole(AriaRole.Dialog).GetByRole(AriaRole.Button, new LocatorGetByRoleOptions { NameRegex = new Regex("Remove") }).ClickAsync();
        await Assertions.Expect(tab.Page.GetByText("No stations yet")).ToBeVisibleAsync();
        Assert.False((await JsonAsync(service, "/api/v1/status"))["hasDemo"]!.GetValue<bool>());
        tab.AssertNoErrors();
    }

    [Fact]
    public async Task A_station_is_added_through_the_form_and_stays_after_a_reload()
    {
        using var service = new LiveService(demo: false);
        await using Tab tab = await browser.OpenAsync(service, "/stations/new");
        await tab.Page.GetByLabel("Name", new PageGetByLabelOptions { Exact = true }).First.FillAsync("Harbour Hill");
        await tab.Page.GetByLabel(new Regex("^Latitude")).FillAsync("54.3");
        await tab.Page.GetByLabel(new Regex("^Longitude")).FillAsync("10.1");
        await tab.Page.GetByRole(AriaRole.Button, new PageGetByRoleOptions { NameRegex = new Regex("^Save|^Add station") }).First.ClickAsync();
        await tab.Page.WaitForURLAsync("**/stations/harbour-hill");
        await tab.Page.GotoAsync("/stations");
        await Assertions.Expect(tab.Page.GetByText("Harbour Hill")).ToBeVisibleAsync();
        await tab.Page.ReloadAsync();
        await Assertions.Expect(tab.Page.GetByText("Harbour Hill")).ToBeVisibleAsync();
    }

    [Fact]
    public async Task What_the_service_refuses_stands_at_its_field()
    {
        using var service = new LiveService(demo: false);
        await using Tab tab = await browser.OpenAsync(service, "/stations/new");
        await tab.Page.GetByLabel("Name", new PageGetByLabelOptions { Exact = true }).First.FillAsync("Harbour Hill");
        await tab.Page.GetByLabel(new Regex("^Latitude")).FillAsync("91");
        await tab.Page.GetByLabel(new Regex("^Longitude")).FillAsync("10.1");
        await tab.Page.GetByRole(AriaRole.Button, new PageGetByRoleOptions { NameRegex = new Regex("^Save|^Add station") }).First.ClickAsync();
        await Assertions.Expect(tab.Page.GetByText(new Regex("91.*from .90 to 90|latitudeDeg is 91")).First).ToBeVisibleAsync();
        Assert.Empty((await JsonAsync(service, "/api/v1/stations"))["items"]!.AsArray());
    }

    [Fact]
    public async Task Of_two_editors_the_second_sees_the_first_and_loses_nothing()
    {
        using var service = new LiveService();
        await using Tab first = await browser.OpenAsync(service, "/stations/oruwai");
        await using Tab second = await browser.OpenAsync(service, "/stations/oruwai");
        foreach ((Tab tab, string name) in new[] { (first, "Oruwai One"), (second, "Oruwai Two") })
        {
            await tab.Page.GetByLabel("Name", new PageGetByLabelOptions { Exact = true }).First.FillAsync(name);
            await tab.Page.GetByRole(AriaRole.Button, new PageGetByRoleOptions { NameRegex = new Regex("^Save revision") }).ClickAsync();
            await Assertions.Expect(tab.Page.GetByText(new Regex(tab == first ? "Revision 2" : "revision 2")).First).ToBeVisibleAsync();
        }

        Assert.Equal("Oruwai One", (await JsonAsync(service, "/api/v1/stations/oruwai"))["name"]!.GetValue<string>());
        Assert.Equal("Oruwai Two", await second.Page.GetByLabel("Name", new PageGetByLabelOptions { Exact = true }).First.InputValueAsync());
    }

    [Fact]
    public async Task A_need_whose_kind_is_changed_is_saved()
    {
        using var service = new LiveService();
        await using Tab tab = await browser.OpenAsync(service, "/spacecraft/lark-2");
        await tab.Page.GetByLabel("Kind of need").SelectOptionAsync("longestGap");
        await tab.Page.GetByRole(AriaRole.Button, new PageGetByRoleOptions { NameRegex = new Regex("^Save revision") }).ClickAsync();
        await Assertions.Expect(tab.Page.GetByText(new Regex("Revision 2")).First).ToBeVisibleAsync();
        JsonNode need = Assert.Single((await JsonAsync(service, "/api/v1/spacecraft/lark-2"))["needs"]!.AsArray())!;
        Assert.Equal("longestGap", need["kind"]!.GetValue<string>());
        Assert.Null(need["bytes"]);
    }

    [Fact]
    public async Task A_page_of_a_pass_is_found_by_an_instant_with_a_fraction()
    {
        using var service = new LiveService();
        string path = (await FirstPassAsync(service)).Replace("Z?", ".250Z?", StringComparison.Ordinal);
        await using Tab tab = await browser.OpenAsync(service, path);
        await Assertions.Expect(tab.Headline).ToContainTextAsync("Closes");
    }

    [Fact]
    public async Task Element_sets_are_pasted_and_what_was_understood_is_shown()
    {
        using var service = new LiveService();
        await using Tab tab = await browser.OpenAsync(service, "/spacecraft/lark-1");
        await tab.Page.Locator("#element-set-text").FillAsync("good morning");
        await tab.Page.GetByRole(AriaRole.Button, new PageGetByRoleOptions { NameRegex = new Regex("^Load element sets$") }).ClickAsync();
        await Assertions.Expect(tab.Page.GetByText(new Regex("neither line 1 nor line 2")).First).ToBeVisibleAsync();
    }

    private static async Task<string> FirstPassAsync(LiveService service)
    {
        JsonNode answer = await JsonAsync(service, "/api/v1/passes?link=downlink&closes=true&limit=1");
        return answer["items"]![0]!["passUrl"]!.GetValue<string>().Replace("/api/v1/passes/", "/pass/", StringComparison.Ordinal);
    }

    private static async Task<JsonNode> JsonAsync(LiveService service, string url)
    {
        using var client = new HttpClient { BaseAddress = service.Address };
        return JsonNode.Parse(await client.GetStringAsync(url))!;
    }

    [GeneratedRegex(@"^(\d+) of (\d+)")]
    private static partial Regex FirstNumbers();
}
