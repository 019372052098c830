using ScanSim.Display.Replay;
using ScanSim.Display.Windowing;
using ScanSim.Recordings;
using SkiaSharp;
using static ScanSim.Display.Tests.Replay.ReplayMaking;

namespace ScanSim.Display.Tests.Replay;

/// <summary>Events in, state out; places are worked out here from the plan's definition: its middle, and the range to its nearer edge less 30 units.</summary>
public sealed class ReplayInputTests : IDisposable
{
    private readonly TemporaryFolder folder = new();
    private readonly ReplayScreen screen;
    private readonly SKRect plan;
    private readonly SKRect rows;
    private readonly double pxPerM;

    /// <summary>One target at bearing 090 and 10 km, another at 225 and 20 km, for 100 s; the first is seen in all scans but 3, 4 and 8.</summary>
    public ReplayInputTests()
    {
        var scenario = SceneMaking.Scenario(2, 100);
        scenario = scenario with { Targets = [scenario.Targets[0] with { Id = "east" }, scenario.Targets[1] with { Id = "south-west" }] };
        screen = Screen([Recording(folder.In("run"), scenario, LooksKept.Best, Feed)]);
        var layout = ReplayLayout.Of(Width, Height, screen.World);
        (plan, rows) = (layout.Plans[0], layout.Rows);
        pxPerM = (Math.Min(plan.Width, plan.Height) / 2 - 30) / SceneMaking.RangeM;
    }

    public void Dispose()
    {
        screen.Dispose();
        folder.Dispose();
    }

    [Fact]
    public void A_click_at_bearing_090_and_10_km_selects_the_target_there()
    {
        screen.Press(Key(WindowKey.End));
        screen.Click(plan.MidX + (float)(10_000 * pxPerM), plan.MidY);
        Assert.Equal("east", screen.State.Selected);
        var diagonal = (float)(20_000 * pxPerM * Math.Sqrt(0.5));
        screen.Click(plan.MidX - diagonal, plan.MidY + diagonal);
        Assert.Equal("south-west", screen.State.Selected);
        screen.Click(plan.MidX, plan.MidY - 100);
        Assert.Null(screen.State.Selected);
    }

    [Fact]
    public void With_bearing_090_up_the_target_at_090_is_clicked_straight_above_the_site()
    {
        screen.Press(Key(WindowKey.End), Key(WindowKey.Tab), Typed('b'), Key(WindowKey.Backspace));
        screen.Click(plan.MidX, plan.MidY - (float)(10_000 * pxPerM));
        Assert.Equal("east", screen.State.Selected);
        Assert.Equal(Math.PI / 2, screen.State.UpRad, 1e-6);
        screen.Press(Typed('B'));
        Assert.Equal(0, screen.State.UpRad);
    }

    [Theory]
    [InlineData(0, 0, 3)]
    [InlineData(120, -75, 5)]
    [InlineData(-200, 90, -2)]
    public void The_wheel_keeps_what_lies_under_the_pointer(float dx, float dy, float notches)
    {
        screen.Press(Typed('.'), Typed('.'));
        var at = new SKPoint(plan.MidX + dx, plan.MidY + dy);
        var before = ReplayMoves.Projection(screen.State, screen.World, plan).FromPlan(at);
        screen.Press(Wheel(at.X, at.Y, notches));
        var after = ReplayMoves.Projection(screen.State, screen.World, plan).FromPlan(at);
        Assert.Equal(before.EastM, after.EastM, 0.01);
        Assert.Equal(before.NorthM, after.NorthM, 0.01);
        Assert.Equal(SceneMaking.RangeM * Math.Pow(1.2, -notches), screen.State.RangeM!.Value, 1e-6 * SceneMaking.RangeM);
    }

    [Fact]
    public void A_drag_moves_the_plan_by_the_metres_that_the_pointer_went()
    {
        screen.Press(
            Pointer(WindowEventKind.PointerMoved, 300, 200), Pointer(WindowEventKind.PointerDown, 300, 200, PointerButton.Left),
            Pointer(WindowEventKind.PointerMoved, 340, 210), Pointer(WindowEventKind.PointerMoved, 400, 250), Pointer(WindowEventKind.PointerUp, 400, 250, PointerButton.Left));
        Assert.Equal(-100 / pxPerM, screen.State.CentreEastM, 0.1);
        Assert.Equal(50 / pxPerM, screen.State.CentreNorthM, 0.1);
        Assert.Null(screen.State.Selected);
        Assert.Equal(DragKind.None, screen.State.Drag);
    }

