using ScanSim.Display.Explaining;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Tests.Explaining;

public sealed class TargetStoryTests : IDisposable
{
    private const double PeriodS = 2.5;

    private readonly TemporaryFolder folder = new();
    private readonly TemporaryFolder recordings = new();
    private readonly Scenario scenario = SceneMaking.Scenario(2, 60);
    private readonly List<LookRow> looks = [];
    private readonly List<PlotRow> plots = [];
    private readonly List<TruthRow> truth = [];
    private int written;

    public void Dispose()
    {
        folder.Dispose();
        recordings.Dispose();
    }

    [Fact]
    public void Each_scan_has_its_outcome_and_its_reason()
    {
        Pass(0, TargetView.InView, plot: true, Detected(0));
        Pass(1, TargetView.InView, plot: false, Missed(1, LossReason.Range));
        Pass(2, TargetView.InView, plot: false, Missed(2, LossReason.Fluctuation));
        Pass(3, TargetView.InView, plot: false, Detected(3));
        Pass(4, TargetView.BelowHorizon, plot: false);
        Pass(5, TargetView.Blanked, plot: false, Missed(5, LossReason.AzimuthBeam));
        Pass(6, TargetView.InView, plot: false);
        Pass(7, TargetView.InView, plot: true, Missed(7, LossReason.Range));
        var story = Read();
        Assert.Equal(
            [PassOutcome.Seen, PassOutcome.Range, PassOutcome.Chance, PassOutcome.HitWithoutPlot, PassOutcome.BelowHorizon, PassOutcome.Blanked, PassOutcome.NoDwell, PassOutcome.Seen],
            story.Passes.Select(p => p.Outcome));
        Assert.EndsWith(", no plot where it was", story.Passes[3].Reason, StringComparison.Ordinal);
        Assert.StartsWith("below the horizon by ", story.Passes[4].Reason, StringComparison.Ordinal);
        Assert.StartsWith("in a blanked sector", story.Passes[5].Reason, StringComparison.Ordinal);
        Assert.Equal("seen in a look that counts to the neighbouring scan", story.Passes[7].Reason);
        Assert.Equal(6, story.Passes.Count(p => p.InView));
        Assert.Equal(4, story.Passes.Count(p => p.IsMissed));
        Assert.Equal((PassOutcome.Seen, 2), story.Outcomes().First());
    }

    [Fact]
    public void Stretches_are_passes_in_view_without_a_plot_and_the_longest_comes_first()
    {
        foreach (var (scan, view, plot) in new[]
        {
            (0, TargetView.InView, false), (1, TargetView.InView, true), (2, TargetView.InView, false), (3, TargetView.InView, false), (4, TargetView.InView, false),
            (5, TargetView.BelowHorizon, false), (6, TargetView.InView, false), (7, TargetView.InView, false),
        })
        {
            Pass(scan, view, plot, Missed(scan, LossReason.Range));
        }

        Assert.Equal([(2, 4), (6, 7), (0, 0)], Read().MissedStretches().Select(s => (s[0].Scan, s[^1].Scan)));
    }

    [Fact]
    public void The_term_that_cost_most_is_counted_over_missed_passes_and_compared_with_seen_ones()
    {
        Pass(0, TargetView.InView, plot: true, Detected(0) with { AzimuthBeamDb = -1 });
        Pass(1, TargetView.InView, plot: false, Missed(1, LossReason.AzimuthBeam) with { AzimuthBeamDb = -60 });
        Pass(2, TargetView.InView, plot: false, Missed(2, LossReason.ElevationBeam) with { AzimuthBeamDb = -50, ElevationBeamDb = -70 });
        Pass(3, TargetView.InView, plot: false, Missed(3, LossReason.ElevationBeam) with { AzimuthBeamDb = -40, ElevationBeamDb = double.NegativeInfinity, SnrDb = double.NegativeInfinity });
        var story = Read();
        Assert.Equal(1, story.CostliestIn(LookTerm.AzimuthBeam));
        Assert.Equal(2, story.CostliestIn(LookTerm.ElevationBeam));
        Assert.Equal(50, story.MeanLossDb(LookTerm.AzimuthBeam, missed: true), 1e-12);
        Assert.Equal(1, story.MeanLossDb(LookTerm.AzimuthBeam, missed: false), 1e-12);
        Assert.Equal(35, story.MeanLossDb(LookTerm.ElevationBeam, missed: true), 1e-12);
        Assert.True(double.IsNaN(Read(100, 110).MeanLossDb(LookTerm.Range, missed: true)));
    }

