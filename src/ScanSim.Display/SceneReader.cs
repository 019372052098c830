using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display;

/// <summary>Makes a scene of a finished recording.</summary>
public static class SceneReader
{
    /// <summary>
    /// The whole of a recording's timeline, and for the plan the plots from <paramref name="plotsFromS"/> to <paramref name="plotsToS"/>
    /// (for one picture: from its time less the afterglow to its time).
    /// </summary>
    /// <exception cref="RecordingException">A table is damaged.</exception>
    /// <exception cref="ScenarioException">The recording's scenario.json is not valid for this version.</exception>
    public static Scene Load(Recording recording, double plotsFromS = double.NegativeInfinity, double plotsToS = double.PositiveInfinity) =>
        Load(recording, ScenarioFile.Parse(recording.ScenarioText, "scenario.json of the recording"), plotsFromS, plotsToS);

    /// <summary>The whole timeline and no plot.</summary>
    internal static Scene LoadWithoutPlots(Recording recording, Scenario scenario) => Load(recording, new SceneBuilder(scenario, ScansOf(recording)), builder =>
    {
        foreach (var row in recording.PlotSummaries())
        {
            builder.Add(row);
        }
    });

    /// <summary>The same with a scenario that was read before.</summary>
    public static Scene Load(Recording recording, Scenario scenario, double plotsFromS, double plotsToS) =>
        Load(recording, new SceneBuilder(scenario, ScansOf(recording)) { PlotsFromS = plotsFromS, PlotsToS = plotsToS }, builder =>
        {
            foreach (var row in recording.Plots())
            {
                builder.AddPlots(new ReadOnlySpan<PlotRow>(in row));
            }
        });

    /// <summary>For room only: a manifest that lies costs memory, so not more than a day's worth at a scan a second.</summary>
    private static int ScansOf(Recording recording) => (int)Math.Clamp(recording.Tables["scans"].Rows, 0, 86_400);

    private static Scene Load(Recording recording, SceneBuilder builder, Action<SceneBuilder> addPlots)
    {
        foreach (var row in recording.Scans())
        {
            builder.AddScan(row);
        }

        // Reading is mostly decoding: a core for each of the two large tables.
        var looks = Task.Run(() =>
        {
            foreach (var row in recording.LookSummaries())
            {
                builder.Add(row);
            }
        });
        var truth = Task.Run(() =>
        {
            foreach (var row in recording.TruthSummaries())
            {
                builder.Add(row);
            }
        });
        addPlots(builder);
        looks.GetAwaiter().GetResult();
        truth.GetAwaiter().GetResult();

        // A run may have been made shorter or with another start than its scenario says.
        return builder.Build() with { StartUtc = recording.Head.StartUtc, DurationS = recording.Head.DurationS };
    }
}
