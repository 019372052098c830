using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Engine.Tests;

public class PlotTests
{
    private const double DegRad = TestScenario.DegRad;

    [Fact]
    public void Two_targets_in_one_cell_give_one_hit_with_both_labels_and_the_sum_of_their_powers_on_average()
    {
        const int Dwells = 20_000;
        var scenario = TestScenario.ConstantSnr(8, 100, 0, Dwells, 1e-6, seed: 11);
        var a = scenario.Targets[0];
        scenario = scenario with { Targets = [a with { Id = "a" }, a with { Id = "b", RcsM2 = 0.5 * a.RcsM2 }] };
        var sink = CollectingSink.Of(scenario);
        var hits = sink.Hits.Where(h => h.Kind == EchoKind.Target).ToList();
        Assert.Equal(hits.Count, hits.Select(h => h.Dwell).Distinct().Count());
        Assert.All(hits, h => Assert.Equal("a+b", h.Target));
        Assert.All(sink.Looks, l => Assert.Equal(2, l.TargetsInCell));

        // Phases are drawn: powers add on average, 100 + 50 a pulse, between 150 ± 2√5000; the phase term has variance 2·5000.
        var snr = hits.Select(h => Math.Pow(10, h.SnrDb / 10)).ToList();
        Assert.Equal(Dwells, hits.Count);
        Assert.Equal(150, snr.Average(), 4 * Math.Sqrt((10_000 + (1 + 2 * 150) / 8.0) / Dwells));
        Assert.InRange(snr.Min(), 2, 12);
        Assert.InRange(snr.Max(), 285, 330);
    }

    [Fact]
    public void A_look_lost_to_a_shared_cell_says_so()
    {
        var scenario = TestScenario.ConstantSnr(1, 30, 0, 20_000, 1e-6, seed: 12);
        var a = scenario.Targets[0];
        var sink = CollectingSink.Of(scenario with { Targets = [a with { Id = "a" }, a with { Id = "b" }] });
        var missed = sink.Looks.Where(l => !l.Detected).ToList();
        Assert.NotEmpty(missed);
        Assert.All(missed, l => Assert.Equal(LossReason.SharedCell, l.LostTo));
    }

    [Fact]
    public void A_target_gives_one_plot_a_scan_even_astride_the_north_mark()
    {
        var sink = CollectingSink.Of(TestScenario.With(TestScenario.Still("north", 0, 6_000, 200, 0), TestScenario.Still("east", 90, 6_000, 200, 0)));
        foreach (var id in new[] { "north", "east" })
        {
            var times = sink.Plots.Where(p => p.Target == id).Select(p => p.TimeS).ToList();
            Assert.InRange(times.Count, 23, 25);
            Assert.All(times.Zip(times.Skip(1)), pair => Assert.Equal(2.5, pair.Second - pair.First, 0.02));
        }
    }

    [Fact]
    public void Tally_counts_a_pass_astride_the_north_mark_once()
    {
        var scenario = TestScenario.With(TestScenario.Still("north", 0, 6_000, 200, 0));
        var tally = new RunTally(scenario, new CollectingSink());
        Run.Execute(scenario, new RunOptions(), tally, null, CancellationToken.None);
        tally.Finish();
        var target = tally.Targets.Single();
        Assert.Equal(1, target.BlipScanRatio);
        Assert.InRange(target.LongestGapS!.Value, 2.4, 2.6);
        Assert.InRange(target.FirstPlotRangeM!.Value, 5_900, 6_100);
    }

    [Fact]
    public void Tally_counts_no_plot_through_the_side_lobes()
    {
        // The ship at 300 m gives plots all round, but only one a scan where it is; the far boat is never seen.
        var scenario = TestScenario.With(TestScenario.Still("ship", 90, 300, 5_000, 0), TestScenario.Still("boat", 200, 15_000, 0.01, 1));
        var sink = new CollectingSink();
        var tally = new RunTally(scenario, sink);
        Run.Execute(scenario, new RunOptions(), tally, null, CancellationToken.None);
        tally.Finish();
        Assert.True(sink.Plots.Count(p => p.Target == "ship") > 1000);
        var (ship, boat) = (tally.Targets.First(), tally.Targets.Last());
        Assert.Equal((24, 24, 24), (ship.ScansAlive, ship.ScansInView, ship.ScansWithPlot));
        Assert.Equal((24, 24, 0), (boat.ScansAlive, boat.ScansInView, boat.ScansWithPlot));
        Assert.Null(boat.FirstPlotS);
        Assert.Null(boat.LongestGapS);
        Assert.Equal(sink.Scans.Sum(s => (long)s.Looks), tally.Looks);
        Assert.Equal(sink.Plots.Count(p => p.Kind == EchoKind.Noise), tally.FalsePlots);
    }

    [Fact]
    public void Neighbouring_hits_join_and_distant_ones_do_not()
    {
        // 37.5 m cells: 200 m apart in range are two plots, 12° apart in azimuth too.
        var sink = CollectingSink.Of(TestScenario.With(
            TestScenario.Still("a", 90, 6_000, 50, 0), TestScenario.Still("b", 90, 6_200, 50, 0), TestScenario.Still("c", 102, 6_000, 50, 0)));
        Assert.Equal(["a", "b", "c"], sink.Plots.Where(p => p.Kind == EchoKind.Target).Select(p => p.Target).Distinct().Order());
        Assert.Equal(3, sink.Plots.Count(p => p.Kind == EchoKind.Target && p.Scan == 5));
    }

