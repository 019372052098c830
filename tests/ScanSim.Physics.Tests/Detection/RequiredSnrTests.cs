using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class RequiredSnrTests
{
    [Fact]
    public void Required_snr_agrees_with_the_table()
    {
        var table = ReferenceTable.Load("detection_required_snr.csv");
        var comparison = new Comparison("Required SNR, all cases, n 1 to 300", table.Source, 1e-9, 0, "dB");
        foreach (var row in table.Rows)
        {
            var fluctuation = (FluctuationCase)table.Whole(row, "fluctuation_case");
            var (pulses, pfa, pd) = (table.Whole(row, "pulses"), table.Number(row, "pfa"), table.Number(row, "pd"));
            comparison.Add($"{fluctuation} n {pulses} Pfa {pfa} Pd {pd}", table.Number(row, "required_snr_db"), Scale.Db(RequiredSnr.Ratio(fluctuation, pulses, pfa, pd)));
        }

        comparison.Conclude();
    }

    [Fact]
    public void Published_chart_values_and_examples_are_met_within_their_printed_digits()
    {
        var table = ReferenceTable.Load("detection_published_snr.csv");
        foreach (var row in table.Rows)
        {
            var (pulses, pfa, pd) = (table.Whole(row, "pulses"), table.Number(row, "pfa"), table.Number(row, "pd"));
            var where = table.Text(row, "where");
            var comparison = new Comparison($"Required SNR, steady target, n {pulses} Pfa {pfa:0.##E+0} Pd {pd}: {where}", $"{where} ({table.Text(row, "status")})", table.Number(row, "tolerance_db"), 0, "dB");
            var ratio = RequiredSnr.Ratio((FluctuationCase)table.Whole(row, "fluctuation_case"), pulses, pfa, pd);
            comparison.Add(where, table.Number(row, "published_snr_db"), Scale.Db(ratio));
            comparison.Conclude();
        }
    }

    [Fact]
    public void Required_snr_leads_back_to_the_detection_probability()
    {
        foreach (var fluctuation in Enum.GetValues<FluctuationCase>())
        {
            foreach (var pulses in new[] { 1, 7, 4096 })
            {
                foreach (var (pfa, pd) in new[] { (1e-15, 0.9999), (1e-6, 1.1e-6), (0.1, 0.5), (1e-4, 1e-3), (1e-6, 1 - 1e-9) })
                {
                    var ratio = RequiredSnr.Ratio(fluctuation, pulses, pfa, pd);
                    var threshold = DetectionThreshold.FromFalseAlarm(pulses, pfa);
                    Assert.Equal(1, DetectionProbability.Detect(fluctuation, pulses, ratio, threshold) / pd, 1e-10);
                    Assert.Equal(1, DetectionProbability.Miss(fluctuation, pulses, ratio, threshold) / (1 - pd), 1e-6);
                }
            }
        }
    }

    [Fact]
    public void Albersheims_formula_holds_within_its_accuracy_for_the_linear_detector_and_so_within_0_3_dB_for_the_square_law()
    {
        var table = ReferenceTable.Load("detection_linear_law.csv");
        var formula = new Comparison("Albersheim's formula against the exact linear detector", "Tufts and Cann 1983 eq. 1; stated accuracy 0.2 dB", 0.2, 0, "dB");
        var square = new Comparison("Albersheim's formula (linear detector) against our square-law detector", "Tufts and Cann 1983 eq. 1; 0.2 dB and the difference of the detectors", 0.3, 0, "dB");
        var exact = new Comparison("Square-law detector beside the exact linear one", table.Source, 1e-4, 0, "dB");
        foreach (var row in table.Rows)
        {
            var (pulses, pfa, pd) = (table.Whole(row, "pulses"), table.Number(row, "pfa"), table.Number(row, "pd"));
            var name = $"n {pulses} Pfa {pfa} Pd {pd}";
            var ours = Scale.Db(RequiredSnr.Ratio(FluctuationCase.Steady, pulses, pfa, pd));
            formula.Add(name, table.Number(row, "linear_snr_db"), AlbersheimDb(pulses, pfa, pd));
            square.Add(name, AlbersheimDb(pulses, pfa, pd), ours);
            exact.Add(name, table.Number(row, "square_law_snr_db"), ours);
        }

        formula.Conclude();
        square.Conclude();
        exact.Conclude();
    }

    [Fact]
    public void Norths_approximation_holds_for_one_pulse()
    {
        var comparison = new Comparison("North's approximation, one pulse, steady, Pd 0.1 to 0.9, Pfa 1e-10 to 1e-4", "Barton and Leonov 1998, p. 122, table D5 (North)", 5e-3, 0);
        foreach (var pfa in new[] { 1e-4, 1e-6, 1e-8, 1e-10 })
        {
            for (var pd = 0.1; pd < 0.95; pd += 0.1)
            {
                var snrRatio = RequiredSnr.Ratio(FluctuationCase.Steady, 1, pfa, pd);
                var u = Math.Sqrt(-Math.Log(pfa)) - Math.Sqrt(snrRatio + 0.5);
                var upperHalf = 0.5 * IncompleteGamma.UpperRegularized(0.5, u * u);
                comparison.Add($"Pfa {pfa} Pd {pd:0.0}", pd, u > 0 ? upperHalf : 1 - upperHalf);
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void Nan_comes_out_as_nan_and_arguments_outside_the_domain_are_refused()
    {
        Assert.True(double.IsNaN(RequiredSnr.Ratio(FluctuationCase.Case1, 3, double.NaN, 0.5)));
        Assert.True(double.IsNaN(RequiredSnr.Ratio(FluctuationCase.Case1, 3, 1e-6, double.NaN)));
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => RequiredSnr.Ratio(FluctuationCase.Case1, 3, 0.5, 0.5));
        Assert.Contains("must exceed the false-alarm probability 0.5", error.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => RequiredSnr.Ratio(FluctuationCase.Case1, 3, 0.5, 1));
    }

    private static double AlbersheimDb(int pulses, double pfa, double pd)
    {
        var a = Math.Log(0.62 / pfa);
        var b = Math.Log(pd / (1 - pd));
        return -5 * Math.Log10(pulses) + (6.2 + 4.54 / Math.Sqrt(pulses + 0.44)) * Math.Log10(a + 0.12 * a * b + 1.7 * b);
    }
}
