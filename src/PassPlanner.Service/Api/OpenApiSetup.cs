using System.Reflection;
using Microsoft.OpenApi;
using Swashbuckle.AspNetCore.SwaggerGen;

namespace PassPlanner.Service.Api;

/// <summary>The API description at /openapi.</summary>
public static class OpenApiSetup
{
    /// <summary>Adds the generator: summaries from the XML documentation, units and ranges from the members' attributes.</summary>
    public static void AddOpenApiDescription(this IServiceCollection services)
    {
        services.AddEndpointsApiExplorer();
        services.AddSwaggerGen(options =>
        {
            options.SwaggerDoc("v1", new OpenApiInfo
            {
                Title = "Pass Planner",
                Version = "v1",
                Description = "Which passes close the link, for which seconds, at what rate, for how many bytes. "
                    + "Names end in their units; instants are ISO 8601 UTC with Z; problems follow RFC 9457.",
            });
            options.IncludeXmlComments(Assembly.GetExecutingAssembly());
            options.SchemaFilter<QuantitySchemaFilter>();
            options.OperationFilter<ExampleOperationFilter>();
            options.CustomSchemaIds(SchemaIdOf);
            options.SupportNonNullableReferenceTypes();
        });
    }

    /// <summary>Serves the description at /openapi/v1.json and a page to try it at /openapi.</summary>
    public static void MapOpenApiDescription(this WebApplication app)
    {
        app.UseSwagger(options =>
        {
            options.RouteTemplate = "openapi/{documentName}.json";
            options.OpenApiVersion = OpenApiSpecVersion.OpenApi3_1;
        });
        app.UseSwaggerUI(options =>
        {
            options.RoutePrefix = "openapi";
            options.SwaggerEndpoint("v1.json", "Pass Planner v1");
            options.DocumentTitle = "Pass Planner API";
        });
    }

    private static string SchemaIdOf(Type type) => type.IsGenericType
        ? type.Name.Split('`')[0] + "Of" + string.Concat(type.GetGenericArguments().Select(SchemaIdOf))
        : type.Name;
}
