using System.Collections.Immutable;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios.Format;

/// <summary>Holds a tree against the description of the format and gathers every fault.</summary>
internal sealed class Checker(FaultList faults)
{
    /// <summary>The value as its shape reads it; null when it has a fault (blocks and lists come with what is sound in them).</summary>
    public CheckedValue? Check(Shape shape, JsonValue json, string path, Property? property = null) => shape switch
    {
        Shape.OfBlock block => Block(block, json, path),
        Shape.OfList list => List(list, json, path),
        Shape.OfEither either => Either(either, json, path, property),
        _ => Plain(shape, json, path, property),
    };

    private CheckedValue? Plain(Shape shape, JsonValue json, string path, Property? property)
    {
        var value = PlainValue.Read(shape, json, path, out var reason);
        if (value is null)
        {
            faults.Add(json, path, reason.Length == 0 ? json.Shown() : $"{json.Shown()} ({reason})", Expected(shape, property));
        }

        return value;
    }

    /// <summary>The first shape that fits; lists are checked item by item once the kind says that one is meant.</summary>
    private CheckedValue? Either(Shape.OfEither either, JsonValue json, string path, Property? property)
    {
        var reasons = new List<string>();
        foreach (var shape in either.Shapes)
        {
            if (shape is Shape.OfList list)
            {
                if (json.Kind == JsonKind.List)
                {
                    return List(list, json, path);
                }

                continue;
            }

            if (PlainValue.Read(shape, json, path, out var reason) is { } value)
            {
                return value;
            }

            reasons.Add(reason);
        }

        var told = reasons.Where(reason => reason.Length > 0).Distinct(StringComparer.Ordinal).ToList();
        faults.Add(json, path, told.Count == 1 ? $"{json.Shown()} ({told[0]})" : json.Shown(), Expected(either, property));
        return null;
    }

    private CheckedValue.OfList? List(Shape.OfList list, JsonValue json, string path)
    {
        if (json.Kind != JsonKind.List)
        {
            faults.Add(json, path, json.Shown(), ShapeWords.Of(list));
            return null;
        }

        if (json.Items.Length < list.Fewest || json.Items.Length > list.Most)
        {
            faults.Add(json, path, json.Items.Length == 0 ? "an empty list" : $"a list of {json.Items.Length}", ShapeWords.Of(list));
        }

        var items = ImmutableArray.CreateBuilder<CheckedValue>();
        for (var i = 0; i < json.Items.Length; i++)
        {
            if (Check(list.Item, json.Items[i], PathText.Item(path, i)) is { } item)
            {
                items.Add(item);
            }
        }

        return new CheckedValue.OfList(json, path, items.ToImmutable());
    }

    private CheckedBlock? Block(Shape.OfBlock block, JsonValue json, string path)
    {
        if (json.Kind != JsonKind.Block)
        {
            faults.Add(json, path, json.Shown(), ShapeWords.Of(block));
            return null;
        }

        var before = faults.Count;
        var given = Given(block, json, path);
        var open = new GroupCheck(faults, block, json, path, given).Run();
        var values = ImmutableDictionary.CreateBuilder<string, CheckedValue>(StringComparer.Ordinal);
        foreach (var property in block.Properties)
        {
            var member = given.GetValueOrDefault(property.Name);
            if (member is null && property.Required)
            {
                faults.Add(json, PathText.Member(path, property.Name), "nothing: the property is missing", ShapeWords.Of(property));
            }

            var value = member ?? (open.Contains(property.Name) ? Default(property, json) : null);
            if (value is not null && Check(property.Shape, value, PathText.Member(path, property.Name), property) is { } sound)
            {
                values[property.Name] = sound;
            }
        }

        return new CheckedBlock(json, path, values.ToImmutable(), faults.Count == before);
    }

    /// <summary>The known properties that are there; doubled and unknown ones are faults.</summary>
    private Dictionary<string, JsonValue> Given(Shape.OfBlock block, JsonValue json, string path)
    {
        var given = new Dictionary<string, JsonValue>(StringComparer.Ordinal);
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (var member in json.Members)
        {
            var memberPath = PathText.Member(path, member.Name);
            if (!seen.Add(member.Name))
            {
                faults.Add(member.Line, member.Column, memberPath, $"the property '{JsonValue.Short(member.Name)}' a second time", "each property once");
            }
            else if (block.Find(member.Name) is null)
            {
                faults.Add(member.Line, member.Column, memberPath, $"the unknown property '{JsonValue.Short(member.Name)}'", Allowed(block, member.Name));
            }
            else
            {
                given.Add(member.Name, member.Value);
            }
        }

        return given;
    }

    private static string Expected(Shape shape, Property? property) => property is null ? ShapeWords.Of(shape) : ShapeWords.Of(property);

    private static string Allowed(Shape.OfBlock block, string written)
    {
        var names = block.Properties.Select(property => property.Name).ToList();
        var nearest = NearestName.Find(written, names);
        return (nearest is null ? "" : $"perhaps '{nearest}'; ") + $"allowed in {block.Name}: {string.Join(", ", names)}";
    }

    /// <summary>The default stands where its block stands, so that a message about it has a place.</summary>
    private static JsonValue? Default(Property property, JsonValue block) => property.Default is null
        ? null
        : JsonTree.Read(System.Text.Encoding.UTF8.GetBytes(property.Default)) with { Line = block.Line, Column = block.Column };
}
