using ScanSim.Recordings;

namespace ScanSim.Display.Tests;

public sealed class SceneBuilderTests
{
    private readonly SceneBuilder builder = new(SceneMaking.Scenario(2, 60));
    private readonly string first = SceneMaking.Scenario(2, 60).Targets[0].Id;
    private readonly string second = SceneMaking.Scenario(2, 60).Targets[1].Id;

    [Theory]
    [InlineData(true, LossReason.None, LookOutcome.Detected)]
    [InlineData(false, LossReason.Range, LookOutcome.MissedRange)]
    [InlineData(false, LossReason.AzimuthBeam, LookOutcome.MissedBeam)]
    [InlineData(false, LossReason.ElevationBeam, LookOutcome.MissedBeam)]
    [InlineData(false, LossReason.Fluctuation, LookOutcome.MissedChance)]
    [InlineData(false, LossReason.Eclipsing, LookOutcome.MissedMasked)]
    [InlineData(false, LossReason.SharedCell, LookOutcome.MissedMasked)]
    public void A_look_s_outcome_follows_from_what_it_was_lost_to(bool detected, LossReason lostTo, LookOutcome expected)
    {
        builder.AddLooks([SceneMaking.LookRow(first, 0, 1, 10, detected, lostTo)]);
        Assert.Equal(expected, Assert.Single(builder.Build().Targets[0].Looks).Outcome);
    }

    [Fact]
    public void Of_many_looks_in_a_scan_the_strongest_detected_one_is_kept()
    {
        builder.AddLooks(
        [
            SceneMaking.LookRow(first, 0, 1.0, 20, false, LossReason.Fluctuation),
            SceneMaking.LookRow(first, 0, 1.1, 12, true, LossReason.None),
            SceneMaking.LookRow(first, 0, 1.2, 15, true, LossReason.None),
            SceneMaking.LookRow(first, 0, 1.3, 14, true, LossReason.None),
            SceneMaking.LookRow(first, 1, 3.0, 5, false, LossReason.Range),
            SceneMaking.LookRow(first, 1, 3.1, 7, false, LossReason.AzimuthBeam),
        ]);
        var looks = builder.Build().Targets[0].Looks;
        Assert.Equal([(0, 15f, LookOutcome.Detected), (1, 7f, LookOutcome.MissedBeam)], looks.Select(l => (l.Scan, l.SnrDb, l.Outcome)));
    }

    [Theory]
    [InlineData(TargetView.BelowHorizon)]
    [InlineData(TargetView.BeyondInstrumentedRange)]
    [InlineData(TargetView.Blanked)]
    [InlineData(TargetView.OutsideSector)]
    public void A_scan_in_which_the_radar_could_not_look_is_no_miss(TargetView view)
    {
        builder.AddTruth([SceneMaking.TruthRow(first, 0, 1, 1000, 0, view: view), SceneMaking.TruthRow(first, 1, 3, 1000, 0)]);
        builder.AddLooks([SceneMaking.LookRow(first, 1, 3, 15, true, LossReason.None)]);
        builder.AddPlots([SceneMaking.PlotRow(first, 1, 3, 1000, 90)]);
        var target = builder.Build().Targets[0];
        Assert.Equal([LookOutcome.NoLook, LookOutcome.Detected], target.Looks.Select(l => l.Outcome));
        Assert.Equal(1, target.BlipScanRatio);
    }

    [Fact]
    public void The_blip_scan_ratio_counts_scans_with_a_plot_among_scans_in_view()
    {
        builder.AddTruth([.. Enumerable.Range(0, 5).Select(s => SceneMaking.TruthRow(first, s, 2.5 * s + 1, 1000, 0))]);
        builder.AddTruth([.. Enumerable.Range(0, 5).Select(s => SceneMaking.TruthRow(second, s, 2.5 * s + 1, 1000, 0))]);
        // Two plots in one scan count once; a plot of both counts for both.
        builder.AddPlots([SceneMaking.PlotRow(first, 0, 1, 1000, 90), SceneMaking.PlotRow(first, 0, 1.01, 1200, 90), SceneMaking.PlotRow(first + "+" + second, 3, 8.5, 1000, 90)]);
        var scene = builder.Build();
        Assert.Equal(0.4, scene.Targets[0].BlipScanRatio);
        Assert.Equal(0.2, scene.Targets[1].BlipScanRatio);
        Assert.Equal(3, scene.Plots.Length);
    }

