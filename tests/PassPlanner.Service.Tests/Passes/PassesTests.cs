using System.Globalization;
using System.Net;
using System.Text.Json.Nodes;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Service.Tests.Passes;

/// <summary>The main job over HTTP: a station, a spacecraft with a real element set, its passes.</summary>
public class PassesTests(ITestOutputHelper output)
{
    private const string Period = "fromUtc=2022-01-23T00:00:00Z&toUtc=2022-01-25T00:00:00Z";
    private const double EdgeS = 0.02;
    private const double HighestS = 0.05;
    private const double AngleDeg = 0.0005;
    private const double RangeKm = 0.002;

    /// <summary>Validation. Source: orbit/passes-ut1-equals-utc.csv (Skyfield and sgp4; orbit/SOURCE.md), 46313 over WIRR at mask 0.</summary>
    [Fact]
    public async Task Passes_agree_with_the_reference_table()
    {
        using ServiceHost host = await StartedAsync();
        List<JsonNode> passes = await PassesAsync(host, Period + "&link=downlink");
        List<IReadOnlyDictionary<string, string>> expected = [.. ReferenceData.Rows("orbit/passes-ut1-equals-utc.csv")
            .Where(r => r["catalog_number"] == "46313" && r["station_id"] == "WIRR" && r["mask_deg"] == "0.0")];
        output.WriteLine($"{expected.Count} passes");
        Assert.NotEmpty(expected);
        Assert.Equal(expected.Count, passes.Count);
        foreach ((IReadOnlyDictionary<string, string> row, JsonNode pass) in expected.Zip(passes))
        {
            Assert.Equal(0, Seconds(pass["aosUtc"]!) - Seconds(row["aos_utc"]), EdgeS);
            Assert.Equal(0, Seconds(pass["losUtc"]!) - Seconds(row["los_utc"]), EdgeS);
            Assert.Equal(0, Seconds(pass["maximumElevationUtc"]!) - Seconds(row["tca_utc"]), HighestS);
            Assert.Equal(0, Seconds(pass["closestApproachUtc"]!) - Seconds(row["closest_utc"]), HighestS);
            Assert.Equal(double.Parse(row["max_elevation_deg"], CultureInfo.InvariantCulture), pass["maximumElevationDeg"]!.GetValue<double>(), AngleDeg);
            Assert.Equal(double.Parse(row["closest_range_km"], CultureInfo.InvariantCulture), pass["closestRangeKm"]!.GetValue<double>(), RangeKm);
        }
    }

    [Fact]
    public async Task The_terms_of_a_budget_add_up_to_the_margin_of_the_timeline()
    {
        using ServiceHost host = await StartedAsync();
        foreach (string link in new[] { "downlink", "uplink" })
        {
            foreach (JsonNode pass in (await PassesAsync(host, Period + "&link=" + link)).Take(3))
            {
                string url = pass["passUrl"]!.GetValue<string>();
                JsonNode timeline = await host.GetAsync(pass["timelineUrl"]!.GetValue<string>());
                double start = Seconds(timeline["startUtc"]!);
                for (int i = 0; i < Column(timeline, "marginDb").Length; i += 97)
                {
                    string at = Instant(start + i);
                    for (int waveform = 0; waveform < timeline["waveforms"]!.AsArray().Count; waveform++)
                    {
                        JsonNode budget = await host.GetAsync(Part(url, "/budget") + $"&atUtc={at}&waveform={waveform}");
                        double sum = budget["lines"]!.AsArray().Where(l => l!["kind"]!.GetValue<string>() == "term").Sum(l => l!["valueDb"]!.GetValue<double>());
                        double margin = timeline["waveforms"]![waveform]!["marginDb"]![i]!.GetValue<double>();
                        Assert.Equal(margin, sum, 1e-9);
                        Assert.Equal(margin, budget["marginDb"]!.GetValue<double>(), 1e-9);
                        Assert.All(budget["lines"]!.AsArray(), l => Assert.False(string.IsNullOrEmpty(l!["source"]!.GetValue<string>()) || string.IsNullOrEmpty(l["unit"]!.GetValue<string>())));
                    }
                }
            }
        }
    }

