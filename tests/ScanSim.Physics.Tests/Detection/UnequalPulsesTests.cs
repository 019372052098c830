using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class UnequalPulsesTests
{
    [Theory]
    [InlineData(FluctuationCase.Case2)]
    [InlineData(FluctuationCase.Case4)]
    public void Pulses_under_a_gaussian_beam_agree_with_the_exact_chain(FluctuationCase fluctuation)
    {
        const string Source = "Uniformized chain of exponential stages (Jensen 1953), all terms positive";
        var absolute = new Comparison($"Pd of unequal pulses, {fluctuation}, Gaussian two-way beam", Source, 1e-9, 0);
        var relative = new Comparison($"Pd and miss of unequal pulses, {fluctuation}, relative in both tails", Source, 0, 1e-8);
        foreach (var pulses in new[] { 2, 3, 4, 7, 15, 32, 64 })
        {
            foreach (var pfa in new[] { 1e-3, 1e-5, 1e-8 })
            {
                var threshold = DetectionThreshold.FromFalseAlarm(pulses, pfa);
                for (var db = -20; db <= 40; db += 4)
                {
                    var snrRatios = GaussianBeam(pulses, Scale.Ratio(db), shift: 0.07);
                    var (detect, miss) = PulseChain.Tails(fluctuation == FluctuationCase.Case4, snrRatios, threshold);
                    var name = $"n {pulses} Pfa {pfa} peak {db} dB";
                    absolute.Add(name, detect, UnequalPulses.Detect(fluctuation, snrRatios, threshold));
                    relative.Add("Pd " + name, detect, UnequalPulses.Detect(fluctuation, snrRatios, threshold));
                    relative.Add("miss " + name, miss, UnequalPulses.Miss(fluctuation, snrRatios, threshold));
                }
            }
        }

        absolute.Conclude();
        relative.Conclude();
    }

    [Theory]
    [InlineData(FluctuationCase.Case2)]
    [InlineData(FluctuationCase.Case4)]
    public void Equal_pulses_agree_with_the_table_of_equal_pulses(FluctuationCase fluctuation)
    {
        var table = ReferenceTable.Load("detection_swerling_pd.csv");
        var comparison = new Comparison($"Equal pulses as a special case of unequal ones, {fluctuation}, in both tails", table.Source, Scale.SmallestNormal, 1e-8);
        foreach (var row in table.Rows.Where(r => table.Whole(r, "fluctuation_case") == (int)fluctuation))
        {
            var threshold = table.Number(row, "threshold");
            var snrRatios = Enumerable.Repeat(Scale.Ratio(table.Number(row, "snr_db")), table.Whole(row, "pulses")).ToArray();
            var name = $"n {snrRatios.Length} Pfa {table.Text(row, "pfa")} S {table.Text(row, "snr_db")} dB";
            comparison.Add("Pd " + name, table.Number(row, "pd"), UnequalPulses.Detect(fluctuation, snrRatios, threshold));
            comparison.Add("miss " + name, table.Number(row, "pmiss"), UnequalPulses.Miss(fluctuation, snrRatios, threshold));
        }

        comparison.Conclude();
    }

    [Theory]
    [InlineData(FluctuationCase.Case2)]
    [InlineData(FluctuationCase.Case4)]
    public void Pulses_of_any_snr_in_any_order_agree_with_the_exact_chain(FluctuationCase fluctuation)
    {
        var comparison = new Comparison($"Pd and miss of pulses with SNRs strewn over 60 dB, {fluctuation}", "Uniformized chain of exponential stages (Jensen 1953), all terms positive", 0, 1e-8);
        for (var sample = 0; sample < 120; sample++)
        {
            var pulses = 2 + sample % 19;
            var snrRatios = new double[pulses];
            for (var i = 0; i < pulses; i++)
            {
                snrRatios[i] = Scale.Ratio(60 * ((sample * 20 + i) * 0.6180339887498949 % 1) - 40 + 20 * (sample * 0.7548776662466927 % 1));
            }

            var threshold = DetectionThreshold.FromFalseAlarm(pulses, Math.Pow(10, -1 - 11 * (sample * 0.5698402909980532 % 1)));
            var (detect, miss) = PulseChain.Tails(fluctuation == FluctuationCase.Case4, snrRatios, threshold);
            comparison.Add($"Pd, sample {sample}", detect, UnequalPulses.Detect(fluctuation, snrRatios, threshold));
            comparison.Add($"miss, sample {sample}", miss, UnequalPulses.Miss(fluctuation, snrRatios, threshold));
        }

        comparison.Conclude();
    }

    [Fact]
    public void Two_very_different_pulses_follow_the_closed_form()
    {
        // P(z > T) = (c1·exp(−T/c1) − c2·exp(−T/c2))/(c1 − c2) for two exponentials of means c1 and c2.
        var comparison = new Comparison("Two pulses of different SNR, case 2", "Sum of two exponentials, closed form", 0, 1e-8);
        foreach (var (s1, s2) in new[] { (0.0, 1.0), (0.0, 1e6), (3.0, 30.0), (100.0, 1e4) })
        {
            for (var threshold = 0.5; threshold < 60; threshold *= 1.7)
            {
                double c1 = 1 + s1, c2 = 1 + s2;
                var exact = (c1 * Math.Exp(-threshold / c1) - c2 * Math.Exp(-threshold / c2)) / (c1 - c2);
                comparison.Add($"S {s1}, {s2} T {threshold:0.00}", exact, UnequalPulses.Detect(FluctuationCase.Case2, [s1, s2], threshold));
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void Order_of_the_pulses_does_not_matter_and_a_pulse_of_noise_only_raises_the_sum()
    {
        double[] snrRatios = [0, 0.5, 3, 8, 2, 0.1];
        double[] turned = [8, 0.1, 2, 0, 3, 0.5];
        foreach (var fluctuation in new[] { FluctuationCase.Case2, FluctuationCase.Case4 })
        {
            var detect = UnequalPulses.Detect(fluctuation, snrRatios, 25);
            Assert.Equal(detect, UnequalPulses.Detect(fluctuation, turned, 25), 1e-12);
            Assert.True(UnequalPulses.Detect(fluctuation, [.. snrRatios, 0], 25) > detect);
            Assert.Equal(1, detect + UnequalPulses.Miss(fluctuation, snrRatios, 25), 1e-15);
        }
    }

    [Fact]
    public void One_pulse_is_the_exact_function()
    {
        foreach (var fluctuation in new[] { FluctuationCase.Case2, FluctuationCase.Case4 })
        {
            Assert.Equal(DetectionProbability.Detect(fluctuation, 1, 12, 14), UnequalPulses.Detect(fluctuation, [12.0], 14));
            Assert.Equal(DetectionProbability.Miss(fluctuation, 1, 12, 14), UnequalPulses.Miss(fluctuation, [12.0], 14));
        }
    }

    [Fact]
    public void Extreme_snr_thresholds_and_numbers_of_pulses_give_probabilities()
    {
        foreach (var fluctuation in new[] { FluctuationCase.Case2, FluctuationCase.Case4 })
        {
            foreach (var pulses in new[] { 2, 15, 600, 4096 })
            {
                foreach (var db in new[] { -200.0, -50, 0, 50, 200 })
                {
                    foreach (var threshold in new[] { 0, 1e-9, 1, 50, 5000, 1e6 })
                    {
                        var snrRatios = GaussianBeam(pulses, Scale.Ratio(db), shift: 0);
                        var detect = UnequalPulses.Detect(fluctuation, snrRatios, threshold);
                        Assert.InRange(detect, 0, 1);
                        Assert.Equal(1, detect + UnequalPulses.Miss(fluctuation, snrRatios, threshold), 1e-15);
                    }
                }
            }
        }
    }

    [Fact]
    public void Nothing_is_allocated()
    {
        var snrRatios = GaussianBeam(15, 10, shift: 0);
        UnequalPulses.Detect(FluctuationCase.Case4, snrRatios, 35);
        var before = GC.GetAllocatedBytesForCurrentThread();
        for (var i = 0; i < 100; i++)
        {
            UnequalPulses.Detect(FluctuationCase.Case4, snrRatios, 35);
        }

        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
    }

    [Fact]
    public void Nan_comes_out_as_nan_and_arguments_outside_the_domain_are_refused()
    {
        Assert.True(double.IsNaN(UnequalPulses.Detect(FluctuationCase.Case2, [1, double.NaN], 10)));
        Assert.True(double.IsNaN(UnequalPulses.Miss(FluctuationCase.Case4, [1, 2], double.NaN)));
        Assert.Throws<ArgumentException>(() => UnequalPulses.Detect(FluctuationCase.Case2, [], 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => UnequalPulses.Detect(FluctuationCase.Case1, [1, 2], 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => UnequalPulses.Detect(FluctuationCase.Case2, [1, -2], 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => UnequalPulses.Detect(FluctuationCase.Case2, [1, double.PositiveInfinity], 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => UnequalPulses.Detect(FluctuationCase.Case2, [1, 2], double.PositiveInfinity));
    }

    /// <summary>SNRs of pulses spread over ±1 beamwidth of a Gaussian beam, two-way power exp(−8·ln2·u²).</summary>
    private static double[] GaussianBeam(int pulses, double peakSnrRatio, double shift) =>
        [.. Enumerable.Range(0, pulses).Select(i => 2.0 * i / Math.Max(1, pulses - 1) - 1 + shift).Select(u => peakSnrRatio * Math.Exp(-8 * Math.Log(2) * u * u))];
}
