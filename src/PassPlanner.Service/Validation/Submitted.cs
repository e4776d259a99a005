using System.Diagnostics.CodeAnalysis;
using System.Reflection;
using System.Text.Json;
using Microsoft.AspNetCore.Http.Metadata;
using PassPlanner.Service.Problems;

namespace PassPlanner.Service.Validation;

/// <summary>
/// The body of a request as a document that has passed every check its attributes state. Reading collects all
/// errors, not the first alone, and answers them in one problem.
/// </summary>
/// <typeparam name="T">Type of the document.</typeparam>
[SuppressMessage("Design", "CA1000", Justification = "The framework looks for static members of this name on the parameter's type.")]
public sealed class Submitted<T> : IEndpointParameterMetadataProvider
    where T : class
{
    private static readonly JsonDocumentOptions Strict = new() { AllowDuplicateProperties = false, MaxDepth = 32 };

    private Submitted(T document) => Document = document;

    /// <summary>The document.</summary>
    public T Document { get; }

    /// <summary>Reads the body; called by the framework.</summary>
    public static async ValueTask<Submitted<T>?> BindAsync(HttpContext context)
    {
        using JsonDocument json = await ParseAsync(context);
        var errors = new FieldErrors();
        JsonShape.Check(json.RootElement, typeof(T), "#", errors);
        if (!errors.Any)
        {
            T document = json.Deserialize<T>(WireFormat.Options)!;
            DocumentValidator.Validate(document, "#", errors);
            if (!errors.Any)
            {
                return new Submitted<T>(document);
            }
        }

        throw RequestProblemException.InvalidInput(errors.Items);
    }

    /// <summary>Tells the API description what the body holds.</summary>
    public static void PopulateMetadata(ParameterInfo parameter, EndpointBuilder builder) =>
        builder.Metadata.Add(new AcceptsMetadata(["application/json"], typeof(T)));

    private static async Task<JsonDocument> ParseAsync(HttpContext context)
    {
        using var body = new MemoryStream();
        await context.Request.Body.CopyToAsync(body, context.RequestAborted);
        try
        {
            return JsonDocument.Parse(NonFiniteNumbers.Quote(body.ToArray()), Strict);
        }
        catch (JsonException bad)
        {
            string place = bad.LineNumber is { } line && bad.BytePositionInLine is { } column
                ? $" at line {line + 1}, byte {column + 1}"
                : "";
            throw new RequestProblemException(
                StatusCodes.Status400BadRequest,
                ProblemTypes.UnreadableBody,
                "The body is not JSON",
                body.Length == 0 ? "The body is empty; it must be JSON" : $"The body is not JSON{place}");
        }
    }
}
