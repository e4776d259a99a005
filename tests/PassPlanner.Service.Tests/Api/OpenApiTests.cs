using System.Text;
using System.Text.Json.Nodes;
using Microsoft.OpenApi;
using Microsoft.OpenApi.Reader;

namespace PassPlanner.Service.Tests.Api;

public class OpenApiTests
{
    [Fact]
    public async Task The_description_is_valid_OpenAPI()
    {
        using var host = new ServiceHost();
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(await host.Client.GetStringAsync("/openapi/v1.json")));
        ReadResult result = await OpenApiDocument.LoadAsync(stream, "json");
        Assert.Empty(result.Diagnostic!.Errors);
        Assert.NotEmpty(result.Document!.Paths);
    }

    [Fact]
    public async Task Every_operation_has_a_summary_and_says_what_it_answers()
    {
        using var host = new ServiceHost();
        List<(string Name, JsonNode Operation)> operations = [.. Operations(await host.GetAsync("/openapi/v1.json"))];
        Assert.True(operations.Count > 20);
        Assert.All(operations, o => Assert.False(string.IsNullOrWhiteSpace(o.Operation["summary"]?.GetValue<string>()), o.Name));
        Assert.All(operations, o => Assert.Contains(o.Operation["responses"]!.AsObject(), r => r.Key.StartsWith('2')));
    }

    [Fact]
    public async Task Every_member_is_described_and_every_number_of_a_document_has_its_range()
    {
        using var host = new ServiceHost();
        JsonObject schemas = (await host.GetAsync("/openapi/v1.json"))["components"]!["schemas"]!.AsObject();
        foreach ((string schema, JsonNode? body) in schemas)
        {
            foreach ((string member, JsonNode? value) in body!["properties"]?.AsObject() ?? [])
            {
                bool described = value!["description"] is not null || value["$ref"] is not null || value["items"]?["$ref"] is not null || schema is "ProblemDetails";
                Assert.True(described, $"{schema}.{member} has no description");
                if (schema.EndsWith("Document", StringComparison.Ordinal) && IsNumber(value) && member != "revision")
                {
                    Assert.True(
                        (value["minimum"] ?? value["exclusiveMinimum"]) is not null && (value["maximum"] ?? value["exclusiveMaximum"]) is not null,
                        $"{schema}.{member} has no range");
                }
            }
        }
    }

    [Fact]
    public async Task Every_example_works_when_it_is_pasted()
    {
        using var host = new ServiceHost();
        JsonNode document = await host.GetAsync("/openapi/v1.json");
        int pasted = 0;
        foreach ((string url, string method) in new[]
        {
            ("/api/v1/stations", "post"), ("/api/v1/spacecraft", "post"), ("/api/v1/waveforms", "post"),
            ("/api/v1/patterns/evaluate", "post"), ("/api/v1/budgets", "post"),
        })
        {
            JsonNode example = document["paths"]![url]![method]!["requestBody"]!["content"]!["application/json"]!["example"]!;
            await host.PostAsync(url, example.ToJsonString());
            pasted++;
        }

        string twoLines = document["paths"]!["/api/v1/element-sets"]!["post"]!["requestBody"]!["content"]!["text/plain"]!["example"]!.GetValue<string>();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, "/api/v1/element-sets", twoLines, contentType: "text/plain");
        Assert.True(response.IsSuccessStatusCode, await response.Content.ReadAsStringAsync());
        Assert.Equal(5, pasted);
    }

    [Fact]
    public async Task The_page_to_try_it_is_there()
    {
        using var host = new ServiceHost();
        Assert.Contains("Pass Planner API", await host.Client.GetStringAsync("/openapi/index.html"), StringComparison.Ordinal);
    }

    private static bool IsNumber(JsonNode schema) => schema["type"] switch
    {
        JsonArray types => types.Any(t => t!.GetValue<string>() is "number" or "integer"),
        JsonValue type => type.GetValue<string>() is "number" or "integer",
        _ => false,
    };

    private static IEnumerable<(string Name, JsonNode Operation)> Operations(JsonNode document) =>
        from path in document["paths"]!.AsObject()
        from operation in path.Value!.AsObject()
        select ($"{operation.Key} {path.Key}", operation.Value!);
}
