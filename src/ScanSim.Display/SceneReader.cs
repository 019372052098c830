using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display;

/// <summary>Makes a scene of a finished recording.</summary>
public static class SceneReader
{
    /// <summary>Everything for the timeline, and the plots from <paramref name="plotsFromS"/> to <paramref name="plotsToS"/> for the plan.</summary>
    /// <param name="recording">Read from disk while this runs; its faults come out as <see cref="RecordingException"/>.</param>
    /// <param name="scenario">Of the recording's own scenario text.</param>
    /// <param name="plotsFromS">For one picture: its time less the afterglow.</param>
    /// <param name="plotsToS">For one picture: its time.</param>
    public static Scene Load(
        Recording recording, Scenario scenario, double plotsFromS = double.NegativeInfinity, double plotsToS = double.PositiveInfinity)
    {
        var builder = new SceneBuilder(scenario) { PlotsFromS = plotsFromS, PlotsToS = plotsToS };
        foreach (var row in recording.Scans())
        {
            builder.AddScan(row);
        }

        foreach (var row in recording.Looks())
        {
            builder.AddLooks(new ReadOnlySpan<LookRow>(in row));
        }

        foreach (var row in recording.Plots())
        {
            builder.AddPlots(new ReadOnlySpan<PlotRow>(in row));
        }

        foreach (var row in recording.Truth())
        {
            builder.AddTruth(new ReadOnlySpan<TruthRow>(in row));
        }

        // A run may have been made shorter or with another start than its scenario says.
        return builder.Build() with { StartUtc = recording.Head.StartUtc, DurationS = recording.Head.DurationS };
    }
}
