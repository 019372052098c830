using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class DetectionProbabilityTests
{
    private static readonly FluctuationCase[] AllCases = Enum.GetValues<FluctuationCase>();

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(4)]
    public void Detection_and_miss_agree_with_the_table_in_both_tails(int number)
    {
        var table = ReferenceTable.Load("detection_swerling_pd.csv");
        var absolute = new Comparison($"Pd of fluctuation case {number}", table.Source, 1e-12, 0);
        var relative = new Comparison($"Pd and miss of fluctuation case {number}, relative in both tails", table.Source, Scale.SmallestNormal, 2e-12);
        foreach (var row in table.Rows.Where(r => table.Whole(r, "fluctuation_case") == number))
        {
            var (pulses, threshold) = (table.Whole(row, "pulses"), table.Number(row, "threshold"));
            var snrRatio = Scale.Ratio(table.Number(row, "snr_db"));
            var name = $"n {pulses} Pfa {table.Text(row, "pfa")} S {table.Text(row, "snr_db")} dB";
            var detect = DetectionProbability.Detect((FluctuationCase)number, pulses, snrRatio, threshold);
            absolute.Add(name, table.Number(row, "pd"), detect);
            relative.Add("Pd " + name, table.Number(row, "pd"), detect);
            relative.Add("miss " + name, table.Number(row, "pmiss"), DetectionProbability.Miss((FluctuationCase)number, pulses, snrRatio, threshold));
        }

        absolute.Conclude();
        relative.Conclude();
    }

    [Fact]
    public void Many_pulses_and_rare_or_frequent_false_alarms_agree_with_the_table()
    {
        var table = ReferenceTable.Load("detection_pd_wide.csv");
        var absolute = new Comparison("Pd of all cases, n 1 to 4096, Pfa 1e-15 to 0.5", table.Source, 1e-12, 0);
        var relative = new Comparison("Pd and miss of all cases, n 1 to 4096, Pfa 1e-15 to 0.5, relative in both tails", table.Source, 0, 2e-12);
        foreach (var row in table.Rows)
        {
            var fluctuation = (FluctuationCase)table.Whole(row, "fluctuation_case");
            var (pulses, threshold) = (table.Whole(row, "pulses"), table.Number(row, "threshold"));
            var snrRatio = Scale.Ratio(table.Number(row, "snr_db"));
            var name = $"{fluctuation} n {pulses} Pfa {table.Text(row, "pfa")} S {table.Text(row, "snr_db")} dB";
            var detect = DetectionProbability.Detect(fluctuation, pulses, snrRatio, threshold);
            absolute.Add(name, table.Number(row, "pd"), detect);
            relative.Add("Pd " + name, table.Number(row, "pd"), detect);
            if (table.Text(row, "pmiss") != "nan")
            {
                relative.Add("miss " + name, table.Number(row, "pmiss"), DetectionProbability.Miss(fluctuation, pulses, snrRatio, threshold));
            }
        }

        absolute.Conclude();
        relative.Conclude();
    }

    [Fact]
    public void Cases_coincide_where_their_energies_do()
    {
        var comparison = new Comparison("Case 1 = case 2 and case 3 = case 4 at one pulse, case 3 = case 2 at two", "Swerling 1954", 0, 1e-12);
        foreach (var (pulses, one, other) in new[]
        {
            (1, FluctuationCase.Case1, FluctuationCase.Case2),
            (1, FluctuationCase.Case3, FluctuationCase.Case4),
            (2, FluctuationCase.Case3, FluctuationCase.Case2),
        })
        {
            for (var db = -40; db <= 60; db += 5)
            {
                var snrRatio = Scale.Ratio(db);
                comparison.Add($"Pd {one} {other} {db} dB", DetectionProbability.Detect(one, pulses, snrRatio, 16), DetectionProbability.Detect(other, pulses, snrRatio, 16));
                comparison.Add($"miss {one} {other} {db} dB", DetectionProbability.Miss(one, pulses, snrRatio, 16), DetectionProbability.Miss(other, pulses, snrRatio, 16));
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void Closed_forms_of_cases_1_and_3_agree_with_the_sums()
    {
        var comparison = new Comparison("Closed forms of cases 1 and 3 agree with the mixture", "Swerling 1954, exact forms", 1e-12, 1e-10);
        foreach (var pulses in new[] { 3, 10, 64 })
        {
            var threshold = DetectionThreshold.FromFalseAlarm(pulses, 1e-6);
            for (var db = 0; db <= 30; db += 3)
            {
                var snrRatio = Scale.Ratio(db);
                comparison.Add($"case 1, n {pulses}, {db} dB", ClosedCase1(pulses, snrRatio, threshold), DetectionProbability.Detect(FluctuationCase.Case1, pulses, snrRatio, threshold));
                comparison.Add($"case 3, n {pulses}, {db} dB", ClosedCase3(pulses, snrRatio, threshold), DetectionProbability.Detect(FluctuationCase.Case3, pulses, snrRatio, threshold));
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void Without_signal_every_case_has_the_false_alarm_probability()
    {
        var comparison = new Comparison("Pd at S = 0 and its limit S -> 0 are Pfa", "Q(n, T) = Pfa", 0, 1e-9);
        foreach (var fluctuation in AllCases)
        {
            foreach (var pulses in new[] { 1, 2, 30, 4096 })
            {
                var threshold = DetectionThreshold.FromFalseAlarm(pulses, 1e-6);
                comparison.Add($"{fluctuation} n {pulses} S 0", 1e-6, DetectionProbability.Detect(fluctuation, pulses, 0, threshold));
                comparison.Add($"{fluctuation} n {pulses} S 1e-20", 1e-6, DetectionProbability.Detect(fluctuation, pulses, 1e-20, threshold));
                comparison.Add($"{fluctuation} n {pulses} S 1e-12", 1e-6, DetectionProbability.Detect(fluctuation, pulses, 1e-12, threshold));
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void Fast_fluctuation_averages_out_over_many_pulses()
    {
        var threshold = DetectionThreshold.FromFalseAlarm(4096, 1e-6);
        var steady = DetectionProbability.Detect(FluctuationCase.Steady, 4096, 0.1, threshold);
        var at2 = DetectionProbability.Detect(FluctuationCase.Case2, 4096, 0.1, threshold);
        var at4 = DetectionProbability.Detect(FluctuationCase.Case4, 4096, 0.1, threshold);

        // The variance of the sum is n(1+2S), n(1+S)² and n((1+S)² − S²/2): a difference of S²/2n of itself at most.
        Assert.InRange(steady, 0.9, 0.97);
        Assert.Equal(steady, at2, 2e-3);
        Assert.Equal(steady, at4, 1e-3);
        Assert.InRange(Math.Abs(at4 - steady), 0.3 * Math.Abs(at2 - steady), 0.7 * Math.Abs(at2 - steady));
    }

    [Fact]
    public void Detection_never_falls_when_the_snr_grows_and_both_tails_add_to_one()
    {
        foreach (var fluctuation in AllCases)
        {
            foreach (var pulses in new[] { 1, 2, 3, 16, 300, 4096 })
            {
                foreach (var pfa in new[] { 0.9, 0.5, 1e-3, 1e-8, 1e-15 })
                {
                    var threshold = DetectionThreshold.FromFalseAlarm(pulses, pfa);
                    var last = DetectionProbability.Detect(fluctuation, pulses, 0, threshold);
                    for (var db = -120.0; db <= 120; db += 2.5)
                    {
                        var detect = DetectionProbability.Detect(fluctuation, pulses, Scale.Ratio(db), threshold);
                        var miss = DetectionProbability.Miss(fluctuation, pulses, Scale.Ratio(db), threshold);
                        Assert.True(detect >= last * (1 - 1e-10), $"{fluctuation} n {pulses} Pfa {pfa} {db} dB: {last:R} then {detect:R}");
                        Assert.Equal(1, detect + miss, 1e-14);
                        Assert.InRange(miss, 0, 1);
                        last = detect;
                    }
                }
            }
        }
    }

    [Fact]
    public void Small_miss_probability_of_slow_fluctuation_follows_its_power_law()
    {
        // For S → ∞ the miss of case 1 is Σ_k P(n+k, T)/(nS): tenfold SNR, a tenth of the misses; case 3 a hundredth.
        var threshold = DetectionThreshold.FromFalseAlarm(10, 1e-6);
        var case1 = DetectionProbability.Miss(FluctuationCase.Case1, 10, 1e12, threshold) / DetectionProbability.Miss(FluctuationCase.Case1, 10, 1e13, threshold);
        var case3 = DetectionProbability.Miss(FluctuationCase.Case3, 10, 1e12, threshold) / DetectionProbability.Miss(FluctuationCase.Case3, 10, 1e13, threshold);
        Assert.Equal(10, case1, 1e-9);
        Assert.Equal(100, case3, 1e-8);
    }

    [Fact]
    public void A_threshold_of_zero_is_always_exceeded()
    {
        foreach (var fluctuation in AllCases)
        {
            Assert.Equal(1, DetectionProbability.Detect(fluctuation, 5, 2, 0));
            Assert.Equal(0, DetectionProbability.Miss(fluctuation, 5, 2, 0));
        }
    }

    [Fact]
    public void Nan_comes_out_as_nan_and_arguments_outside_the_domain_are_refused()
    {
        foreach (var fluctuation in AllCases)
        {
            Assert.True(double.IsNaN(DetectionProbability.Detect(fluctuation, 3, double.NaN, 10)));
            Assert.True(double.IsNaN(DetectionProbability.Miss(fluctuation, 3, 1, double.NaN)));
        }

        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionProbability.Detect(FluctuationCase.Case1, 0, 1, 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionProbability.Detect(FluctuationCase.Case1, 1, -1, 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionProbability.Detect(FluctuationCase.Case1, 1, double.PositiveInfinity, 10));
        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionProbability.Detect((FluctuationCase)7, 1, 1, 10));
    }

    private static double ClosedCase1(int n, double snrRatio, double threshold)
    {
        var c = 1 + n * snrRatio;
        var b = 1 - 1 / c;
        return IncompleteGamma.UpperRegularized(n - 1, threshold) + Math.Pow(b, 1 - n) * Math.Exp(-threshold / c) * IncompleteGamma.LowerRegularized(n - 1, b * threshold);
    }

    private static double ClosedCase3(int n, double snrRatio, double threshold)
    {
        var c = 1 + n * snrRatio / 2;
        var b = 1 - 1 / c;
        var first = (1 + threshold / c) * Math.Pow(b, 2 - n) * IncompleteGamma.LowerRegularized(n - 2, b * threshold);
        var second = n == 2 ? 0 : (n - 2) / c * Math.Pow(b, 1 - n) * IncompleteGamma.LowerRegularized(n - 1, b * threshold);
        return IncompleteGamma.UpperRegularized(n - 2, threshold) + Math.Exp(-threshold / c) * (first - second);
    }
}
