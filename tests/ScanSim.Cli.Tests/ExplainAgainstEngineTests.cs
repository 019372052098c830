using ScanSim.Display.Explaining;
using ScanSim.Engine;
using ScanSim.Physics;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Cli.Tests;

/// <summary>The reasoning about looks against the engine that makes them.</summary>
public class ExplainAgainstEngineTests
{
    [Fact]
    public void Every_row_of_the_engine_is_explained_as_the_engine_decided_it()
    {
        var agreement = new Comparison("Pd of recorded looks against exact theory at their explained need plus margin, cases 0, 1 and 3", "[Marcum1960], [Swerling1954] without the table that a run reads", 1e-6, 0);
        var losses = 0;
        foreach (var file in new[] { ScanSimProcess.Harbour, ScanSimProcess.Airfield })
        {
            var scenario = Shortened(ScenarioFile.Load(file), 120);
            var cases = scenario.Targets.ToDictionary(t => t.Id, t => (FluctuationCase)t.FluctuationCase);
            var explainer = new LookExplainer(scenario);
            foreach (var row in LooksOf(scenario, LooksKept.Best))
            {
                var look = explainer.Explain(row);
                Assert.Equal(-look.MarginDb, look.Losses.Sum(l => l.LossDb), 1e-9);
                Assert.Equal(row.Detected, look.Outcome == PassOutcome.Seen);
                Assert.Equal(row.LostTo is LossReason.Fluctuation or LossReason.SharedCell, !row.Detected && look.MarginDb >= 0);
                Assert.Equal(row.LostTo == LossReason.Range, !row.Detected && look.MarginDb < 0 && look.LossDb(LookTerm.Range) > 0);
                losses += row.Detected ? 0 : 1;
                if (cases[row.Target] is FluctuationCase.Case2 or FluctuationCase.Case4)
                {
                    continue;
                }

                // The explained need and margin lead back to the row's SNR, and exact theory there to the row's Pd.
                var threshold = DetectionThreshold.FromFalseAlarm(row.Pulses, scenario.Radar.Processing.FalseAlarmProbability);
                agreement.Add($"{row.Target}, scan {row.Scan}", DetectionProbability.Detect(cases[row.Target], row.Pulses, Decibels.ToRatio(look.NeededDb + look.MarginDb), threshold), row.Pd);
                Assert.Equal(row.Pd >= 0.5, look.MarginDb >= 0);
            }
        }

        Assert.True(losses > 50, $"{losses} missed looks");
        agreement.Conclude();
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(3)]
    public void A_target_brought_to_margin_0_has_a_Pd_of_one_half_in_the_engine(int fluctuation)
    {
        // Two runs: the second with the radar cross section changed by the margin that the first left. The terms stay, so the margin is 0.
        var scenario = Shortened(ScenarioFile.Load(ScanSimProcess.Harbour), 5);
        scenario = scenario with { Targets = [scenario.Targets.Single(t => t.Id == "ferry") with { FluctuationCase = fluctuation }] };
        var first = new LookExplainer(scenario).Explain(LooksOf(scenario, LooksKept.All).MaxBy(r => r.SnrDb));
        var target = scenario.Targets[0];
        var moved = scenario with { Targets = [target with { RcsM2 = target.RcsM2 / Decibels.ToRatio(first.MarginDb) }] };
        var row = LooksOf(moved, LooksKept.All).Single(r => r.Dwell == first.Row.Dwell);
        Assert.Equal(0, new LookExplainer(moved).Explain(row).MarginDb, 1e-9);
        Assert.Equal(0.5, row.Pd, 1e-6);
    }

    [Fact]
    public void The_signal_too_weak_for_a_look_is_measured_as_the_engine_measures_it()
    {
        Assert.Equal(LookExplainer.SummedSnrFloorDb, Decibels.FromRatio(LookModel.SummedSnrFloorRatio), 1e-12);
        foreach (var file in new[] { ScanSimProcess.Harbour, ScanSimProcess.Airfield })
        {
            var scenario = Shortened(ScenarioFile.Load(file), 30);
            scenario = scenario with { Targets = [scenario.Targets[0] with { RcsM2 = 1e-12 }] };
            var rows = Sink.Of(scenario, LooksKept.All);
            Assert.Empty(rows.Looks);
            var truth = rows.Truth.First(t => t.View == TargetView.InView);
            var snrDb = Decibels.FromRatio(new LookModel(scenario).RadarRatioM2) - 120 - 40 * Math.Log10(truth.RangeM);
            Assert.Contains($" {snrDb:0.0} dB per pulse", new LookExplainer(scenario).Explain(truth).Reason, StringComparison.Ordinal);
        }
    }

    private static Scenario Shortened(Scenario scenario, double durationS) => scenario with { Run = scenario.Run with { DurationS = durationS } };

    private static List<LookRow> LooksOf(Scenario scenario, LooksKept kept) => Sink.Of(scenario, kept).Looks;

    private sealed class Sink : IRecordingSink
    {
        public List<LookRow> Looks { get; } = [];

        public List<TruthRow> Truth { get; } = [];

        public static Sink Of(Scenario scenario, LooksKept kept)
        {
            var sink = new Sink();
            Engine.Run.Execute(scenario, new RunOptions { Looks = kept }, sink, progress: null, CancellationToken.None);
            return sink;
        }

        public void AddScan(in ScanRow row)
        {
        }

        public void AddLooks(ReadOnlySpan<LookRow> rows) => Looks.AddRange(rows);

        public void AddHits(ReadOnlySpan<HitRow> rows)
        {
        }

        public void AddPlots(ReadOnlySpan<PlotRow> rows)
        {
        }

        public void AddTruth(ReadOnlySpan<TruthRow> rows) => Truth.AddRange(rows);
    }
}
