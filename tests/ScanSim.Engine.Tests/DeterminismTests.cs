using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine.Tests;

public class DeterminismTests
{
    [Fact]
    public void One_thread_and_eight_give_the_same_rows()
    {
        var scenario = Busy();
        var one = CollectingSink.Of(scenario, new RunOptions { Threads = 1, Looks = LooksKept.All });
        var eight = CollectingSink.Of(scenario, new RunOptions { Threads = 8, Looks = LooksKept.All });
        Assert.True(one.Looks.Count > 300);
        one.AssertSame(eight);
    }

    [Fact]
    public void Another_seed_gives_other_draws_and_the_same_geometry()
    {
        var scenario = Busy();
        var a = CollectingSink.Of(scenario);
        var b = CollectingSink.Of(scenario with { Run = scenario.Run with { Seed = scenario.Run.Seed + 1 } });
        Assert.Equal(a.Truth, b.Truth);
        Assert.Equal(a.Looks.Select(l => l.SnrDb), b.Looks.Select(l => l.SnrDb));
        Assert.NotEqual(a.Looks.Select(l => l.StatisticDb), b.Looks.Select(l => l.StatisticDb));
    }

    [Fact]
    public void A_changed_RCS_of_one_target_leaves_the_other_targets_rows_unchanged()
    {
        var before = Busy();
        var after = before with { Targets = [.. before.Targets.Select(t => t.Id == "b" ? t with { RcsM2 = 40 * t.RcsM2 } : t)] };
        AssertOthersUnchanged(CollectingSink.Of(before), CollectingSink.Of(after), "b");
    }

    [Fact]
    public void An_added_target_leaves_the_other_targets_rows_unchanged()
    {
        var before = Busy();
        var after = before with { Targets = before.Targets.Insert(0, TestScenario.Still("new", 200, 20_000, 500, 1)) };
        AssertOthersUnchanged(CollectingSink.Of(before), CollectingSink.Of(after), "new");
    }

    [Fact]
    public void The_looks_that_are_kept_do_not_change_the_other_tables()
    {
        var scenario = Busy();
        var all = CollectingSink.Of(scenario, new RunOptions { Looks = LooksKept.All });
        var best = CollectingSink.Of(scenario, new RunOptions { Looks = LooksKept.Best });
        var none = CollectingSink.Of(scenario, new RunOptions { Looks = LooksKept.None });
        Assert.Equal(all.Plots, best.Plots);
        Assert.Equal(all.Plots, none.Plots);
        Assert.Equal(all.Scans, none.Scans);
        Assert.Empty(none.Looks);
        Assert.All(best.Looks.GroupBy(l => (l.Scan, l.Target)), g => Assert.Single(g));
        Assert.Subset(all.Looks.ToHashSet(), best.Looks.ToHashSet());
        foreach (var group in all.Looks.GroupBy(l => (l.Scan, l.Target)))
        {
            var kept = best.Looks.Single(l => (l.Scan, l.Target) == group.Key);
            Assert.Equal(group.OrderByDescending(l => l.Detected).ThenByDescending(l => l.SnrDb).First().Dwell, kept.Dwell);
        }
    }

    [Fact]
    public void A_longer_run_begins_with_the_shorter_one()
    {
        var scenario = Busy();
        var shorter = CollectingSink.Of(scenario with { Run = scenario.Run with { DurationS = 30 } });
        var longer = CollectingSink.Of(scenario);
        Assert.Equal(shorter.Hits, longer.Hits.Take(shorter.Hits.Count));
        Assert.Equal(shorter.Scans.SkipLast(1), longer.Scans.Take(shorter.Scans.Count - 1));
    }

    private static Scenario Busy()
    {
        var scenario = TestScenario.With(
            TestScenario.Moving("a", 30, 9_000, 200, 8, 30, 1),
            TestScenario.Moving("b", 359.8, 15_000, 90, 12, 800, 2),
            TestScenario.Circling("c", 120, 22_000, 80, 3, 5, 3),
            TestScenario.Circling("d", 270, 12_000, 60, -6, 2, 4),
            TestScenario.Still("e", 181, 30_000, 2_000, 0));
        return scenario with
        {
            Radar = scenario.Radar with
            {
                Processing = scenario.Radar.Processing with { FalseAlarmProbability = 1e-5 },
                Accuracy = new InstrumentErrors { RangeSigmaM = 5, AzimuthSigmaRad = 0.001 },
            },
        };
    }

    private static void AssertOthersUnchanged(CollectingSink before, CollectingSink after, string changed)
    {
        Assert.Equal(before.Looks.Where(l => l.Target != changed), after.Looks.Where(l => l.Target != changed));
        Assert.Equal(before.Hits.Where(h => h.Target != changed), after.Hits.Where(h => h.Target != changed));
        Assert.Equal(before.Truth.Where(t => t.Target != changed), after.Truth.Where(t => t.Target != changed));
        Assert.Equal(before.Plots.Where(p => p.Target != changed), after.Plots.Where(p => p.Target != changed));
        Assert.NotEqual(before.Looks.Count, after.Looks.Count);
    }
}
