namespace ScanSim.Scenarios.Json;

/// <summary>Where the text stops being JSON. Never leaves this project: it becomes a <see cref="ScenarioFault"/>.</summary>
internal sealed class JsonTextException(int line, int column, string read) : Exception(read)
{
    public int Line { get; } = line;

    public int Column { get; } = column;
}
