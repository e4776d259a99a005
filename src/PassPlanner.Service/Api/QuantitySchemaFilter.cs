using System.Globalization;
using System.Reflection;
using System.Text.Json.Nodes;
using Microsoft.OpenApi;
using PassPlanner.Service.Validation;
using Swashbuckle.AspNetCore.SwaggerGen;

namespace PassPlanner.Service.Api;

/// <summary>Writes the attributes of documents into their schemas: unit, range, choices, lengths, counts, required members.</summary>
public sealed class QuantitySchemaFilter : ISchemaFilter
{
    /// <inheritdoc/>
    public void Apply(IOpenApiSchema schema, SchemaFilterContext context)
    {
        if (schema is not OpenApiSchema { Properties: { } members } written)
        {
            return;
        }

        foreach (PropertyInfo property in context.Type.GetProperties(BindingFlags.Public | BindingFlags.Instance))
        {
            string name = System.Text.Json.JsonNamingPolicy.CamelCase.ConvertName(property.Name);
            if (!members.TryGetValue(name, out IOpenApiSchema? member) || member is not OpenApiSchema one)
            {
                continue;
            }

            foreach (Attribute attribute in property.GetCustomAttributes())
            {
                Write(attribute, name, one, written);
            }
        }
    }

    private static void Write(Attribute attribute, string name, OpenApiSchema member, OpenApiSchema owner)
    {
        switch (attribute)
        {
            case QuantityAttribute quantity:
                WriteQuantity(quantity, member);
                Require(quantity.Required, name, owner);
                break;
            case ChoiceAttribute choice:
                member.Enum = [.. choice.Words.Select(word => (JsonNode)word)];
                Require(choice.Required, name, owner);
                break;
            case LabelAttribute label:
                (member.MinLength, member.MaxLength) = (1, label.MaximumLength);
                Require(label.Required, name, owner);
                break;
            case IdentifierAttribute identifier:
                member.Pattern = "^[a-z0-9-]{1,64}$";
                Require(identifier.Required, name, owner);
                break;
            case ListAttribute list:
                (member.MinItems, member.MaxItems) = (list.MinimumCount, list.MaximumCount);
                Require(list.Required, name, owner);
                break;
            case PartAttribute part:
                Require(part.Required, name, owner);
                break;
            default:
                break;
        }
    }

    private static void WriteQuantity(QuantityAttribute quantity, OpenApiSchema member)
    {
        string unit = quantity.Unit.Length == 0 ? "" : $" Unit: {quantity.Unit}.";
        member.Description = $"{member.Description}{unit} Range: {quantity.RangeInWords}.".Trim();
        OpenApiSchema number = member.Items as OpenApiSchema ?? member;
        string minimum = quantity.Minimum.ToString(CultureInfo.InvariantCulture);
        string maximum = quantity.Maximum.ToString(CultureInfo.InvariantCulture);
        if (quantity.AboveMinimum)
        {
            number.ExclusiveMinimum = minimum;
        }
        else
        {
            number.Minimum = minimum;
        }

        if (quantity.BelowMaximum)
        {
            number.ExclusiveMaximum = maximum;
        }
        else
        {
            number.Maximum = maximum;
        }

        if (quantity.Count > 0)
        {
            (member.MinItems, member.MaxItems) = (quantity.Count, quantity.Count);
        }
    }

    private static void Require(bool required, string name, OpenApiSchema owner)
    {
        if (required)
        {
            (owner.Required ??= new HashSet<string>()).Add(name);
        }
    }
}