    [Fact]
    public void Ships_that_pass_within_a_cell_of_each_other_become_one_plot_for_a_while()
    {
        var sink = CollectingSink.Of(TestScenario.With(
            TestScenario.Moving("in", 90, 6_000, 90, 10, 500, 0), TestScenario.Moving("out", 90, 6_600, 270, 10, 500, 0)));
        var labels = sink.Plots.Where(p => p.Kind == EchoKind.Target).Select(p => p.Target).ToHashSet();
        Assert.Contains("in", labels);
        Assert.Contains("out", labels);
        Assert.True(labels.Contains("in+out") || labels.Contains("out+in"));
    }

    [Fact]
    public void A_strong_near_target_is_seen_through_the_side_lobes_all_round()
    {
        var scenario = TestScenario.With(TestScenario.Still("ship", 90, 300, 5_000, 0));
        var hits = CollectingSink.Of(scenario).Hits.Where(h => h.Target == "ship" && h.Scan == 3).ToList();
        Assert.True(hits.Count > 250);
        var plots = CollectingSink.Of(scenario).Plots.Where(p => p.Target == "ship" && p.Scan == 3).ToList();
        Assert.True(plots.Count > 50, "the ring is cut at the greatest width of a plot");
    }

    [Fact]
    public void Stated_accuracy_is_the_accuracy_found()
    {
        // Normalised squared errors over targets at all bearings, in dwells of a fifth of the beamwidth.
        var targets = Enumerable.Range(0, 60).Select(i => TestScenario.Still($"t{i:00}", 3 + 5.97 * i, 8_000 + 40 * i, 12, 0)).ToArray();
        var scenario = TestScenario.With(targets);
        scenario = scenario with { Radar = scenario.Radar with { Processing = scenario.Radar.Processing with { PulsesPerDwell = 3 } } };
        var sink = CollectingSink.Of(scenario);
        var (range, azimuth) = NormalisedErrors(sink);
        Assert.InRange(Rms(range), 0.8, 1.25);
        Assert.InRange(Rms(azimuth), 0.7, 1.4);
    }

    [Fact]
    public void Azimuth_error_of_the_centroid_shrinks_with_SNR_as_published()
    {
        // Steady targets in dwells of 1/8 beamwidth; σ = 0.62 θ/√(2 S/N) with the S/N summed over the hits, from 17 to 32 dB.
        var comparison = new Comparison(
            "Engine: azimuth error of the centroid, ratio to θ3 · 0.622/√(2 S/N)",
            "M. I. Skolnik, IRE Trans. ANE-7 (1960): bound for a uniform aperture; a centroid of thresholded hits is somewhat worse",
            0.3,
            0);
        foreach (var rcsM2 in new[] { 5.0, 15, 50, 150 })
        {
            var targets = Enumerable.Range(0, 60).Select(i => TestScenario.Still($"t{i:00}", 3 + 5.97 * i, 8_000 + 40 * i, rcsM2, 0)).ToArray();
            var scenario = TestScenario.With(targets);
            scenario = scenario with
            {
                Radar = scenario.Radar with
                {
                    Processing = scenario.Radar.Processing with { PulsesPerDwell = 2 },
                    Plots = scenario.Radar.Plots with { AzimuthGapDwells = 2 },
                },
            };
            var (_, azimuth) = NormalisedErrors(CollectingSink.Of(scenario));
            comparison.Add($"{rcsM2} m²", 1.15, Rms(azimuth));
        }

        comparison.Conclude();
    }

    [Fact]
    public void Instrument_errors_are_added_to_the_plots()
    {
        var plain = TestScenario.With(TestScenario.Still("t", 90, 3_000, 1000, 0));
        plain = plain with { Run = plain.Run with { DurationS = 2_500 } };
        var rough = plain with { Radar = plain.Radar with { Accuracy = new InstrumentErrors { RangeSigmaM = 30, AzimuthSigmaRad = 0.5 * DegRad } } };
        var a = CollectingSink.Of(plain).Plots.Where(p => p.Target == "t").ToList();
        var b = CollectingSink.Of(rough).Plots.Where(p => p.Target == "t").ToList();
        Assert.Equal(a.Count, b.Count);
        Assert.Equal(30, Rms(a.Zip(b, (x, y) => y.RangeM - x.RangeM)), 30 * 4 / Math.Sqrt(2 * a.Count));
        Assert.Equal(0.5, Rms(a.Zip(b, (x, y) => y.AzimuthDeg - x.AzimuthDeg)), 0.5 * 4 / Math.Sqrt(2 * a.Count));
        Assert.All(b, p => Assert.True(p.SigmaRangeM > 30 && p.SigmaAzimuthDeg > 0.5));
    }

    private static (List<double> Range, List<double> Azimuth) NormalisedErrors(CollectingSink sink)
    {
        var truth = sink.Truth.ToDictionary(t => (t.Target, t.Scan));
        var plots = sink.Plots.Where(p => p.Kind == EchoKind.Target && p.Hits > 1 && truth.ContainsKey((p.Target, p.Scan))).ToList();
        Assert.True(plots.Count > 500);
        return (
            [.. plots.Select(p => (p.RangeM - truth[(p.Target, p.Scan)].RangeM) / p.SigmaRangeM)],
            [.. plots.Select(p => (p.AzimuthDeg - truth[(p.Target, p.Scan)].AzimuthDeg) / p.SigmaAzimuthDeg)]);
    }

    private static double Rms(IEnumerable<double> values) => Math.Sqrt(values.Average(v => v * v));
}
