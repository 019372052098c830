using MathNet.Numerics.Distributions;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Testing;

namespace ScanSim.Engine.Tests;

/// <summary>A still target at constant SNR, looked at 100,000 times by the engine itself, against the exact theory.</summary>
public class DetectionTheoryTests
{
    private const int Dwells = 100_000;
    private const double Pfa = 1e-4;

    private static readonly double Quantile999 = Normal.InvCDF(0, 1, 0.9995);

    public static TheoryData<int, int, double> Looks()
    {
        var data = new TheoryData<int, int, double>();
        foreach (var fluctuation in new[] { 0, 1, 2, 3, 4 })
        {
            data.Add(fluctuation, 1, 12);
            data.Add(fluctuation, 8, 5);
            data.Add(fluctuation, 30, 0);
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(Looks))]
    public void Share_of_detections_and_moments_of_the_statistic_are_those_of_theory(int fluctuation, int pulses, double snrDb)
    {
        var snr = Math.Pow(10, snrDb / 10);
        var threshold = DetectionThreshold.FromFalseAlarm(pulses, Pfa);
        var looks = CollectingSink.Of(TestScenario.ConstantSnr(pulses, snr, fluctuation, Dwells, Pfa, seed: 99)).Looks;
        Assert.Equal(Dwells, looks.Count);
        var pd = DetectionProbability.Detect((FluctuationCase)fluctuation, pulses, snr, threshold);
        Assert.InRange(pd, 0.1, 0.99);
        Assert.All(looks.Take(10), l => Assert.Equal(pd, l.Pd, 2e-6));
        Assert.All(looks.Take(10), l => Assert.Equal(snrDb, l.SnrDb, 1e-6));

        // The normal quantile of both tails together; half a count for the continuity of the binomial.
        var comparison = new Comparison(
            $"Engine: share of detections over 100,000 dwells, case {fluctuation}, {pulses} pulses",
            "exact Pd of Swerling's cases (docs/physics/detection.md), 99.9 % binomial interval",
            Quantile999 * Math.Sqrt(pd * (1 - pd) / Dwells) + 0.5 / Dwells,
            0);
        comparison.Add($"SNR {snrDb} dB, Pfa {Pfa}", pd, looks.Count(l => l.Detected) / (double)Dwells);
        comparison.Conclude();
        AssertMoments(fluctuation, pulses, snr, [.. looks.Select(l => threshold * Math.Pow(10, l.StatisticDb / 10))]);
    }

    private static void AssertMoments(int fluctuation, int pulses, double snr, double[] statistics)
    {
        // E z = n(1 + S); Var z = n(1 + 2S) for known signal energy, plus the variance of the drawn energy.
        var mean = pulses * (1 + snr);
        var energyVariance = fluctuation switch
        {
            1 => pulses * pulses * snr * snr,
            2 => pulses * snr * snr,
            3 => 0.5 * pulses * pulses * snr * snr,
            4 => 0.5 * pulses * snr * snr,
            _ => 0,
        };
        var variance = pulses * (1 + 2 * snr) + energyVariance;
        var drawnMean = statistics.Average();
        var drawnVariance = statistics.Sum(z => (z - drawnMean) * (z - drawnMean)) / (Dwells - 1);
        var fourth = statistics.Sum(z => Math.Pow(z - drawnMean, 4)) / Dwells;
        Assert.Equal(mean, drawnMean, Quantile999 * Math.Sqrt(variance / Dwells));
        Assert.Equal(variance, drawnVariance, Quantile999 * Math.Sqrt((fourth - variance * variance) / Dwells));
    }

    [Fact]
    public void Cases_1_and_3_keep_their_RCS_during_a_pass_and_change_it_from_pass_to_pass()
    {
        var scenario = TestScenario.With(TestScenario.Still("one", 0.05, 5_000, 10, 1), TestScenario.Still("three", 90, 5_000, 10, 3));
        var looks = CollectingSink.Of(scenario, new RunOptions { Looks = LooksKept.All }).Looks;
        foreach (var target in looks.GroupBy(l => l.Target))
        {
            // A pass: looks less than half a turn apart. Target "one" sits astride the north mark.
            var passes = target.GroupBy(l => Math.Round((l.TimeS - l.AzimuthDeg / 360 * 2.5) / 2.5)).ToList();
            Assert.True(passes.Count >= 23);
            Assert.All(passes, p => Assert.Single(p.Select(l => l.FluctuationDb).Distinct()));
            Assert.True(passes.Max(p => p.Count()) >= 3);
            Assert.Equal(passes.Count, passes.Select(p => p.First().FluctuationDb).Distinct().Count());
        }
    }

    [Fact]
    public void Recorded_amplitude_and_decision_agree()
    {
        var scenario = TestScenario.ConstantSnr(8, 2, 1, 5_000, 1e-4, seed: 3);
        var sink = CollectingSink.Of(scenario);
        Assert.All(sink.Looks, l => Assert.Equal(l.StatisticDb > 0, l.Detected));
        var hits = sink.Hits.Where(h => h.Kind == EchoKind.Target).ToDictionary(h => h.Dwell);
        var threshold = DetectionThreshold.FromFalseAlarm(8, 1e-4);
        foreach (var look in sink.Looks.Where(l => l.Detected))
        {
            var statistic = threshold * Math.Pow(10, look.StatisticDb / 10);
            Assert.Equal(10 * Math.Log10(statistic / 8 - 1), hits[look.Dwell].SnrDb, 1e-9);
        }
    }
}
