using System.Collections.Immutable;
using ScanSim.Display.Explaining;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Replay;

/// <summary>A recording opened for the replay: the timeline of all targets in memory, plots, hits and looks read when they are shown.</summary>
public sealed class ReplayRecording
{
    private readonly Recording recording;

    private ReplayRecording(Recording recording, Scenario scenario, Scene scene, string name)
    {
        this.recording = recording;
        Scenario = scenario;
        Scene = scene;
        Name = name;
        Facts = [.. scene.Targets.Select(target => TargetFacts.Of(target))];
        Shades = SnrShades.Of(scene);
        Explainer = new LookExplainer(scenario);
    }

    /// <summary>Name of the folder, to tell two recordings of one scenario apart.</summary>
    public string Name { get; }

    public Scenario Scenario { get; }

    /// <summary>Without plots: those come in stretches.</summary>
    public Scene Scene { get; }

    /// <summary>In the order of the scene's targets.</summary>
    internal ImmutableArray<TargetFacts> Facts { get; }

    internal SnrShades Shades { get; }

    /// <summary>For the thread that paints.</summary>
    internal LookExplainer Explainer { get; }

    /// <summary>Opens the recording in a folder.</summary>
    /// <exception cref="RecordingException">The folder is no recording, or a table is damaged.</exception>
    /// <exception cref="ScenarioException">Its scenario.json is not valid for this version.</exception>
    public static ReplayRecording Open(string folder)
    {
        var opened = Recording.Open(folder);
        return Open(folder, opened, ScenarioFile.Parse(opened.ScenarioText, "scenario.json of the recording"));
    }

    internal static ReplayRecording Open(string folder, Recording recording, Scenario scenario)
    {
        var scene = SceneReader.LoadWithoutPlots(recording, scenario);
        // Of some ten bytes that reading allocates one is kept; left to itself the collector waits until the rest is several hundred megabytes.
        GC.Collect(GC.MaxGeneration, GCCollectionMode.Aggressive, blocking: true, compacting: true);
        return new(recording, scenario, scene, Path.GetFileName(Path.TrimEndingDirectorySeparator(Path.GetFullPath(folder))));
    }

    public int IndexOf(string id)
    {
        for (var i = 0; i < Scene.Targets.Length; i++)
        {
            if (string.Equals(Scene.Targets[i].Id, id, StringComparison.Ordinal))
            {
                return i;
            }
        }

        return -1;
    }

    /// <summary>Reads plots and hits of a stretch; takes some hundredths of a second.</summary>
    public ReplayStretch Read(double fromS, double toS)
    {
        var plots = recording.Plots(fromS, toS).Select(row => SceneBuilder.MarkOf(row)).OrderBy(plot => plot.TimeS);
        var hits = recording.Hits(fromS, toS).Select(row =>
        {
            var (sin, cos) = Math.SinCos(row.BeamAzimuthDeg * (Math.PI / 180));
            return new HitMark(row.TimeS, (float)(row.RangeM * sin), (float)(row.RangeM * cos), row.Kind);
        }).OrderBy(hit => hit.TimeS);
        return Lean(new ReplayStretch(fromS, toS, [.. plots], [.. hits]));
    }

    /// <summary>Reads one target's looks, in order of time.</summary>
    public ImmutableArray<LookRow> ReadLooks(string id, double fromS, double toS) =>
        Lean(recording.LooksOf(id, fromS, toS).OrderBy(look => look.TimeS).ToImmutableArray());

    /// <summary>Has the collector clear up after a read, beside the painting.</summary>
    private static T Lean<T>(T read)
    {
        GC.Collect(GC.MaxGeneration, GCCollectionMode.Forced, blocking: false);
        return read;
    }
}
