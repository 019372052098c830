using ScanSim.Physics.Draws;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>Target ids must differ, and so must the numbers under which the targets draw.</summary>
internal static class TargetRules
{
    public static void Check(CheckedBlock root, FaultList faults)
    {
        var lines = new Dictionary<string, int>(StringComparer.Ordinal);
        var names = new Dictionary<uint, string>();
        foreach (var target in root.Blocks("targets").Where(target => target.Has("id")))
        {
            var (id, at) = (target.Text("id"), target.Values["id"]);
            if (!lines.TryAdd(id, at.Json.Line))
            {
                faults.Add(at, $"\"{id}\", which the target in line {lines[id]} has already", "another id");
            }
            else if (!names.TryAdd(DrawEntity.Of(id), id))
            {
                faults.Add(at, $"\"{id}\", which would share the random draws of \"{names[DrawEntity.Of(id)]}\" (same 32-bit hash)", "another id: rename one of the two");
            }
        }
    }
}
