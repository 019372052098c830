using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Explaining;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>Opens what is to be explained and checks that it can be.</summary>
internal sealed class ExplainRequest
{
    private readonly Target target;
    private readonly TargetStoryReader reader;

    public ExplainRequest(string folder, string id, double pd, RangeUnit unit)
    {
        Recording = Recording.Open(folder);
        if (Recording.Head.Looks == LooksKept.None)
        {
            throw new InputException($"{folder}: the recording kept no looks; run the scenario again with --looks best or --looks all");
        }

        Scenario = ScenarioFile.Parse(Recording.ScenarioText, Path.Combine(folder, "scenario.json"));
        target = Scenario.Targets.FirstOrDefault(t => string.Equals(t.Id, id, StringComparison.Ordinal))
            ?? throw new InputException($"--target: read \"{id}\", expected one of {string.Join(", ", Scenario.Targets.Select(t => t.Id))}");
        var falseAlarms = Scenario.Radar.Processing.FalseAlarmProbability;
        if (pd <= falseAlarms)
        {
            throw new InputException(Text($"--pd: read {pd}, expected more than the false-alarm probability of the scenario, {falseAlarms}"));
        }

        reader = new TargetStoryReader(Recording, Scenario, new LookExplainer(Scenario, pd, unit));
    }

    public Recording Recording { get; }

    public Scenario Scenario { get; }

    public TargetStory Read(int? scan, double? fromS, double? toS)
    {
        if (scan is { } number)
        {
            return ReadScan(number);
        }

        var durationS = Recording.Head.DurationS;
        var (beginS, endS) = (fromS ?? 0, toS ?? durationS);
        if (beginS > durationS)
        {
            throw new InputException(Text($"--from: read {beginS:0.###} s, expected a time within the recording: 0 s to {durationS:0.###} s"));
        }

        if (endS > durationS)
        {
            throw new InputException(Text($"--to: read {endS:0.###} s, expected a time within the recording: 0 s to {durationS:0.###} s"));
        }

        if (beginS > endS)
        {
            throw new InputException(Text($"--from: read {beginS:0.###} s, expected a time before --to, {endS:0.###} s"));
        }

        var story = reader.Read(target, beginS, endS);
        return story.Passes.Length > 0 ? story : throw new InputException(
            Text($"--target: {target.Id} was not passed by the beam from {beginS:0.###} s to {endS:0.###} s, expected a time in its life: {Life()}"));
    }

    private TargetStory ReadScan(int number)
    {
        var scans = Recording.Scans().ToList();
        if (number >= scans.Count)
        {
            throw new InputException(Text($"--scan: read {number}, expected a scan of the recording: 0 to {scans.Count - 1}"));
        }

        var story = reader.Read(target, scans[number]);
        return story.Passes.Length > 0 ? story : throw new InputException(
            Text($"--scan: read {number} ({scans[number].StartS:0.0} s to {scans[number].EndS:0.0} s), in which the beam did not pass {target.Id}; expected one in its life: {Life()}"));
    }

    private string Life() => Text($"{target.Track.StartS:0.###} s to {Math.Min(target.Track.EndS, Recording.Head.DurationS):0.###} s");

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