    [Fact]
    public void A_trembling_click_is_no_drag()
    {
        screen.Press(Key(WindowKey.End));
        var x = plan.MidX + (float)(10_000 * pxPerM);
        screen.Press(
            Pointer(WindowEventKind.PointerMoved, x, plan.MidY), Pointer(WindowEventKind.PointerDown, x, plan.MidY, PointerButton.Left),
            Pointer(WindowEventKind.PointerMoved, x + 2, plan.MidY), Pointer(WindowEventKind.PointerUp, x + 2, plan.MidY, PointerButton.Left));
        Assert.Equal((0, "east"), (screen.State.CentreEastM, screen.State.Selected));
    }

    [Theory]
    [InlineData(0.25)]
    [InlineData(0.8)]
    public void A_click_on_the_timeline_goes_to_that_time_and_a_drag_along(double share)
    {
        var x = rows.Left + (float)share * rows.Width;
        screen.Press(Pointer(WindowEventKind.PointerMoved, x, rows.MidY), Pointer(WindowEventKind.PointerDown, x, rows.MidY, PointerButton.Left));
        Assert.Equal(100 * share, screen.State.TimeS, 0.01);
        screen.Press(Pointer(WindowEventKind.PointerMoved, rows.Left + 0.5f * rows.Width, 10));
        Assert.Equal(50, screen.State.TimeS, 0.01);
        screen.Press(Pointer(WindowEventKind.PointerUp, 0, 0, PointerButton.Left), Pointer(WindowEventKind.PointerMoved, rows.Left, rows.MidY));
        Assert.Equal(50, screen.State.TimeS, 0.01);
    }

    [Fact]
    public void The_wheel_on_the_timeline_zooms_about_the_time_under_the_pointer()
    {
        var x = rows.Left + 0.3f * rows.Width;
        screen.Press(Wheel(x, rows.MidY, 4));
        Assert.Equal(30, ReplayInput.TimeAt(screen.State, rows, x), 1e-3);
        Assert.Equal(100 * Math.Pow(1.2, -4), screen.State.TimelineToS - screen.State.TimelineFromS, 1e-6);
        screen.Press(Wheel(x, rows.MidY, -20));
        Assert.Equal((0.0, 100.0), (screen.State.TimelineFromS, screen.State.TimelineToS));
    }

    [Fact]
    public void A_click_on_a_row_s_name_selects_its_target()
    {
        screen.Click(rows.Left - 30, rows.Top + 1.5f * ReplayLayout.RowHeight);
        Assert.Equal("south-west", screen.State.Selected);
    }

    [Fact]
    public void N_goes_from_miss_to_miss_and_D_to_where_the_target_is_seen_again()
    {
        screen.Press(Key(WindowKey.Tab));
        Assert.Equal([3, 4, 8, 8], Scans('n', 4));
        Assert.Equal("east has no later miss.", screen.State.Message);
        Assert.Equal([4, 3, 3], Scans('N', 3));
        screen.Press(Key(WindowKey.Home));
        Assert.Equal([0, 5, 9, 9], Scans('d', 4));
        Assert.Equal([5, 0, 0], Scans('D', 3));

        int[] Scans(char key, int times) => [.. Enumerable.Range(0, times).Select(_ =>
        {
            screen.Press(Typed(key));
            return (int)Math.Floor(screen.State.TimeS / 2.5);
        })];
    }

    [Fact]
    public void Arrows_step_from_look_to_look_and_with_shift_from_scan_to_scan()
    {
        screen.Press(Key(WindowKey.Space), Key(WindowKey.Right));
        Assert.Equal((0.625, false), (screen.State.TimeS, screen.State.IsPlaying));
        screen.Press(Key(WindowKey.Right));
        Assert.Equal(1.5625, screen.State.TimeS, 1e-9);
        screen.Press(Key(WindowKey.Left));
        Assert.Equal(0.625, screen.State.TimeS, 1e-9);
        screen.Press(Key(WindowKey.Right, shift: true));
        Assert.Equal(2.5, screen.State.TimeS, 1e-9);
        screen.Press(Key(WindowKey.Right, shift: true), Key(WindowKey.Right, shift: true), Key(WindowKey.Left, shift: true));
        Assert.Equal(5, screen.State.TimeS, 1e-9);
    }

