using System.Net;
using System.Net.Http.Json;
using System.Text.Json.Nodes;
using PassPlanner.Tests;

namespace PassPlanner.Service.Tests.ElementSets;

public class ElementSetsTests
{
    private const string Url = "/api/v1/spacecraft/lark-1/element-sets";

    [Fact]
    public async Task An_element_set_is_kept_and_the_same_one_again_is_unchanged()
    {
        using ServiceHost host = await StartedAsync();
        Assert.Single((await UploadAsync(host, Url, Samples.TwoLines))["accepted"]!.AsArray());
        JsonNode again = await UploadAsync(host, Url, Samples.TwoLines);
        Assert.Empty(again["accepted"]!.AsArray());
        Assert.Single(again["unchanged"]!.AsArray());
        JsonNode set = Assert.Single((await host.GetAsync(Url))["items"]!.AsArray())!;
        Assert.Equal(46313, set["catalogNumber"]!.GetValue<int>());
        Assert.True(set["isServing"]!.GetValue<bool>());
        Assert.Equal("upload, two lines", set["source"]!.GetValue<string>());
    }

    [Fact]
    public async Task A_whole_file_is_matched_by_catalogue_number()
    {
        using ServiceHost host = await StartedAsync();
        JsonNode answer = await UploadAsync(host, "/api/v1/element-sets", await File.ReadAllTextAsync(ReferenceData.PathOf("orbit/spacecraft.tle")));
        Assert.Equal("lark-1", Assert.Single(answer["accepted"]!.AsArray())!["spacecraft"]!.GetValue<string>());
        Assert.Equal(9, answer["unmatched"]!.AsArray().Count);
        Assert.Empty(answer["refused"]!.AsArray());
    }

    [Theory]
    [InlineData("orbit/omm/vanguard1.json", "application/json")]
    [InlineData("orbit/omm/vanguard1.xml", "application/xml")]
    [InlineData("orbit/omm/vanguard1.csv", "text/csv")]
    [InlineData("orbit/omm/ccsds-502-annex-g7.kvn", "text/plain")]
    public async Task Messages_are_taken_in_every_form(string file, string contentType)
    {
        using ServiceHost host = await StartedAsync(catalogNumber: file.Contains("annex", StringComparison.Ordinal) ? "23581" : "5");
        JsonNode answer = await UploadAsync(host, Url, await File.ReadAllTextAsync(ReferenceData.PathOf(file)), contentType);
        Assert.Single(answer["accepted"]!.AsArray());
    }

    [Fact]
    public async Task A_bad_line_is_answered_with_its_place_and_the_rest_is_kept()
    {
        using ServiceHost host = await StartedAsync();
        string bad = Samples.TwoLines[..^1] + "x";
        JsonNode answer = await UploadAsync(host, Url, bad + "\n" + Samples.TwoLines);
        JsonNode refused = Assert.Single(answer["refused"]!.AsArray())!;
        Assert.Equal(2, refused["lineNumber"]!.GetValue<int>());
        Assert.Equal(69, refused["column"]!.GetValue<int>());
        Assert.Contains("checksum", refused["reason"]!.GetValue<string>(), StringComparison.Ordinal);
        Assert.Single(answer["accepted"]!.AsArray());
    }

    [Fact]
    public async Task A_wrong_checksum_is_taken_when_asked()
    {
        using ServiceHost host = await StartedAsync();
        string wrong = Samples.TwoLines[..^1] + (Samples.TwoLines[^1] == '0' ? '1' : '0');
        using HttpResponseMessage refused = await host.SendAsync(HttpMethod.Post, Url, wrong, contentType: "text/plain");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, refused.StatusCode);
        Assert.Single((await UploadAsync(host, Url + "?acceptBadChecksums=true", wrong))["accepted"]!.AsArray());
    }

    [Fact]
    public async Task A_text_without_an_element_set_is_refused_with_its_lines()
    {
        using ServiceHost host = await StartedAsync();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, Url, "good morning", contentType: "text/plain");
        Assert.Equal(HttpStatusCode.UnprocessableEntity, response.StatusCode);
        Assert.Contains("Line 1, column 1", (await ServiceHost.ProblemAsync(response))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_spacecraft_with_element_sets_is_deleted_only_when_asked_to_cascade()
    {
        using ServiceHost host = await StartedAsync();
        await UploadAsync(host, Url, Samples.TwoLines);
        using HttpResponseMessage refused = await host.SendAsync(HttpMethod.Delete, "/api/v1/spacecraft/lark-1");
        Assert.Equal(HttpStatusCode.Conflict, refused.StatusCode);
        Assert.Contains("1 element set;", (await ServiceHost.ProblemAsync(refused))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
        using HttpResponseMessage deleted = await host.SendAsync(HttpMethod.Delete, "/api/v1/spacecraft/lark-1?cascade=true");
        Assert.Equal(HttpStatusCode.NoContent, deleted.StatusCode);
    }

    private static async Task<JsonNode> UploadAsync(ServiceHost host, string url, string text, string contentType = "text/plain")
    {
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, url, text, contentType: contentType);
        Assert.True(response.IsSuccessStatusCode, await response.Content.ReadAsStringAsync());
        return (await response.Content.ReadFromJsonAsync<JsonNode>())!;
    }

    private static async Task<ServiceHost> StartedAsync(string catalogNumber = "46313")
    {
        var host = new ServiceHost();
        await host.PostAsync("/api/v1/spacecraft", Samples.With(Samples.Spacecraft, "/catalogNumber", catalogNumber));
        return host;
    }
}