    [Fact]
    public async Task Windows_yield_and_verdict_follow_from_the_timeline_by_their_definitions()
    {
        using ServiceHost host = await StartedAsync();
        foreach (JsonNode pass in await PassesAsync(host, Period))
        {
            JsonNode timeline = await host.GetAsync(pass["timelineUrl"]!.GetValue<string>());
            (double requiredDb, int acquisitionS) = pass["link"]!["direction"]!.GetValue<string>() == "downlink" ? (3.0, 10) : (3.0, 0);
            double[] marginDb = Column(timeline, "marginDb");
            double[] efficiency = pass["link"]!["direction"]!.GetValue<string>() == "downlink" ? [1, 0.9] : [1];
            int first = Array.FindIndex(marginDb, m => m >= requiredDb);
            bool[] usable = [.. marginDb.Select((m, i) => m >= requiredDb && first >= 0 && i - first >= acquisitionS)];
            double[] waveform = Column(timeline, "waveform");
            double bits = 0;
            for (int i = 0; i < usable.Length; i++)
            {
                Assert.Equal(usable[i] ? 1 : 0, Column(timeline, "usable")[i]);
                bits += usable[i] ? timeline["waveforms"]![(int)waveform[i]]!["bitRateBps"]!.GetValue<double>() * efficiency[(int)waveform[i]] : 0;
            }

            Assert.Equal(usable.Count(u => u), pass["usableS"]!.GetValue<int>());
            Assert.Equal(bits / 8, pass["yieldBytes"]!.GetValue<double>(), 1.0);
            double[] elevationDeg = Column(timeline, "elevationDeg");
            bool[] counted = [.. elevationDeg.Select(e => e >= 10)];
            counted = counted.Any(c => c) ? counted : [.. counted.Select(_ => true)];
            bool all = marginDb.Zip(counted).All(x => !x.Second || x.First >= requiredDb);
            string verdict = !usable.Any(u => u) ? "doesNotClose" : all ? "closes" : "closesInPart";
            Assert.Equal(verdict, pass["verdict"]!.GetValue<string>());
            Assert.Equal(verdict == "closes", pass["limitingCause"]!.GetValue<string>().Length == 0);
            Assert.Equal(marginDb.Max(), pass["highestMarginDb"]!.GetValue<double>(), 1e-9);
            Assert.Equal(marginDb.Min(), pass["lowestMarginDb"]!.GetValue<double>(), 1e-9);
            double windows = pass["usableWindows"]!.AsArray().Sum(w => Seconds(w!["endUtc"]!) - Seconds(w["startUtc"]!));
            Assert.Equal(usable.Count(u => u), windows, 1e-6);
        }
    }

    [Fact]
    public async Task Samples_stand_on_whole_seconds_within_the_pass_and_above_the_mask()
    {
        using ServiceHost host = await StartedAsync();
        foreach (JsonNode pass in await PassesAsync(host, Period + "&link=downlink"))
        {
            JsonNode timeline = await host.GetAsync(pass["timelineUrl"]!.GetValue<string>());
            double start = Seconds(timeline["startUtc"]!);
            int count = Column(timeline, "elevationDeg").Length;
            Assert.Equal(Math.Round(start), start, 1e-6);
            Assert.InRange(start - Seconds(pass["aosUtc"]!), 0, 1);
            Assert.InRange(Seconds(pass["losUtc"]!) - (start + count - 1), 0, 1.001);
            Assert.All(Column(timeline, "elevationDeg"), e => Assert.InRange(e, -1e-6, 90));
        }
    }

