using System.Globalization;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;

namespace ScanSim.Scenarios.Format;

/// <summary>Makes the JSON Schema (draft 2020-12) of a block and of all blocks under it.</summary>
/// <remarks>Limits of quantities stand in the description and in x-... keys: a schema cannot compare numbers inside texts.</remarks>
internal sealed class SchemaWriter
{
    private readonly JsonObject definitions = [];

    public static JsonObject Write(Shape.OfBlock root)
    {
        var writer = new SchemaWriter();
        var schema = writer.Block(root);
        schema.Insert(0, "$schema", "https://json-schema.org/draft/2020-12/schema");
        schema["$defs"] = writer.definitions;
        return schema;
    }

    private JsonObject Of(Shape shape) => shape switch
    {
        Shape.OfQuantity quantity => Quantity(quantity),
        Shape.OfNumber number => new JsonObject { ["type"] = "number", ["minimum"] = number.AtLeast, ["maximum"] = number.AtMost },
        Shape.OfWhole whole => whole.AtLeast == whole.AtMost
            ? new JsonObject { ["const"] = whole.AtLeast }
            : new JsonObject { ["type"] = "integer", ["minimum"] = whole.AtLeast, ["maximum"] = whole.AtMost },
        Shape.OfText text => new JsonObject { ["type"] = "string", ["minLength"] = 1, ["maxLength"] = text.LongestCharacters, ["pattern"] = text.Pattern },
        Shape.OfIgnoredText => new JsonObject { ["type"] = "string" },
        Shape.OfInstant => new JsonObject { ["type"] = "string", ["pattern"] = InstantPattern },
        Shape.OfChoice choice => new JsonObject { ["enum"] = Names(choice.Words) },
        Shape.OfList list => new JsonObject { ["type"] = "array", ["minItems"] = list.Fewest, ["maxItems"] = list.Most, ["items"] = Of(list.Item) },
        Shape.OfEither either => new JsonObject { ["anyOf"] = new JsonArray([.. either.Shapes.Select(Of)]) },
        Shape.OfBlock block => Reference(block),
        _ => throw new ArgumentOutOfRangeException(nameof(shape)),
    };

    private const string InstantPattern =
        @"^[0-9]{4}-(0[1-9]|1[0-2])-(0[1-9]|[12][0-9]|3[01])T([01][0-9]|2[0-3]):[0-5][0-9]:[0-5][0-9](\.[0-9]{1,7})?Z$";

    private static JsonObject Quantity(Shape.OfQuantity quantity)
    {
        var units = string.Join('|', Units.Of(quantity.Dimension).Select(unit => Regex.Escape(unit.Symbol)));
        var schema = new JsonObject
        {
            ["type"] = "string",
            ["pattern"] = $"^ *{QuantityText.NumberPattern} *({units}) *$",
            ["x-dimension"] = Units.Words(quantity.Dimension),
        };
        Limit(schema, "x-minimum", quantity.AtLeast);
        Limit(schema, "x-exclusiveMinimum", quantity.Above);
        Limit(schema, "x-maximum", quantity.AtMost);
        Limit(schema, "x-exclusiveMaximum", quantity.Below);
        return schema;
    }

    private static void Limit(JsonObject schema, string key, string? limit)
    {
        if (limit is not null)
        {
            schema[key] = limit;
        }
    }

    private JsonObject Reference(Shape.OfBlock block)
    {
        if (!definitions.ContainsKey(block.Name))
        {
            definitions[block.Name] = null;
            definitions[block.Name] = Block(block);
        }

        return new JsonObject { ["$ref"] = "#/$defs/" + block.Name };
    }

    private JsonObject Block(Shape.OfBlock block)
    {
        var properties = new JsonObject();
        foreach (var property in block.Properties)
        {
            properties[property.Name] = Described(property);
        }

        var schema = new JsonObject
        {
            ["title"] = block.Name,
            ["description"] = block.Description,
            ["type"] = "object",
            ["properties"] = properties,
            ["required"] = Names(block.Properties.Where(property => property.Required).Select(property => property.Name)),
            ["additionalProperties"] = false,
        };
        if (block.Groups.Length > 0)
        {
            schema["allOf"] = new JsonArray([.. block.Groups.Select(Group)]);
        }

        return schema;
    }

    private JsonObject Described(Property property)
    {
        var schema = Of(property.Shape);
        var allowed = property.Shape is Shape.OfBlock ? "" : $" {Sentence(ShapeWords.Of(property.Shape))}";
        var byDefault = property.DefaultWords is null ? "" : $" Default: {property.DefaultWords}.";
        schema["description"] = property.Description + allowed + byDefault;
        if (property.Default is not null)
        {
            schema["default"] = JsonNode.Parse(property.Default);
        }

        if (property.Example is not null)
        {
            schema["examples"] = new JsonArray(JsonNode.Parse(property.Example));
        }

        return schema;
    }

    private static JsonObject Group(PropertyGroup group) => new()
    {
        ["oneOf"] = new JsonArray([.. group.Variants.Select(variant => Variant(group, variant))]),
    };

    private static JsonObject Variant(PropertyGroup group, PropertyVariant variant)
    {
        var schema = new JsonObject { ["required"] = Names(variant.Required) };
        var properties = new JsonObject();
        if (group.SwitchedBy is not null)
        {
            properties[group.SwitchedBy] = new JsonObject { ["enum"] = Names(variant.Values) };
        }

        foreach (var other in group.AllNames.Except(variant.Names, StringComparer.Ordinal))
        {
            properties[other] = false;
        }

        schema["properties"] = properties;
        return schema;
    }

    private static JsonArray Names(IEnumerable<string> names) => new([.. names.Select(name => (JsonNode)JsonValue.Create(name)!)]);

    private static string Sentence(string words) =>
        string.Create(CultureInfo.InvariantCulture, $"{char.ToUpperInvariant(words[0])}{words.AsSpan(1)}.");
}
