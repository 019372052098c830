using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios.Format;

/// <summary>Checks the "exactly one of" rules of one block.</summary>
internal sealed class GroupCheck(FaultList faults, Shape.OfBlock block, JsonValue json, string path, Dictionary<string, JsonValue> given)
{
    /// <summary>Names whose default may be filled in: those that no group rules, and those of the chosen variants.</summary>
    public HashSet<string> Run()
    {
        var open = block.Properties.Select(property => property.Name).ToHashSet(StringComparer.Ordinal);
        foreach (var group in block.Groups)
        {
            var chosen = group.SwitchedBy is null ? ByPresence(group) : ByValue(group);
            open.ExceptWith(group.AllNames);
            if (chosen is not null)
            {
                open.UnionWith(chosen.Names);
                Fill(group, chosen);
            }
        }

        return open;
    }

    private PropertyVariant? ByPresence(PropertyGroup group)
    {
        var found = group.Variants.Where(variant => variant.Required.Any(given.ContainsKey)).ToList();
        if (found.Count == 1)
        {
            return found[0];
        }

        var read = found.Count == 0
            ? "none of them"
            : string.Join(" and ", found.SelectMany(variant => variant.Required).Where(given.ContainsKey).Select(name => $"'{name}'"));
        faults.Add(json, path, read, $"exactly one of {group.Words}");
        return null;
    }

    private PropertyVariant? ByValue(PropertyGroup group) =>
        given.GetValueOrDefault(group.SwitchedBy!) is { Kind: JsonKind.Text } value
            ? group.Variants.FirstOrDefault(variant => variant.Values.Contains(value.Text, StringComparer.Ordinal))
            : null;

    private void Fill(PropertyGroup group, PropertyVariant chosen)
    {
        foreach (var name in chosen.Required.Where(name => !given.ContainsKey(name)))
        {
            faults.Add(json, PathText.Member(path, name), "nothing: the property is missing", ShapeWords.Of(block.Find(name)!));
        }

        var with = group.SwitchedBy is null ? chosen.Words : $"this '{group.SwitchedBy}'";
        foreach (var name in group.AllNames.Except(chosen.Names, StringComparer.Ordinal).Where(given.ContainsKey))
        {
            var allowed = chosen.Names.Any() ? string.Join(", ", chosen.Names) : "nothing";
            faults.Add(given[name], PathText.Member(path, name), $"'{name}', which does not go with {with}", $"only {allowed} here");
        }
    }
}
