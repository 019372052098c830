using System.Collections.Immutable;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios.Format;

/// <summary>Gathers the faults of one file; hands them out in the file's order.</summary>
internal sealed class FaultList(string file)
{
    private readonly List<ScenarioFault> faults = [];

    public int Count => faults.Count;

    public void Add(int line, int column, string path, string read, string expected) =>
        faults.Add(new ScenarioFault(file, line, column, path, read, expected));

    public void Add(JsonValue at, string path, string read, string expected) => Add(at.Line, at.Column, path, read, expected);

    public void Add(CheckedValue at, string read, string expected) => Add(at.Json, at.Path, read, expected);

    public ImmutableArray<ScenarioFault> InOrder() =>
        [.. faults.OrderBy(fault => fault.Line).ThenBy(fault => fault.Column)];
}
