using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class DetectionThresholdTests
{
    [Theory]
    [InlineData("detection_thresholds.csv", "Thresholds, n 1 to 300, Pfa 1e-10 to 1e-3")]
    [InlineData("detection_thresholds_wide.csv", "Thresholds, n 1 to 4096, Pfa 1e-15 to 0.5")]
    public void Thresholds_agree_with_the_table_and_lead_back_to_the_false_alarm_probability(string file, string claim)
    {
        var table = ReferenceTable.Load(file);
        var thresholds = new Comparison(claim, table.Source, 0, 2e-14);
        var back = new Comparison(claim + ": Q(n, T) of the threshold", table.Source, 0, 1e-11);
        foreach (var row in table.Rows)
        {
            var (pulses, pfa) = (table.Whole(row, "pulses"), table.Number(row, "pfa"));
            var threshold = DetectionThreshold.FromFalseAlarm(pulses, pfa);
            thresholds.Add($"n {pulses} Pfa {pfa}", table.Number(row, "threshold"), threshold);
            back.Add($"n {pulses} Pfa {pfa}", pfa, DetectionThreshold.FalseAlarmProbability(pulses, threshold));
        }

        thresholds.Conclude();
        back.Conclude();
    }

    [Fact]
    public void Every_false_alarm_probability_of_the_domain_settles()
    {
        foreach (var pulses in new[] { 1, 2, 3, 17, 500, 4096 })
        {
            for (var exponent = -300; exponent <= -1; exponent += 13)
            {
                var pfa = Math.Pow(10, exponent);
                var back = DetectionThreshold.FalseAlarmProbability(pulses, DetectionThreshold.FromFalseAlarm(pulses, pfa));
                Assert.InRange(back / pfa, 1 - 1e-11, 1 + 1e-11);
                var often = 1 - Math.Pow(pfa, 0.04);
                Assert.Equal(often, DetectionThreshold.FalseAlarmProbability(pulses, DetectionThreshold.FromFalseAlarm(pulses, often)), 1e-12);
            }
        }
    }

    [Fact]
    public void Nan_comes_out_as_nan_and_arguments_outside_the_domain_are_refused()
    {
        Assert.True(double.IsNaN(DetectionThreshold.FromFalseAlarm(3, double.NaN)));
        Assert.True(double.IsNaN(DetectionThreshold.FalseAlarmProbability(3, double.NaN)));
        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionThreshold.FromFalseAlarm(0, 0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionThreshold.FromFalseAlarm(1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionThreshold.FromFalseAlarm(1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => DetectionThreshold.FalseAlarmProbability(1, -1));
    }
}
