using System.Text.Json;
using System.Text.Json.Serialization;

namespace PassPlanner.Service.Validation;

/// <summary>How documents are written as JSON: camelCase, members without a value left out, unknown members refused.</summary>
public static class WireFormat
{
    /// <summary>The options, shared and read-only.</summary>
    public static readonly JsonSerializerOptions Options = Create();

    /// <summary>Sets the same habits on other options.</summary>
    public static void Apply(JsonSerializerOptions options)
    {
        options.PropertyNamingPolicy = JsonNamingPolicy.CamelCase;
        options.PropertyNameCaseInsensitive = false;
        options.UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow;
        options.DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull;
        options.NumberHandling = JsonNumberHandling.Strict;
        options.Encoder = System.Text.Encodings.Web.JavaScriptEncoder.UnsafeRelaxedJsonEscaping;
        options.MaxDepth = 32;
    }

    private static JsonSerializerOptions Create()
    {
        var options = new JsonSerializerOptions();
        Apply(options);
        options.MakeReadOnly(populateMissingResolver: true);
        return options;
    }
}
