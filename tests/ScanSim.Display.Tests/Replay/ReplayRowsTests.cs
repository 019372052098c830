using System.Collections.Immutable;
using ScanSim.Display.Replay;
using ScanSim.Recordings;

namespace ScanSim.Display.Tests.Replay;

public sealed class ReplayRowsTests
{
    [Fact]
    public void Rows_are_sorted_by_scenario_id_first_detection_and_worst_gap()
    {
        using var folder = new TemporaryFolder();
        var scenario = SceneMaking.Scenario(3, 20);
        scenario = scenario with { Targets = [scenario.Targets[0] with { Id = "b" }, scenario.Targets[1] with { Id = "c" }, scenario.Targets[2] with { Id = "a" }] };
        // Seen or missed in scans 0 to 5; b has the longest gap, c is seen first, a never.
        var recording = ReplayMaking.Recording(folder.In("run"), scenario, LooksKept.Best, sink => Feed(sink, ("b", ".x...x"), ("c", "x.x.xx"), ("a", "-..-..")));
        Assert.Equal("b c a", Ids(RowOrder.Scenario));
        Assert.Equal("a b c", Ids(RowOrder.Id));
        Assert.Equal("c b a", Ids(RowOrder.FirstDetection));
        Assert.Equal("b a c", Ids(RowOrder.WorstGap));

        string Ids(RowOrder order) => string.Join(' ', ReplayRow.Of([recording], order).Select(row => row.Id));
    }

    [Fact]
    public void Two_recordings_share_a_row_for_each_id()
    {
        using var folder = new TemporaryFolder();
        var scenario = SceneMaking.Scenario(3, 10);
        var (a, b, c) = (scenario.Targets[0] with { Id = "a" }, scenario.Targets[1] with { Id = "b" }, scenario.Targets[2] with { Id = "c" });
        var left = ReplayMaking.Recording(folder.In("left"), scenario with { Targets = [b, a] });
        var right = ReplayMaking.Recording(folder.In("right"), scenario with { Targets = [c, a] });
        Assert.Equal([new("b", 0, -1), new("a", 1, 1), new ReplayRow("c", -1, 0)], ReplayRow.Of([left, right], RowOrder.Scenario));
        using var screen = ReplayMaking.Screen([left, right]);
        foreach (var id in (string[])["a", "b", "c"])
        {
            screen.Press(ReplayMaking.Key(ScanSim.Display.Windowing.WindowKey.Tab));
            PaintOnce(screen);
            Assert.Contains(screen.State.Selected, (string[])["a", "b", "c"]);
        }
    }

    [Fact]
    public void Passes_are_compared_with_the_nearest_in_time_of_the_other_antenna()
    {
        // Left turns in 5 s, right in 2.5 s and passes the target 0.3 s later: its passes 0, 2, 4, 6 belong to the left's.
        var left = Target(5, 1, "x.x.-");
        var right = Target(2.5, 1.3, "x.xx.x.x-.");
        var marks = Comparison.Of(left, 5, right, 2.5);
        Assert.Equal([ComparedOutcome.Both, ComparedOutcome.OnlyRight, ComparedOutcome.OnlyLeft, ComparedOutcome.Neither, ComparedOutcome.NoLook], marks.Select(mark => mark.Outcome));
        Assert.Equal([1, 6, 11, 16, 21], marks.Select(mark => mark.TimeS));
        // The other way round the same passes are compared, with left and right exchanged.
        Assert.Equal(
            [ComparedOutcome.Both, ComparedOutcome.OnlyLeft, ComparedOutcome.OnlyRight, ComparedOutcome.Neither, ComparedOutcome.NoLook],
            Comparison.Of(right, 2.5, left, 5).Select(mark => mark.Outcome));
    }

    [Fact]
    public void A_target_that_only_one_recording_has_is_seen_by_that_one_or_by_neither()
    {
        Assert.Equal([ComparedOutcome.OnlyLeft, ComparedOutcome.Neither, ComparedOutcome.NoLook], Comparison.Of(Target(5, 1, "x.-"), 5, null, 2.5).Select(mark => mark.Outcome));
        Assert.Equal([ComparedOutcome.OnlyRight, ComparedOutcome.Neither], Comparison.Of(null, 5, Target(2.5, 1, "x."), 2.5).Select(mark => mark.Outcome));
    }

    private static SceneTarget Target(double periodS, double firstS, string story) => new()
    {
        Id = "a",
        Class = "",
        Truth = [],
        Looks = [.. story.Select((c, i) => new LookMark(firstS + i * periodS, i, 10, c switch { 'x' => LookOutcome.Detected, '.' => LookOutcome.MissedRange, _ => LookOutcome.NoLook }))],
        ScansInView = story.Length,
        ScansWithPlot = 0,
    };

    private static void Feed(IRecordingSink sink, params (string Id, string Story)[] targets)
    {
        for (var scan = 0; scan < targets[0].Story.Length; scan++)
        {
            sink.AddScan(new ScanRow { Scan = scan, StartS = 2.5 * scan, EndS = 2.5 * scan + 2.5, Looks = 0, Hits = 0, FalseHits = 0, Plots = 0, FalsePlots = 0 });
            foreach (var ((id, story), i) in targets.Select((target, i) => (target, i)))
            {
                var timeS = 2.5 * scan + 0.1 * (i + 1);
                var isSeen = story[scan] == 'x';
                sink.AddTruth([SceneMaking.TruthRow(id, scan, timeS, 1000 * (i + 1), 500, view: story[scan] == '-' ? TargetView.Blanked : TargetView.InView)]);
                sink.AddLooks(story[scan] == '-' ? [] : [SceneMaking.LookRow(id, scan, timeS, 10, isSeen, isSeen ? LossReason.None : LossReason.Range)]);
            }
        }
    }

    private static void PaintOnce(ReplayScreen screen)
    {
        screen.WaitForRows();
        using var surface = SkiaSharp.SKSurface.Create(new SkiaSharp.SKImageInfo(1280, 800));
        screen.Paint(surface.Canvas, 1280, 800, 1);
    }
}