    [Fact]
    public void Speeds_run_from_a_quarter_to_64()
    {
        Assert.Equal([2, 4, 8, 16, 32, 64, 64], Speeds('+', 7));
        screen.Press(Typed('-'));
        Assert.Equal([16, 8, 4, 2, 1, 0.5, 0.25, 0.25], Speeds('[', 8));

        double[] Speeds(char key, int times) => [.. Enumerable.Range(0, times).Select(_ =>
        {
            screen.Press(Typed(key));
            return screen.State.SpeedRatio;
        })];
    }

    [Fact]
    public void Time_runs_by_the_speed_goes_round_the_loop_and_stops_at_the_end()
    {
        screen.Press(Key(WindowKey.Right, shift: true), Typed('l'), Key(WindowKey.Right, shift: true), Key(WindowKey.Right, shift: true), Typed('l'));
        Assert.Equal((2.5, 7.5), (screen.State.LoopFromS, screen.State.LoopToS));
        screen.Press(Typed('+'), Typed('+'), Key(WindowKey.Space));
        Assert.True(screen.Advance(0.1));
        Assert.Equal(2.5 + 0.4, screen.State.TimeS, 1e-9);
        screen.Press(Typed('l'), Key(WindowKey.End), Key(WindowKey.Left, shift: true), Key(WindowKey.Space));
        for (var i = 0; i < 20; i++)
        {
            screen.Advance(0.1);
        }

        Assert.Equal((100.0, false), (screen.State.TimeS, screen.State.IsPlaying));
        screen.Press(Key(WindowKey.Space));
        Assert.Equal((0.0, true), (screen.State.TimeS, screen.State.IsPlaying));
    }

    [Fact]
    public void Escape_leaves_the_help_page_first_and_q_closes()
    {
        screen.Press(Typed('?'), Key(WindowKey.Escape));
        Assert.False(screen.State.IsHelpShown || screen.WantsToClose);
        screen.Press(Typed('q'));
        Assert.True(screen.WantsToClose);
    }

    [Fact]
    public void A_state_that_did_not_change_needs_no_painting()
    {
        Assert.False(screen.Handle(Typed('§')));
        Assert.False(screen.Advance(1));
        Assert.True(screen.Handle(Typed('u')));
    }

    [Fact]
    public void The_plot_under_the_pointer_tells_its_values()
    {
        screen.Press(Key(WindowKey.End));
        var at = new SKPoint(plan.MidX + (float)(10_000 * pxPerM) + 2, plan.MidY);
        var plot = ReplayPick.Plot(screen.State, screen.World, 0, plan, at);
        Assert.Equal(97.5 + 0.625, plot!.Value.TimeS, 1e-9);
        Assert.Equal(["east", "10.00 km", "090.00°", "15.0 dB", "3"], HoverBox.Lines(plot.Value, screen.State, screen.World.First.Scene).Take(5).Select(line => line.Value));
        Assert.Null(ReplayPick.Plot(screen.State, screen.World, 0, plan, new SKPoint(plan.MidX + 40, plan.MidY - 60)));
    }

    private static void Feed(IRecordingSink sink)
    {
        for (var scan = 0; scan < 40; scan++)
        {
            var startS = 2.5 * scan;
            var isMissed = scan is 3 or 4 or 8;
            var diagonalM = -20_000 * Math.Sqrt(0.5);
            sink.AddScan(new ScanRow { Scan = scan, StartS = startS, EndS = startS + 2.5, Looks = 2, Hits = 1, FalseHits = 0, Plots = isMissed ? 0 : 1, FalsePlots = 0 });
            sink.AddLooks([
                SceneMaking.LookRow("east", scan, startS + 0.625, 12, !isMissed, isMissed ? LossReason.Fluctuation : LossReason.None),
                SceneMaking.LookRow("south-west", scan, startS + 1.5625, -3, false, LossReason.Range)]);
            sink.AddPlots(isMissed ? [] : [SceneMaking.PlotRow("east", scan, startS + 0.625, 10_000, 90)]);
            sink.AddTruth([
                SceneMaking.TruthRow("east", scan, startS + 0.625, 10_000, 0),
                SceneMaking.TruthRow("south-west", scan, startS + 1.5625, diagonalM, diagonalM)]);
        }
    }
}
