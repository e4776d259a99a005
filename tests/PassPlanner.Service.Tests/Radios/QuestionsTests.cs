using System.Globalization;
using System.Net;
using System.Text.Json.Nodes;
using PassPlanner.Tests;

namespace PassPlanner.Service.Tests.Radios;

public class QuestionsTests
{
    private const double PrintedDb = 0.001;

    /// <summary>Validation. Source: radio/simple-antennas.csv, paraboloid rows: G = efficiency (pi D / lambda)^2.</summary>
    [Theory]
    [InlineData(3.7, 8.2e9, 0.60, 47.828)]
    [InlineData(7.3, 26.25e9, 0.58, 63.690)]
    public async Task The_gain_of_a_dish_agrees_with_the_table(double diameterM, double frequencyHz, double efficiency, double gainDbi)
    {
        JsonNode answer = await EvaluateAsync(
            $$"""{ "kind": "taperedAperture", "diameterM": {{Text(diameterM)}}, "efficiency": {{Text(efficiency)}} }""", frequencyHz, "[0]");
        Assert.Equal(gainDbi, answer["peakGainDbi"]!.GetValue<double>(), PrintedDb);
        Assert.Equal(gainDbi, answer["gainDbi"]![0]!.GetValue<double>(), PrintedDb);
        double wavelengthM = 299792458 / frequencyHz;
        Assert.Equal(
            Math.Pow(10, gainDbi / 10) * wavelengthM * wavelengthM / (4 * Math.PI), answer["effectiveAreaM2"]!.GetValue<double>(), 0.001 * answer["effectiveAreaM2"]!.GetValue<double>());
    }

    /// <summary>Validation. Source: radio/circular-aperture-tapers.csv.</summary>
    [Fact]
    public async Task Beamwidth_and_first_sidelobe_of_every_taper_agree_with_the_table()
    {
        foreach (IReadOnlyDictionary<string, string> row in ReferenceData.Rows("radio/circular-aperture-tapers.csv"))
        {
            string exponent = row["n"] == "0" ? "1" : row["n"];
            string taperDb = row["edge_taper_db"].TrimStart('-');
            JsonNode answer = await EvaluateAsync($$"""{ "kind": "taperedAperture", "diameterM": 10, "edgeTaperDb": {{taperDb}}, "pedestalExponent": {{exponent}} }""", 8e9, "[0]");
            double wavelengthM = 299792458 / 8e9;
            double factor = double.Parse(row["hpbw_factor_deg_times_D_over_lambda"], CultureInfo.InvariantCulture);
            Assert.Equal(factor, answer["halfPowerBeamwidthDeg"]!.GetValue<double>() * 10 / wavelengthM, 0.02);
            Assert.Equal(-double.Parse(row["first_sidelobe_db"], CultureInfo.InvariantCulture), answer["firstSidelobeDb"]!.GetValue<double>(), 0.02);
        }
    }

    [Fact]
    public async Task A_pattern_without_a_sidelobe_says_so()
    {
        JsonNode answer = await EvaluateAsync("""{ "kind": "isotropic" }""", 4e8, "[0, 90, 180]");
        Assert.Null(answer["firstSidelobeDb"]);
        Assert.NotEmpty(answer["leftOut"]!.AsArray());
        Assert.Equal(0, answer["directivityDbi"]!.GetValue<double>(), 1e-6);
    }

    /// <summary>Validation. Source: radio/link-budgets.csv, budget B01.</summary>
    [Fact]
    public async Task A_published_budget_comes_out_to_its_printed_precision()
    {
        using var host = new ServiceHost();
        JsonNode answer = await host.PostAsync("/api/v1/budgets", """
            { "frequencyHz": 2.2e9, "freeSpaceLossDb": 162.2, "eirpDbw": 8.3, "losses": [{ "name": "Depointing", "valueDb": 10 }],
              "receiveGainDbi": 38.2, "systemNoiseTemperatureK": 130, "bitRateBps": 3.4e6, "requiredEbN0Db": 7, "implementationLossDb": 6 }
            """);
        Assert.Equal(81.8, answer["cOverN0DbHz"]!.GetValue<double>(), 0.1);
        Assert.Equal(16.5, answer["ebN0Db"]!.GetValue<double>(), 0.1);
        Assert.Equal(3.5, answer["marginDb"]!.GetValue<double>(), 0.1);
        Assert.Equal(
            answer["marginDb"]!.GetValue<double>(),
            answer["lines"]!.AsArray().Where(l => l!["kind"]!.GetValue<string>() == "term").Sum(l => l!["valueDb"]!.GetValue<double>()),
            1e-9);
    }

