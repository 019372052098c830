using ScanSim.Physics.Detection;
using ScanSim.Physics.Waveforms;
using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Engine.Tests;

public class LookModelTests
{
    private const double DegRad = TestScenario.DegRad;

    [Fact]
    public void The_terms_of_each_look_add_up_to_its_SNR()
    {
        var scenario = TestScenario.With(TestScenario.Circling("a", 20, 12_000, 80, 3, 20, 1), TestScenario.Still("b", 200, 15, 300, 2));
        var looks = CollectingSink.Of(scenario).Looks;
        Assert.Contains(looks, l => l.EclipsingDb < -0.1);
        Assert.All(looks, l => Assert.Equal(
            l.RadarDb + l.RcsDb + l.SpreadingDb + l.AzimuthBeamDb + l.ElevationBeamDb + l.EclipsingDb, l.SnrDb, 1e-9));
        var model = new LookModel(scenario);
        Assert.All(looks, l => Assert.Equal(10 * Math.Log10(model.RadarRatioM2), l.RadarDb, 1e-9));
    }

    [Fact]
    public void A_dwell_over_the_half_power_beamwidth_loses_the_published_mean_of_the_two_way_beam()
    {
        // Mean two-way power gain of a Gaussian beam over its one-way half-power width: 1.6716 dB.
        AssertBeamLoss("dwell over the one-way half-power width", 1.0, window => -window, 1.6716);
    }

    [Fact]
    public void The_optimum_dwell_has_the_published_beam_shape_loss_of_one_coordinate()
    {
        // Pulses counted between the half-power points, optimum window of 0.84 beamwidths, post-detection integration:
        // loss = √(n_half-power · n_window) / Σ weights = 1.62 dB (Blake: 1.6 dB).
        AssertBeamLoss("optimum window, post-detection", 0.840776844014757, window => -window - 5 * Math.Log10(0.840776844014757), 1.6223);
    }

    [Fact]
    public void A_passing_beam_has_the_published_two_way_integral()
    {
        // Sum of the two-way weights over all pulses of a pass, over the pulses between the half-power points: 1/1.3286 (Barton: 1.24 dB).
        var scenario = Fine(dwellBeamwidths: 1.0 / 16);
        scenario = scenario with { Targets = [TestScenario.Still("t", 120, 6_000, 1e6, 0)] };
        var looks = CollectingSink.Of(scenario with { Run = scenario.Run with { DurationS = 2.4 } }).Looks.Where(l => Math.Abs(l.AzimuthDeg - l.BeamAzimuthDeg) < 4).ToList();
        var sum = looks.Sum(l => l.Pulses * Math.Pow(10, l.AzimuthBeamDb / 10));
        var perBeamwidth = BeamwidthPulses.Count(1.2 * DegRad, 18_000, 2 * Math.PI / 2.5);
        var comparison = new Comparison(
            "Engine: emergent beam-shape loss of a pass, all pulses, matched weighting of one coordinate",
            "D. K. Barton, Modern Radar System Analysis, 1988: 1.24 dB (from memory); √(8 ln 2/π) = 1.2338 dB exact",
            0.1,
            0,
            "dB");
        comparison.Add("Gaussian beam, dwells of 1/16 beamwidth", 1.24, 10 * Math.Log10(perBeamwidth / sum));
        comparison.Conclude();
    }

    [Fact]
    public void A_target_below_the_horizon_has_no_look()
    {
        // Antenna at 30 m, target at 5 m: 22.6 + 9.2 km on the 4/3 earth.
        var scenario = TestScenario.With(TestScenario.Still("near", 40, 31_000, 1e6, 0), TestScenario.Still("far", 80, 33_000, 1e6, 0));
        var sink = CollectingSink.Of(scenario);
        Assert.Contains(sink.Looks, l => l.Target == "near");
        Assert.DoesNotContain(sink.Looks, l => l.Target == "far");
        Assert.All(sink.Truth.Where(t => t.Target == "far"), t => Assert.Equal(TargetView.BelowHorizon, t.View));
        Assert.All(sink.Truth.Where(t => t.Target == "near"), t => Assert.Equal(TargetView.InView, t.View));
    }

    [Fact]
    public void An_echo_from_beyond_the_unambiguous_range_is_folded_by_it()
    {
        // 1800 Hz: 83.3 km. A high target at 95 km folds to 11.7 km; one at 140 km to 56.7 km, beyond the instrumented range.
        var scenario = TestScenario.With(
            TestScenario.Still("second", 40, 95_000, 1e6, 0, heightM: 9_000), TestScenario.Still("beyond", 80, 140_000, 1e6, 0, heightM: 9_000));
        var sink = CollectingSink.Of(scenario);
        var folded = sink.Truth.First(t => t.Target == "second").RangeM - 299_792_458 / (2 * 1800.0);
        var hits = sink.Hits.Where(h => h.Target == "second").ToList();
        Assert.NotEmpty(hits);
        Assert.All(hits, h => Assert.Equal(folded, h.RangeM, 40.0));
        Assert.DoesNotContain(sink.Looks, l => l.Target == "beyond");
        Assert.All(sink.Truth.Where(t => t.Target == "beyond"), t => Assert.Equal(TargetView.BeyondInstrumentedRange, t.View));
    }

