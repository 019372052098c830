using System.Collections.Immutable;
using System.Text;
using ScanSim.Scenarios.Format;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios.Tests;

/// <summary>Walks the description of the format.</summary>
internal static class FormatWalk
{
    /// <summary>Every property of every block, each block once.</summary>
    public static IReadOnlyList<Property> Properties()
    {
        var blocks = new HashSet<string>(StringComparer.Ordinal);
        var found = new List<Property>();
        Walk(FileFormat.Root, blocks, found);
        return found;
    }

    /// <summary>What the checking says about a value of the property.</summary>
    public static ImmutableArray<ScenarioFault> Faults(Property property, string json)
    {
        var faults = new FaultList(property.Name);
        new Checker(faults).Check(property.Shape, JsonTree.Read(Encoding.UTF8.GetBytes(json)), "$");
        return faults.InOrder();
    }

    private static void Walk(Shape shape, HashSet<string> blocks, List<Property> found)
    {
        switch (shape)
        {
            case Shape.OfBlock block when blocks.Add(block.Name):
                found.AddRange(block.Properties);
                foreach (var property in block.Properties)
                {
                    Walk(property.Shape, blocks, found);
                }

                break;
            case Shape.OfList list:
                Walk(list.Item, blocks, found);
                break;
        }
    }
}