    [Fact]
    public void Looks_through_side_lobes_without_a_hit_are_counted_and_those_with_one_are_told()
    {
        Pass(0, TargetView.InView, plot: true, Detected(0), Missed(0, LossReason.AzimuthBeam) with { TimeS = 0.01 }, Detected(0) with { TimeS = 2.2, SnrDb = 3 }, Missed(0, LossReason.AzimuthBeam) with { TimeS = 2.4 });
        var pass = Assert.Single(Read().Passes);
        Assert.Equal(2, pass.SideLooks);
        Assert.Equal([PassTimeS(0), 2.2], pass.Looks.Select(l => l.Row.TimeS));
        Assert.Equal(PassTimeS(0), pass.Best!.Row.TimeS);
    }

    [Fact]
    public void A_hit_through_a_side_lobe_alone_is_no_plot_of_the_pass()
    {
        Pass(0, TargetView.InView, plot: false, Detected(0) with { TimeS = 2.2 });
        plots.Add(SceneMaking.PlotRow(scenario.Targets[0].Id, 0, 2.2, 10_000, 300));
        var pass = Assert.Single(Read().Passes);
        Assert.Equal(PassOutcome.HitWithoutPlot, pass.Outcome);
        Assert.EndsWith(", through a side lobe: no plot where it was", pass.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void An_echo_that_went_into_a_neighbours_plot_is_said_so()
    {
        // Widest plot 5°: 0.0347 s; half of it on either side of the pass.
        Pass(0, TargetView.InView, plot: false, Detected(0));
        Pass(1, TargetView.InView, plot: false, Detected(1));
        plots.Add(SceneMaking.PlotRow($"{scenario.Targets[1].Id}+{scenario.Targets[0].Id}", 0, PassTimeS(0) + 0.025, 10_000, 93.6));
        plots.Add(SceneMaking.PlotRow($"{scenario.Targets[1].Id}+{scenario.Targets[0].Id}", 1, PassTimeS(1) + 0.04, 10_000, 95.8));
        var passes = Read().Passes;
        Assert.EndsWith($", but its echo went into a plot with {scenario.Targets[1].Id}, away from where it was", passes[0].Reason, StringComparison.Ordinal);
        Assert.EndsWith(", no plot where it was", passes[1].Reason, StringComparison.Ordinal);
        Assert.All(passes, p => Assert.Equal(PassOutcome.HitWithoutPlot, p.Outcome));
    }

    [Fact]
    public void Targets_of_one_cell_name_each_other()
    {
        var other = scenario.Targets[1].Id;
        Pass(0, TargetView.InView, plot: false, Missed(0, LossReason.SharedCell) with { TargetsInCell = 2, StatisticDb = -0.123, Dwell = 17, FluctuationDb = 3 });
        looks.Add(looks[0] with { Target = other });
        looks.Add(looks[0] with { Target = other, StatisticDb = -0.124 });
        Assert.Equal([other], Assert.Single(Read().Passes).Best!.CellMates);
    }

    [Fact]
    public void A_plot_of_several_targets_counts_for_each_and_one_of_noise_for_none()
    {
        Pass(0, TargetView.InView, plot: false, Detected(0));
        Pass(1, TargetView.InView, plot: false, Detected(1));
        plots.Add(SceneMaking.PlotRow($"{scenario.Targets[1].Id}+{scenario.Targets[0].Id}", 0, PassTimeS(0), 10_000, 90));
        plots.Add(SceneMaking.PlotRow("", 1, PassTimeS(1), 10_000, 90));
        Assert.Equal([true, false], Read().Passes.Select(p => p.HasPlot));
    }

    [Fact]
    public void One_scan_is_told_alone_and_a_span_of_time_cuts()
    {
        for (var scan = 0; scan < 6; scan++)
        {
            Pass(scan, TargetView.InView, plot: false, Missed(scan, LossReason.Range));
        }

        var recording = Write();
        var reader = new TargetStoryReader(recording, scenario, new LookExplainer(scenario));
        Assert.Equal([3], reader.Read(scenario.Targets[0], recording.Scans().Single(s => s.Scan == 3)).Passes.Select(p => p.Scan));
        Assert.Equal([1, 2], reader.Read(scenario.Targets[0], PassTimeS(1), PassTimeS(2)).Passes.Select(p => p.Scan));
    }

    [Fact]
    public void The_chart_of_terms_is_written_whole_and_the_same_twice()
    {
        for (var scan = 0; scan < 20; scan++)
        {
            Pass(scan, scan == 9 ? TargetView.Blanked : TargetView.InView, scan < 5, scan == 9 ? [] : [scan < 5 ? Detected(scan) : Missed(scan, LossReason.Range) with { ElevationBeamDb = scan == 12 ? double.NegativeInfinity : -scan }]);
        }

        var story = Read();
        TermsPicture.Save(story, "A <name> & more", DateTimeOffset.UnixEpoch, RangeUnit.NauticalMile, folder.In("a.svg"));
        TermsPicture.Save(story, "A <name> & more", DateTimeOffset.UnixEpoch, RangeUnit.NauticalMile, folder.In("b.svg"));
        Assert.Equal(File.ReadAllBytes(folder.In("a.svg")), File.ReadAllBytes(folder.In("b.svg")));
        var svg = System.Xml.Linq.XDocument.Load(folder.In("a.svg"));
        Assert.Equal($"A <name> & more: why {story.Target.Id} was seen or missed", svg.Descendants().Single(e => e.Name.LocalName == "title").Value);
        Assert.DoesNotContain("NaN", File.ReadAllText(folder.In("a.svg")), StringComparison.Ordinal);
        Assert.Equal(["a.svg", "b.svg"], folder.Files());
    }

    [Fact]
    public void A_chart_that_cannot_be_made_leaves_nothing()
    {
        Pass(0, TargetView.Blanked, plot: false);
        var story = Read();
        Assert.Contains("no look", Assert.Throws<PictureException>(() => TermsPicture.Save(story, "x", DateTimeOffset.UnixEpoch, RangeUnit.Kilometre, folder.In("a.svg"))).Message, StringComparison.Ordinal);
        Assert.Contains(".svg", Assert.Throws<PictureException>(() => TermsPicture.Save(story, "x", DateTimeOffset.UnixEpoch, RangeUnit.Kilometre, folder.In("a.png"))).Message, StringComparison.Ordinal);
        Assert.Empty(folder.Files());
    }

    private static double PassTimeS(int scan) => scan * PeriodS + PeriodS / 4;

    private LookRow Detected(int scan) => Look(scan, 20, LossReason.None);

    private LookRow Missed(int scan, LossReason lostTo) => Look(scan, -5, lostTo);

    private LookRow Look(int scan, double snrDb, LossReason lostTo) => SceneMaking.LookRow(scenario.Targets[0].Id, scan, PassTimeS(scan), snrDb, lostTo == LossReason.None, lostTo) with { SpreadingDb = -160, RadarDb = 140 + snrDb, RcsDb = 20 };

    private void Pass(int scan, TargetView view, bool plot, params LookRow[] rows)
    {
        var id = scenario.Targets[0].Id;
        truth.Add(SceneMaking.TruthRow(id, scan, PassTimeS(scan), view == TargetView.BelowHorizon ? 45_000 : 10_000, 0, view: view));
        looks.AddRange(rows);
        if (plot)
        {
            plots.Add(SceneMaking.PlotRow(id, scan, PassTimeS(scan) + 0.001, 10_000, 90));
        }
    }

    private TargetStory Read(double fromS = 0, double toS = 60) =>
        new TargetStoryReader(Write(), scenario, new LookExplainer(scenario)).Read(scenario.Targets[0], fromS, toS);

    private Recording Write()
    {
        var head = new RecordingHead
        {
            ScenarioName = scenario.Name,
            ScenarioDigest = "00",
            ScenarioText = "{}",
            ProgramVersion = "0.1.0",
            Seed = 7,
            StartUtc = scenario.Run.Start,
            DurationS = 60,
            Looks = LooksKept.All,
            Format = TableFormat.Csv,
        };
        var path = recordings.In($"run-{++written}");
        using var writer = RecordingWriter.Create(path, head, force: false);
        for (var scan = 0; scan < 24; scan++)
        {
            writer.AddLooks([.. looks.Where(l => l.Scan == scan).OrderBy(l => l.TimeS)]);
            writer.AddPlots([.. plots.Where(p => p.Scan == scan)]);
            writer.AddTruth([.. truth.Where(t => t.Scan == scan)]);
            writer.AddScan(new ScanRow { Scan = scan, StartS = scan * PeriodS, EndS = (scan + 1) * PeriodS, Looks = 0, Hits = 0, FalseHits = 0, Plots = 0, FalsePlots = 0 });
        }

        writer.Complete();
        return Recording.Open(path);
    }
}