    [Fact]
    public void An_echo_through_a_side_lobe_is_no_plot_of_the_targets_pass()
    {
        builder.AddTruth([.. Enumerable.Range(0, 4).Select(s => SceneMaking.TruthRow(first, s, 2.5 * s + 1, 1000, 0))]);
        // In its pass in scan 0, half a turn later in scan 1, just over the north mark of its pass in scan 3.
        builder.AddPlots([SceneMaking.PlotRow(first, 0, 1, 1000, 90), SceneMaking.PlotRow(first, 1, 4.75, 1000, 270), SceneMaking.PlotRow(first, 2, 8.49, 1000, 90)]);
        Assert.Equal(0.5, builder.Build().Targets[0].BlipScanRatio);
    }

    [Fact]
    public void Without_looks_the_plots_tell_what_was_detected_and_reasons_are_left_open()
    {
        builder.AddTruth([.. Enumerable.Range(0, 3).Select(s => SceneMaking.TruthRow(first, s, 2.5 * s + 1, 1000, 0, view: s == 2 ? TargetView.Blanked : TargetView.InView))]);
        builder.AddPlots([SceneMaking.PlotRow(first, 1, 3.5, 1000, 90)]);
        Assert.Equal([LookOutcome.MissedUnrecorded, LookOutcome.Detected, LookOutcome.NoLook], builder.Build().Targets[0].Looks.Select(l => l.Outcome));
    }

    [Fact]
    public void A_target_that_was_never_in_view_has_no_ratio() => Assert.True(double.IsNaN(builder.Build().Targets[0].BlipScanRatio));

    [Fact]
    public void An_id_that_the_scenario_does_not_have_is_an_error_that_names_table_and_id()
    {
        var fault = Assert.Throws<PictureException>(() => builder.AddTruth([SceneMaking.TruthRow("ghost", 0, 1, 1000, 0)]));
        Assert.Contains("truth table names target 'ghost'", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Plots_lie_at_their_slant_range_along_their_azimuth_in_order_of_time()
    {
        builder.AddPlots([SceneMaking.PlotRow("", 0, 2, 20_000, 270), SceneMaking.PlotRow(first, 0, 1, 10_000, 90)]);
        var plots = builder.Build().Plots;
        Assert.Equal([EchoKind.Target, EchoKind.Noise], plots.Select(p => p.Kind));
        Assert.Equal((10_000f, 0f), (plots[0].EastM, MathF.Round(plots[0].NorthM, 3)));
        Assert.Equal((-20_000f, 0f), (plots[1].EastM, MathF.Round(plots[1].NorthM, 3)));
    }

    [Fact]
    public void Plots_outside_the_time_asked_for_still_count_in_the_timeline()
    {
        var windowed = new SceneBuilder(SceneMaking.Scenario(2, 60)) { PlotsFromS = 5, PlotsToS = 10 };
        windowed.AddTruth([.. Enumerable.Range(0, 5).Select(s => SceneMaking.TruthRow(first, s, 2.5 * s + 1, 1000, 0))]);
        windowed.AddPlots([.. Enumerable.Range(0, 5).Select(s => SceneMaking.PlotRow(first, s, 2.5 * s + 1, 1000, 90))]);
        var scene = windowed.Build();
        Assert.Equal([6, 8.5], scene.Plots.Select(p => p.TimeS));
        Assert.Equal(1, scene.Targets[0].BlipScanRatio);
    }

    [Fact]
    public void A_scene_can_be_built_while_rows_still_come()
    {
        builder.AddTruth([.. Enumerable.Range(0, 4).Select(s => SceneMaking.TruthRow(first, s, 2.5 * s + 1, 1000, 0))]);
        Assert.Equal(4, builder.Build().Targets[0].Truth.Length);
        builder.AddTruth([SceneMaking.TruthRow(first, 4, 11, 1000, 0)]);
        Assert.Equal(5, builder.Build().Targets[0].Truth.Length);
    }

    [Fact]
    public void Looks_are_gathered_by_scan_whatever_order_they_come_in()
    {
        builder.AddLooks([.. ((int[])[3, 1, 4, 1, 0]).Select((scan, i) => SceneMaking.LookRow(first, scan, 2.5 * scan + 1, 10 + i, true, LossReason.None))]);
        Assert.Equal([(0, 14f), (1, 13f), (3, 10f), (4, 12f)], builder.Build().Targets[0].Looks.Select(l => (l.Scan, l.SnrDb)));
    }
}