    [Theory]
    [InlineData("""{ "frequencyHz": 2.2e9, "eirpDbw": 8.3, "gOverTDbPerK": 10 }""", "#/slantRangeKm")]
    [InlineData("""{ "frequencyHz": 2.2e9, "slantRangeKm": 1000, "eirpDbw": 8.3, "powerW": 1, "gOverTDbPerK": 10 }""", "#/eirpDbw")]
    [InlineData("""{ "frequencyHz": 0, "slantRangeKm": 1000, "eirpDbw": 8.3, "gOverTDbPerK": 10 }""", "#/frequencyHz")]
    public async Task A_budget_with_too_little_or_too_much_is_refused_at_the_member(string body, string pointer)
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, "/api/v1/budgets", body);
        Assert.Equal(HttpStatusCode.BadRequest, response.StatusCode);
        Assert.Equal(pointer, (await ServiceHost.ProblemAsync(response))["errors"]![0]!["pointer"]!.GetValue<string>());
    }

    [Fact]
    public async Task Measured_cuts_come_back_as_a_pattern_that_profiles_take()
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(
            HttpMethod.Post, "/api/v1/patterns/measured-cuts", "phiDeg,angleDeg,gainDbi\n0,0,6\n0,90,-5\n90,0,6\n90,90,-8\n", contentType: "text/csv");
        JsonNode pattern = JsonNode.Parse(await response.Content.ReadAsStringAsync())!;
        Assert.Equal(2, pattern["cuts"]!.AsArray().Count);
        await host.PostAsync("/api/v1/spacecraft", Samples.With(Samples.Spacecraft, "/transmitters/0/pattern", pattern.ToJsonString()));
        using HttpResponseMessage bad = await host.SendAsync(
            HttpMethod.Post, "/api/v1/patterns/measured-cuts", "angleDeg,gainDbi\n0,6\n200,1\n", contentType: "text/csv");
        Assert.Equal(HttpStatusCode.BadRequest, bad.StatusCode);
        Assert.Contains("row 3, field 1", (await ServiceHost.ProblemAsync(bad))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Published_waveforms_come_with_their_sources_and_own_ones_are_added()
    {
        using var host = new ServiceHost();
        JsonArray published = (await host.GetAsync("/api/v1/waveforms"))["items"]!.AsArray();
        Assert.True(published.Count >= 14);
        Assert.All(published, w => Assert.NotEmpty(w!["source"]!.GetValue<string>()));
        await host.PostAsync("/api/v1/waveforms", """{ "name": "Ours", "bitRateBps": 1e6, "requiredEbN0Db": 4 }""");
        Assert.Equal(published.Count + 1, (await host.GetAsync("/api/v1/waveforms"))["items"]!.AsArray().Count);
        using HttpResponseMessage deleted = await host.SendAsync(HttpMethod.Delete, "/api/v1/waveforms/ours");
        Assert.Equal(HttpStatusCode.NoContent, deleted.StatusCode);
    }

    private static async Task<JsonNode> EvaluateAsync(string pattern, double frequencyHz, string anglesDeg)
    {
        using var host = new ServiceHost();
        return await host.PostAsync("/api/v1/patterns/evaluate", $$"""{ "pattern": {{pattern}}, "frequencyHz": {{Text(frequencyHz)}}, "angleDeg": {{anglesDeg}} }""");
    }

    private static string Text(double value) => value.ToString(CultureInfo.InvariantCulture);
}
