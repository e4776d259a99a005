using System.Text.Json.Nodes;
using Microsoft.OpenApi;
using PassPlanner.Service.Demo;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Spacecraft;
using PassPlanner.Service.Stations;
using Swashbuckle.AspNetCore.SwaggerGen;

namespace PassPlanner.Service.Api;

/// <summary>Gives every operation with a body an example that works when pasted.</summary>
public sealed class ExampleOperationFilter : IOperationFilter
{
    private const string PatternExample = """
        { "pattern": { "kind": "taperedAperture", "diameterM": 3.7, "edgeTaperDb": 11, "efficiency": 0.62 }, "frequencyHz": 8.2e9, "angleDeg": [0, 0.3, 0.6, 1] }
        """;

    private const string CutsExample = "angleDeg,gainDbi\n0,6\n30,4.5\n60,0.5\n90,-5\n180,-16\n";

    private const string BudgetExample = """
        {
          "frequencyHz": 2.2e9, "slantRangeKm": 1400, "powerW": 1, "lineLossDb": 0.5, "gainDbi": 6,
          "losses": [{ "name": "Polarisation", "valueDb": 0.5 }], "gOverTDbPerK": 13.5,
          "bitRateBps": 3e6, "requiredEbN0Db": 2.31, "implementationLossDb": 1.5
        }
        """;

    /// <inheritdoc/>
    public void Apply(OpenApiOperation operation, OperationFilterContext context)
    {
        if (operation.RequestBody?.Content is not { } content)
        {
            return;
        }

        Type? body = context.ApiDescription.ParameterDescriptions.FirstOrDefault(p => p.Source.Id == "Body")?.Type
            ?? context.ApiDescription.ActionDescriptor.EndpointMetadata
                .OfType<Microsoft.AspNetCore.Http.Metadata.IAcceptsMetadata>().FirstOrDefault()?.RequestType;
        if (content.TryGetValue("application/json", out IOpenApiMediaType? media) && media is OpenApiMediaType json && ExampleOf(body) is { } example)
        {
            json.Example = example;
        }

        if (content.TryGetValue("text/csv", out IOpenApiMediaType? csv) && csv is OpenApiMediaType table && context.ApiDescription.RelativePath == "api/v1/patterns/measured-cuts")
        {
            table.Example = JsonValue.Create(CutsExample);
        }

        if (content.TryGetValue("text/plain", out IOpenApiMediaType? plain) && plain is OpenApiMediaType text)
        {
            text.Example = JsonValue.Create(DemoScenario.ExampleTwoLines);
        }
    }

    private static JsonNode? ExampleOf(Type? type) => type switch
    {
        _ when type == typeof(StationDocument) => DemoScenario.ExampleOf("stations.json"),
        _ when type == typeof(SpacecraftDocument) => DemoScenario.ExampleOf("spacecraft.json"),
        _ when type == typeof(PatternQuestion) => JsonNode.Parse(PatternExample),
        _ when type == typeof(BudgetQuestion) => JsonNode.Parse(BudgetExample),
        _ when type == typeof(WaveformDocument) => JsonNode.Parse("""{ "name": "QPSK 1/2", "bitRateBps": 12.5e6, "requiredEbN0Db": 1.05, "implementationLossDb": 1.5 }"""),
        _ => null,
    };
}