    [Fact]
    public async Task Doppler_and_its_rate_follow_the_range_rate()
    {
        using ServiceHost host = await StartedAsync();
        JsonNode pass = (await PassesAsync(host, Period + "&link=downlink"))[0];
        JsonNode timeline = await host.GetAsync(pass["timelineUrl"]!.GetValue<string>());
        double[] doppler = Column(timeline, "dopplerHz");
        double[] rate = Column(timeline, "dopplerRateHzPerS");
        double[] rangeRate = Column(timeline, "rangeRateKmPerS");
        for (int i = 1; i < doppler.Length - 1; i++)
        {
            Assert.Equal(-8.2e9 * rangeRate[i] / 299792.458, doppler[i], 0.1);
            Assert.Equal((doppler[i + 1] - doppler[i - 1]) / 2, rate[i], 1.0);
        }
    }

    [Fact]
    public async Task A_timeline_as_CSV_has_the_columns_of_the_JSON()
    {
        using ServiceHost host = await StartedAsync();
        string url = (await PassesAsync(host, Period + "&link=downlink"))[0]["timelineUrl"]!.GetValue<string>();
        JsonNode timeline = await host.GetAsync(url);
        string[] lines = (await host.Client.GetStringAsync(url + "&format=csv")).Split('\n', StringSplitOptions.RemoveEmptyEntries);
        string[] header = lines[0].Split(',');
        Assert.Equal("utc", header[0]);
        Assert.Equal(Column(timeline, "marginDb").Length, lines.Length - 1);
        foreach ((string name, JsonNode? value) in timeline.AsObject().Where(c => c.Value is JsonArray && c.Key != "waveforms"))
        {
            int index = Array.IndexOf(header, name);
            Assert.True(index > 0, name);
            Assert.Equal(value![1]!.GetValue<double>(), double.Parse(lines[2].Split(',')[index], CultureInfo.InvariantCulture));
        }
    }