    [Fact]
    public void A_missed_look_names_the_term_it_was_lost_to()
    {
        // Weak and centred; strong and straddled by two dwells; strong and 24 degrees up; strong and under its own pulse.
        var scenario = TestScenario.With(
            TestScenario.Still("weak", 50 * 1.2 + 0.56, 20_000, 0.5, 0),
            TestScenario.Still("between", 100 * 1.2 + 1.16, 9_000, 0.16, 0),
            TestScenario.Still("high", 150 * 1.2 + 0.56, 5_000, 20, 0, heightM: 2_230),
            TestScenario.Still("near", 200 * 1.2 + 0.56, 2, 3e-14, 0, heightM: 30));
        var best = CollectingSink.Of(scenario, new RunOptions { Looks = LooksKept.Best }).Looks.Where(l => l.Scan == 5).ToDictionary(l => l.Target);
        Assert.All(best.Values, l => Assert.True(l.Pd < 0.5, $"{l.Target} has Pd {l.Pd}, SNR {l.SnrDb}"));
        Assert.Equal(LossReason.Range, best["weak"].LostTo);
        Assert.Equal(LossReason.AzimuthBeam, best["between"].LostTo);
        Assert.Equal(LossReason.ElevationBeam, best["high"].LostTo);
        Assert.Equal(LossReason.Eclipsing, best["near"].LostTo);
    }

    [Fact]
    public void Radial_speed_is_the_rate_of_the_slant_range()
    {
        var scenario = TestScenario.With(TestScenario.Moving("t", 10, 9_000, 250, 90, 100, 0, heightM: 900));
        var truth = CollectingSink.Of(scenario).Truth;
        var model = new LookModel(scenario);
        foreach (var row in truth)
        {
            var state = scenario.Targets[0].Track.At(row.TimeS);
            var before = model.SightOf(scenario.Targets[0].Track.At(row.TimeS - 0.01)).RangeM;
            var after = model.SightOf(scenario.Targets[0].Track.At(row.TimeS + 0.01)).RangeM;
            Assert.Equal((after - before) / 0.02, model.RangeRateMps(model.SightOf(state), state), 1e-4);
        }
    }

    [Fact]
    public void Truth_is_taken_as_the_beam_passes_the_target()
    {
        var scenario = TestScenario.With(TestScenario.Moving("t", 100, 9_000, 30, 60, 100, 0));
        var timeline = ScanTimeline.Of(scenario);
        Assert.All(CollectingSink.Of(scenario).Truth, t => Assert.Equal(t.AzimuthDeg, timeline.BeamAzimuthRad(t.TimeS) / DegRad, 1e-6));
    }

    [Theory]
    [InlineData(5_000.0)]
    [InlineData(null)]
    public void Budget_lines_add_up_to_the_radar_equation_and_agree_with_a_run(double? rangeM)
    {
        var scenario = TestScenario.With(TestScenario.Still("t", 64 * 1.2 + 0.56, 12_000, 3, 1));
        var budget = Budget.Of(scenario, scenario.Targets[0], 0, rangeM);
        Assert.Equal(10 * Math.Log10(budget.Terms.SnrRatio()), budget.SnrDb, 1e-9);
        Assert.Equal(budget.ReceivedDbW + budget.ToSnr.Sum(t => t.Db), budget.SnrDb, 1e-9);
        Assert.Equal(rangeM ?? budget.Sight.RangeM, budget.Sight.RangeM, 1e-6);
        if (rangeM is null)
        {
            // 300 dwells a turn: the target stands at the centre of one of them.
            var best = CollectingSink.Of(scenario).Looks.MaxBy(l => l.AzimuthBeamDb);
            var azimuth = budget.Received.Single(t => t.Name.StartsWith("azimuth", StringComparison.Ordinal)).Db;
            Assert.Equal(budget.SnrDb - azimuth, best.SnrDb - best.AzimuthBeamDb, 1e-9);
            Assert.Equal(azimuth, best.AzimuthBeamDb, 1e-3);
        }

        var solved = budget.Terms.SolveRangeM(budget.NeededSnrRatio(0.9));
        var at = budget.Terms with { RangeM = solved };
        var threshold = DetectionThreshold.FromFalseAlarm(budget.Pulses, budget.FalseAlarmProbability);
        Assert.Equal(0.9, DetectionProbability.Detect(FluctuationCase.Case1, budget.Pulses, at.SnrRatio(), threshold), 1e-9);
    }

    private static void AssertBeamLoss(string what, double windowBeamwidths, Func<double, double> loss, double published)
    {
        var scenario = Fine(windowBeamwidths);
        var timeline = ScanTimeline.Of(scenario);
        var dwell = timeline.DwellAt(0, 50);
        var target = TestScenario.Still("t", dwell.BeamAzimuthRad / DegRad, 10_000, 1, 0);
        var look = new LookModel(scenario).LookAt(1, target.Track.At(0), dwell, new double[dwell.Pulses]);
        var comparison = new Comparison(
            $"Engine: emergent beam-shape loss, {what}",
            "L. V. Blake, 1953 and NRL 6930, 1969: 1.6 dB, one coordinate (from memory); exact integrals of the Gaussian beam",
            0.1,
            0,
            "dB");
        comparison.Add($"{dwell.Pulses} pulses", published, loss(10 * Math.Log10(look.AzimuthBeamRatio)));
        comparison.Conclude();
    }

    /// <summary>Ten times the pulses of the usual test radar, in dwells of so many beamwidths.</summary>
    private static Scenario Fine(double dwellBeamwidths)
    {
        var scenario = TestScenario.With();
        var perBeamwidth = BeamwidthPulses.Count(1.2 * DegRad, 18_000, 2 * Math.PI / 2.5);
        return scenario with
        {
            Radar = scenario.Radar with
            {
                InstrumentedRangeM = 8_300,
                Waveform = scenario.Radar.Waveform with { PrfHz = [18_000] },
                Processing = scenario.Radar.Processing with { PulsesPerDwell = (int)Math.Round(perBeamwidth * dwellBeamwidths) },
            },
        };
    }
}
