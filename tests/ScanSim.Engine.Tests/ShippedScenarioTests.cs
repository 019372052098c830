using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Engine.Tests;

public class ShippedScenarioTests
{
    public static TheoryData<string> Files() => [.. Directory.GetFiles(Path.Combine(RepositoryRoot.Find(), "scenarios"), "*.json").Select(f => Path.GetFileName(f)).Order()];

    [Theory]
    [MemberData(nameof(Files))]
    public void Culled_and_plain_loop_agree_hit_for_hit(string file)
    {
        var scenario = Load(file);
        scenario = scenario with { Run = scenario.Run with { DurationS = Math.Min(60, scenario.Run.DurationS) } };
        var options = new RunOptions { Looks = LooksKept.All };
        var quick = CollectingSink.Of(scenario, options);
        quick.AssertSame(CollectingSink.Of(scenario, options with { EveryDwell = true }));
        Assert.NotEmpty(quick.Hits);
    }

    [Theory]
    [MemberData(nameof(Files))]
    public void Every_target_is_followed_in_truth_and_seen_at_least_once(string file)
    {
        var scenario = Load(file);
        var sink = CollectingSink.Of(scenario, new RunOptions { Looks = LooksKept.Best });
        var plotted = sink.Plots.SelectMany(p => p.Target.Split('+', StringSplitOptions.RemoveEmptyEntries)).ToHashSet();
        Assert.All(scenario.Targets, t => Assert.Contains(t.Id, plotted));
        Assert.Equal(scenario.Targets.Select(t => t.Id).Order(), sink.Truth.Select(t => t.Target).Distinct().Order());
        Assert.True(sink.Looks.Where(l => !l.Detected).Select(l => l.LostTo).Distinct().Count() >= 2, "misses of more than one kind");
    }

    private static Scenario Load(string file) => ScenarioFile.Load(Path.Combine(RepositoryRoot.Find(), "scenarios", file));
}