    [Fact]
    public async Task A_pass_is_found_by_any_instant_within_it()
    {
        using ServiceHost host = await StartedAsync();
        JsonNode pass = (await PassesAsync(host, Period + "&link=downlink"))[1];
        foreach (double share in new[] { 0.01, 0.3, 0.99 })
        {
            double at = Seconds(pass["aosUtc"]!) + (share * pass["durationS"]!.GetValue<double>());
            JsonNode found = await host.GetAsync($"/api/v1/passes/lark-1/wirra-flat/{Instant(at)}");
            Assert.Equal(pass["aosUtc"]!.GetValue<string>(), found["aosUtc"]!.GetValue<string>());
            Assert.Equal(pass["yieldBytes"]!.GetValue<double>(), found["yieldBytes"]!.GetValue<double>());
        }

        using HttpResponseMessage before = await host.SendAsync(HttpMethod.Get, $"/api/v1/passes/lark-1/wirra-flat/{Instant(Seconds(pass["aosUtc"]!) - 60)}");
        Assert.Equal(HttpStatusCode.NotFound, before.StatusCode);
        Assert.Contains("not above the horizon", (await ServiceHost.ProblemAsync(before))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Filters_keep_what_they_say()
    {
        using ServiceHost host = await StartedAsync();
        List<JsonNode> all = await PassesAsync(host, Period);
        Assert.Equal(all.Count(p => p["usableS"]!.GetValue<int>() > 0 && p["highestMarginDb"]!.GetValue<double>() > 0), (await PassesAsync(host, Period + "&closes=true")).Count);
        Assert.Equal(all.Count(p => p["highestMarginDb"]!.GetValue<double>() >= 12), (await PassesAsync(host, Period + "&minimumMarginDb=12")).Count);
        Assert.Equal(all.Count(p => p["verdict"]!.GetValue<string>() == "closes"), (await PassesAsync(host, Period + "&verdict=closes")).Count);
        Assert.All(await PassesAsync(host, Period + "&link=s-rx"), p => Assert.Equal("uplink", p["link"]!["direction"]!.GetValue<string>()));
        Assert.Empty(await PassesAsync(host, Period + "&antenna=other"));
    }

    [Fact]
    public async Task Pages_together_are_the_whole_list()
    {
        using ServiceHost host = await StartedAsync();
        List<JsonNode> all = await PassesAsync(host, Period);
        var paged = new List<JsonNode>();
        string? cursor = "0";
        while (cursor is not null)
        {
            JsonNode page = await host.GetAsync($"/api/v1/passes?{Period}&limit=5&cursor={cursor}");
            Assert.Equal(all.Count, page["counts"]!["passes"]!.GetValue<int>());
            paged.AddRange(page["items"]!.AsArray().Select(i => i!.DeepClone()));
            cursor = page["next"]?.GetValue<string>();
        }

        Assert.Equal(all.Select(p => p["passUrl"]!.GetValue<string>()), paged.Select(p => p["passUrl"]!.GetValue<string>()));
    }

    [Fact]
    public async Task The_same_question_gets_the_same_answer_byte_for_byte()
    {
        using ServiceHost host = await StartedAsync();
        string first = await host.Client.GetStringAsync("/api/v1/passes?" + Period + "&profileStepS=10");
        Assert.Equal(first, await host.Client.GetStringAsync("/api/v1/passes?" + Period + "&profileStepS=10"));
    }

    [Fact]
    public async Task A_change_of_a_profile_shows_in_the_next_answer()
    {
        using ServiceHost host = await StartedAsync();
        double before = (await PassesAsync(host, Period + "&link=downlink"))[0]["highestMarginDb"]!.GetValue<double>();
        string stronger = Samples.With(Samples.With(Samples.Spacecraft, "/transmitters/0/powerW", "4"), "/transmitters/0/waveforms/1", "{ \"name\": \"8PSK 2/3\", \"bitRateBps\": 9e10, \"requiredEbN0Db\": 3.65 }");
        string sameLadder = Samples.With(Samples.Spacecraft, "/transmitters/0/waveforms/1", "{ \"name\": \"8PSK 2/3\", \"bitRateBps\": 9e10, \"requiredEbN0Db\": 3.65 }");
        using HttpResponseMessage one = await host.SendAsync(HttpMethod.Put, "/api/v1/spacecraft/lark-1", sameLadder, "\"1\"");
        double base2 = (await PassesAsync(host, Period + "&link=downlink"))[0]["highestMarginDb"]!.GetValue<double>();
        using HttpResponseMessage two = await host.SendAsync(HttpMethod.Put, "/api/v1/spacecraft/lark-1", stronger, "\"2\"");
        Assert.Equal(HttpStatusCode.OK, two.StatusCode);
        double doubled = (await PassesAsync(host, Period + "&link=downlink"))[0]["highestMarginDb"]!.GetValue<double>();
        Assert.Equal(3.0103, doubled - base2, 0.0001);
        Assert.NotEqual(before, doubled);
    }

    [Fact]
    public async Task A_spacecraft_without_an_element_set_is_listed_with_that_reason()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        await host.PostAsync("/api/v1/spacecraft", Samples.Spacecraft);
        JsonNode answer = await host.GetAsync("/api/v1/passes?" + Period);
        Assert.Empty(answer["items"]!.AsArray());
        Assert.Equal("noElementSet", Assert.Single(answer["withoutPasses"]!.AsArray())!["reason"]!.GetValue<string>());
    }

    [Fact]
    public async Task An_object_that_comes_down_is_listed_with_that_reason()
    {
        using var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        await host.PostAsync("/api/v1/spacecraft", Samples.With(Samples.Spacecraft, "/catalogNumber", "49975"));
        string[] lines = [.. File.ReadLines(ReferenceData.PathOf("orbit/spacecraft.tle")).Where(l => l.Length > 7 && l[2..7] == "49975")];
        using HttpResponseMessage posted = await host.SendAsync(HttpMethod.Post, "/api/v1/spacecraft/lark-1/element-sets", string.Join('\n', lines), contentType: "text/plain");
        Assert.Equal(HttpStatusCode.OK, posted.StatusCode);
        JsonNode answer = await host.GetAsync("/api/v1/passes?" + Period);
        JsonNode reason = Assert.Single(answer["withoutPasses"]!.AsArray())!;
        Assert.Equal("decayed", reason["reason"]!.GetValue<string>());
        Assert.Contains("2022-01-24T13:03", reason["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_old_element_set_is_marked()
    {
        using ServiceHost host = await StartedAsync();
        JsonNode fresh = (await PassesAsync(host, Period))[0]["elementSet"]!;
        Assert.False(fresh["isStale"]!.GetValue<bool>());
        JsonNode old = (await PassesAsync(host, "fromUtc=2022-02-22T00:00:00Z&toUtc=2022-02-23T00:00:00Z"))[0]["elementSet"]!;
        Assert.True(old["isStale"]!.GetValue<bool>());
        Assert.True(old["ageH"]!.GetValue<double>() > old["limitH"]!.GetValue<double>());
    }

    [Fact]
    public async Task A_pointing_table_gives_apparent_elevation_and_corrected_frequency()
    {
        using ServiceHost host = await StartedAsync();
        JsonNode down = (await PassesAsync(host, Period + "&link=downlink"))[0];
        JsonNode timeline = await host.GetAsync(down["timelineUrl"]!.GetValue<string>());
        JsonNode pointing = await host.GetAsync(Part(down["passUrl"]!.GetValue<string>(), "/pointing"));
        Assert.Equal(8.2e9 + Column(timeline, "dopplerHz")[5], Column(pointing, "frequencyHz")[5], 0.01);
        Assert.Equal(Column(timeline, "apparentElevationDeg"), Column(pointing, "apparentElevationDeg"));
        Assert.Contains("licence", pointing["caution"]!.GetValue<string>(), StringComparison.Ordinal);
        JsonNode up = (await PassesAsync(host, Period + "&link=uplink"))[0];
        JsonNode upTimeline = await host.GetAsync(up["timelineUrl"]!.GetValue<string>());
        JsonNode upPointing = await host.GetAsync(Part(up["passUrl"]!.GetValue<string>(), "/pointing"));
        Assert.Equal(2.05e9 - Column(upTimeline, "dopplerHz")[5], Column(upPointing, "frequencyHz")[5], 0.01);
    }

    [Fact]
    public async Task An_instant_outside_the_pass_has_no_budget()
    {
        using ServiceHost host = await StartedAsync();
        JsonNode pass = (await PassesAsync(host, Period))[0];
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Get, Part(pass["passUrl"]!.GetValue<string>(), "/budget") + "&atUtc=2022-01-01T00:00:00Z");
        Assert.Equal(HttpStatusCode.BadRequest, response.StatusCode);
        Assert.Contains("it must be within the pass", (await ServiceHost.ProblemAsync(response))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    private static async Task<ServiceHost> StartedAsync()
    {
        var host = new ServiceHost();
        await host.PostAsync("/api/v1/stations", Samples.Station);
        await host.PostAsync("/api/v1/spacecraft", Samples.Spacecraft);
        using HttpResponseMessage posted = await host.SendAsync(HttpMethod.Post, "/api/v1/spacecraft/lark-1/element-sets", Samples.TwoLines, contentType: "text/plain");
        Assert.True(posted.IsSuccessStatusCode, await posted.Content.ReadAsStringAsync());
        return host;
    }

    private static async Task<List<JsonNode>> PassesAsync(ServiceHost host, string query) =>
        [.. (await host.GetAsync("/api/v1/passes?" + query))["items"]!.AsArray().Select(i => i!)];

    private static double[] Column(JsonNode timeline, string name) => [.. timeline[name]!.AsArray().Select(v => v!.GetValue<double>())];

    private static string Part(string passUrl, string part) => passUrl.Replace("?", part + "?", StringComparison.Ordinal);

    private static double Seconds(JsonNode instant) => Seconds(instant.GetValue<string>());

    private static double Seconds(string instant) =>
        (DateTimeOffset.Parse(instant, CultureInfo.InvariantCulture) - DateTimeOffset.UnixEpoch).TotalSeconds;

    private static string Instant(double seconds) =>
        DateTimeOffset.UnixEpoch.AddSeconds(Math.Floor(seconds)).ToString("yyyy-MM-dd'T'HH:mm:ss'Z'", CultureInfo.InvariantCulture);
}
