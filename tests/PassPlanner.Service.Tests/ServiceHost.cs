using System.Net.Http.Json;
using System.Text.Json;
using System.Text.Json.Nodes;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Time.Testing;

namespace PassPlanner.Service.Tests;

/// <summary>The real service on a database file of its own, at a clock that stands where the test puts it.</summary>
internal sealed class ServiceHost : WebApplicationFactory<Program>
{
    private readonly string directory = Directory.CreateTempSubdirectory("pass-planner-test-").FullName;
    private readonly bool demo;
    private bool isGone;

    public ServiceHost(bool demo = false, string nowUtc = "2022-01-23T00:00:00Z")
    {
        this.demo = demo;
        Clock = new FakeTimeProvider(DateTimeOffset.Parse(nowUtc, System.Globalization.CultureInfo.InvariantCulture));
        Client = CreateClient();
    }

    public FakeTimeProvider Clock { get; }

    public HttpClient Client { get; }

    public async Task<JsonNode> GetAsync(string url)
    {
        using HttpResponseMessage response = await Client.GetAsync(url);
        string text = await response.Content.ReadAsStringAsync();
        Assert.True(response.IsSuccessStatusCode, $"{url}: {response.StatusCode} {text}");
        return JsonNode.Parse(text)!;
    }

    public async Task<JsonNode> PostAsync(string url, string json)
    {
        using HttpResponseMessage response = await SendAsync(HttpMethod.Post, url, json);
        string text = await response.Content.ReadAsStringAsync();
        Assert.True(response.IsSuccessStatusCode, $"{url}: {response.StatusCode} {text}");
        return JsonNode.Parse(text)!;
    }

    public async Task<HttpResponseMessage> SendAsync(HttpMethod method, string url, string? json = null, string? ifMatch = null, string contentType = "application/json")
    {
        using var request = new HttpRequestMessage(method, url);
        if (json is not null)
        {
            request.Content = new StringContent(json, System.Text.Encoding.UTF8, contentType);
        }

        if (ifMatch is not null)
        {
            request.Headers.TryAddWithoutValidation("If-Match", ifMatch);
        }

        return await Client.SendAsync(request);
    }

    /// <summary>A problem as RFC 9457 has it; fails when the answer is none.</summary>
    public static async Task<JsonNode> ProblemAsync(HttpResponseMessage response)
    {
        Assert.Equal("application/problem+json", response.Content.Headers.ContentType?.MediaType);
        JsonNode problem = (await response.Content.ReadFromJsonAsync<JsonNode>())!;
        Assert.Equal((int)response.StatusCode, problem["status"]!.GetValue<int>());
        Assert.False(string.IsNullOrEmpty(problem["title"]!.GetValue<string>()));
        return problem;
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseSetting("Data:Directory", directory);
        builder.UseSetting("Demo:Enabled", demo ? "true" : "false");
        builder.UseSetting("Logging:LogLevel:Default", "Warning");
        builder.ConfigureServices(services => services.AddSingleton<TimeProvider>(Clock));
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
