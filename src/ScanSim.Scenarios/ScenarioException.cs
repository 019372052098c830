using System.Collections.Immutable;

namespace ScanSim.Scenarios;

/// <summary>A scenario that cannot be used: all errors of its file; the message has one line for each and is for the user.</summary>
public sealed class ScenarioException(ImmutableArray<ScenarioFault> faults) : Exception(Text(faults))
{
    private const int LinesShown = 200;

    public ImmutableArray<ScenarioFault> Faults { get; } = faults;

    private static string Text(ImmutableArray<ScenarioFault> faults)
    {
        var lines = faults.Take(LinesShown).Select(fault => fault.ToString());
        return string.Join('\n', faults.Length > LinesShown ? lines.Append($"and {faults.Length - LinesShown} more errors") : lines);
    }
}
