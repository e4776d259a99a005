using System.Globalization;
using System.Net;
using System.Text.Json.Nodes;
using Xunit.Abstractions;

namespace PassPlanner.Service.Tests.Demo;

public class DemoTests(ITestOutputHelper output)
{
    [Fact]
    public async Task An_empty_database_gets_the_scenario_and_it_is_marked()
    {
        using var host = new ServiceHost(demo: true);
        Assert.True((await host.GetAsync("/api/v1/status"))["hasDemo"]!.GetValue<bool>());
        JsonArray stations = (await host.GetAsync("/api/v1/stations"))["items"]!.AsArray();
        JsonArray spacecraft = (await host.GetAsync("/api/v1/spacecraft"))["items"]!.AsArray();
        Assert.Equal((3, 5), (stations.Count, spacecraft.Count));
        Assert.All(stations.Concat(spacecraft), p => Assert.True(p!["isDemo"]!.GetValue<bool>()));
    }

    [Fact]
    public async Task Without_the_scenario_the_service_starts_empty()
    {
        using var host = new ServiceHost(demo: false);
        Assert.False((await host.GetAsync("/api/v1/status"))["hasDemo"]!.GetValue<bool>());
        Assert.Empty((await host.GetAsync("/api/v1/stations"))["items"]!.AsArray());
    }

    /// <summary>Whatever the date, some passes close, some close in part, some do not.</summary>
    [Theory]
    [InlineData("2026-01-01T00:00:00Z")]
    [InlineData("2026-06-21T13:00:00Z")]
    [InlineData("2027-12-31T23:59:00Z")]
    [InlineData("2031-03-03T05:30:00Z")]
    public async Task Each_day_of_the_scenario_has_passes_of_every_verdict(string nowUtc)
    {
        using var host = new ServiceHost(demo: true, nowUtc);
        JsonNode answer = await host.GetAsync("/api/v1/passes?limit=1000");
        JsonNode counts = answer["counts"]!;
        output.WriteLine($"{nowUtc}: {counts.ToJsonString()}");
        Assert.True(counts["closes"]!.GetValue<int>() > 10);
        Assert.True(counts["closesInPart"]!.GetValue<int>() > 10);
        Assert.True(counts["doesNotClose"]!.GetValue<int>() > 10);
        Assert.All(answer["items"]!.AsArray(), p => Assert.False(p!["elementSet"]!["isStale"]!.GetValue<bool>()));
    }

    [Fact]
    public async Task The_scenario_never_goes_stale_while_the_service_runs()
    {
        using var host = new ServiceHost(demo: true);
        for (int month = 0; month < 3; month++)
        {
            host.Clock.Advance(TimeSpan.FromDays(30));
            JsonNode answer = await host.GetAsync("/api/v1/passes");
            Assert.NotEmpty(answer["items"]!.AsArray());
            Assert.All(answer["items"]!.AsArray(), p => Assert.False(p!["elementSet"]!["isStale"]!.GetValue<bool>()));
        }
    }

    /// <summary>The element sets of two days describe one orbit: at midnight they put a spacecraft at nearly the same place.</summary>
    [Fact]
    public void Element_sets_of_two_days_describe_one_orbit()
    {
        foreach ((string id, Physics.Orbits.ElementSet today) in PassPlanner.Service.Demo.DemoScenario.ElementSetsFor(Physics.Time.UtcInstant.FromCalendar(2026, 8, 1)))
        {
            var tomorrow = PassPlanner.Service.Demo.DemoScenario.ElementSetsFor(Physics.Time.UtcInstant.FromCalendar(2026, 8, 2)).Single(s => s.SpacecraftId == id).ElementSet;
            new Physics.Orbits.Sgp4Propagator(today).TryPropagate(1440, out Physics.Frames.TemeState before);
            new Physics.Orbits.Sgp4Propagator(tomorrow).TryPropagate(0, out Physics.Frames.TemeState after);
            double apartKm = (before.PositionKm - after.PositionKm).Norm;
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{id}: {apartKm:0} km"));
            Assert.InRange(apartKm, 0, 300);
        }
    }

    [Fact]
    public async Task One_request_removes_the_scenario_and_nothing_else()
    {
        using var host = new ServiceHost(demo: true);
        await host.PostAsync("/api/v1/stations", Samples.Station);
        using HttpResponseMessage removed = await host.SendAsync(HttpMethod.Delete, "/api/v1/demo");
        Assert.Equal(HttpStatusCode.NoContent, removed.StatusCode);
        Assert.Equal("wirra-flat", Assert.Single((await host.GetAsync("/api/v1/stations"))["items"]!.AsArray())!["id"]!.GetValue<string>());
        Assert.Empty((await host.GetAsync("/api/v1/spacecraft"))["items"]!.AsArray());
        using HttpResponseMessage again = await host.SendAsync(HttpMethod.Delete, "/api/v1/demo");
        Assert.Equal(HttpStatusCode.NotFound, again.StatusCode);
    }
}
