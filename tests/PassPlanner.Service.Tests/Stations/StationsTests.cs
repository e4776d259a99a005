using System.Net;
using System.Text.Json.Nodes;

namespace PassPlanner.Service.Tests.Stations;

public class StationsTests
{
    [Fact]
    public async Task A_station_is_added_under_an_identifier_made_from_its_name()
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, "/api/v1/stations", Samples.Station);
        Assert.Equal(HttpStatusCode.Created, response.StatusCode);
        Assert.Equal("/api/v1/stations/wirra-flat", response.Headers.Location!.ToString());
        Assert.Equal("\"1\"", response.Headers.ETag!.ToString());
        JsonNode read = await host.GetAsync("/api/v1/stations/wirra-flat");
        Assert.Equal(1, read["revision"]!.GetValue<int>());
        Assert.Equal("2022-01-23T00:00:00Z", read["savedUtc"]!.GetValue<string>());
        Assert.False(read["isDemo"]!.GetValue<bool>());
    }

    [Fact]
    public async Task Every_member_that_was_sent_is_read_back()
    {
        using var host = new ServiceHost();
        JsonNode sent = JsonNode.Parse(Samples.Station)!;
        JsonNode read = await host.PostAsync("/api/v1/stations", Samples.Station);
        foreach ((string name, JsonNode? value) in sent.AsObject())
        {
            Assert.True(JsonNode.DeepEquals(JsonNode.Parse(value!.ToJsonString()), read[name]), $"{name}: {value.ToJsonString()} became {read[name]?.ToJsonString()}");
        }
    }

    [Fact]
    public async Task A_second_station_of_the_same_identifier_is_refused()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        using HttpResponseMessage second = await host.SendAsync(HttpMethod.Post, "/api/v1/stations", Samples.Station);
        Assert.Equal(HttpStatusCode.Conflict, second.StatusCode);
        Assert.Contains("wirra-flat", (await ServiceHost.ProblemAsync(second))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_edit_makes_a_revision_and_keeps_the_earlier_one()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        string renamed = Samples.With(Samples.Station, "/name", "\"Wirra Hill\"");
        using HttpResponseMessage saved = await host.SendAsync(HttpMethod.Put, "/api/v1/stations/wirra-flat", renamed, "\"1\"");
        Assert.Equal(HttpStatusCode.OK, saved.StatusCode);
        Assert.Equal("\"2\"", saved.Headers.ETag!.ToString());
        Assert.Equal("Wirra Hill", (await host.GetAsync("/api/v1/stations/wirra-flat"))["name"]!.GetValue<string>());
        Assert.Equal("Wirra Flat", (await host.GetAsync("/api/v1/stations/wirra-flat/revisions/1"))["name"]!.GetValue<string>());
        JsonArray revisions = (await host.GetAsync("/api/v1/stations/wirra-flat/revisions"))["items"]!.AsArray();
        Assert.Equal([2, 1], revisions.Select(r => r!["revision"]!.GetValue<int>()));
    }

    [Fact]
    public async Task A_document_that_was_read_can_be_put_back_as_it_is()
    {
        using var host = new ServiceHost();
        string read = (await host.PostAsync("/api/v1/stations", Samples.Station)).ToJsonString();
        using HttpResponseMessage saved = await host.SendAsync(HttpMethod.Put, "/api/v1/stations/wirra-flat", read, "\"1\"");
        Assert.Equal(HttpStatusCode.OK, saved.StatusCode);
    }

    [Fact]
    public async Task An_edit_must_say_which_revision_it_changes()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        using HttpResponseMessage without = await host.SendAsync(HttpMethod.Put, "/api/v1/stations/wirra-flat", Samples.Station);
        Assert.Equal(HttpStatusCode.PreconditionRequired, without.StatusCode);
        await ServiceHost.ProblemAsync(without);
    }

    [Fact]
    public async Task Of_two_edits_of_one_revision_the_second_is_refused_and_nothing_is_lost()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        using HttpResponseMessage first = await host.SendAsync(HttpMethod.Put, "/api/v1/stations/wirra-flat", Samples.With(Samples.Station, "/name", "\"First\""), "\"1\"");
        using HttpResponseMessage second = await host.SendAsync(HttpMethod.Put, "/api/v1/stations/wirra-flat", Samples.With(Samples.Station, "/name", "\"Second\""), "\"1\"");
        Assert.Equal(HttpStatusCode.OK, first.StatusCode);
        Assert.Equal(HttpStatusCode.PreconditionFailed, second.StatusCode);
        Assert.Contains("revision 2", (await ServiceHost.ProblemAsync(second))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
        Assert.Equal("First", (await host.GetAsync("/api/v1/stations/wirra-flat"))["name"]!.GetValue<string>());
    }

    [Fact]
    public async Task Ten_edits_at_once_of_one_revision_make_one_new_revision()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        HttpResponseMessage[] answers = await Task.WhenAll(Enumerable.Range(0, 10).Select(i =>
            host.SendAsync(HttpMethod.Put, "/api/v1/stations/wirra-flat", Samples.With(Samples.Station, "/name", $"\"Edit {i}\""), "\"1\"")));
        Assert.Single(answers, a => a.StatusCode == HttpStatusCode.OK);
        Assert.Equal(9, answers.Count(a => a.StatusCode == HttpStatusCode.PreconditionFailed));
        Assert.Equal(2, (await host.GetAsync("/api/v1/stations/wirra-flat"))["revision"]!.GetValue<int>());
    }

    [Fact]
    public async Task A_deleted_station_is_gone()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        using HttpResponseMessage deleted = await host.SendAsync(HttpMethod.Delete, "/api/v1/stations/wirra-flat");
        Assert.Equal(HttpStatusCode.NoContent, deleted.StatusCode);
        using HttpResponseMessage read = await host.SendAsync(HttpMethod.Get, "/api/v1/stations/wirra-flat");
        Assert.Equal(HttpStatusCode.NotFound, read.StatusCode);
        await ServiceHost.ProblemAsync(read);
    }

    [Fact]
    public async Task A_list_goes_on_where_the_page_before_ended()
    {
        using var host = new ServiceHost();
        foreach (string name in new[] { "C", "A", "B" })
        {
            await host.PostAsync("/api/v1/stations", Samples.With(Samples.Station, "/name", $"\"{name}\""));
        }

        JsonNode first = await host.GetAsync("/api/v1/stations?limit=2");
        Assert.Equal(["a", "b"], first["items"]!.AsArray().Select(s => s!["id"]!.GetValue<string>()));
        JsonNode second = await host.GetAsync($"/api/v1/stations?limit=2&cursor={first["next"]}");
        Assert.Equal(["c"], second["items"]!.AsArray().Select(s => s!["id"]!.GetValue<string>()));
        Assert.Null(second["next"]);
    }

    [Theory]
    [InlineData("\"Žluťoučký kůň\"", "lu-ou-k-k")]
    [InlineData("\"北の駅\"", "unnamed")]
    [InlineData("\"--3.7 m dish!!--\"", "3-7-m-dish")]
    public async Task Any_name_makes_an_identifier(string name, string id)
    {
        using var host = new ServiceHost();
        JsonNode created = await host.PostAsync("/api/v1/stations", Samples.With(Samples.Station, "/name", name));
        Assert.Equal(id, created["id"]!.GetValue<string>());
    }
}
