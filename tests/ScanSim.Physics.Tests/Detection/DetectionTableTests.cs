using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class DetectionTableTests
{
    [Theory]
    [InlineData(FluctuationCase.Steady)]
    [InlineData(FluctuationCase.Case1)]
    [InlineData(FluctuationCase.Case2)]
    [InlineData(FluctuationCase.Case3)]
    [InlineData(FluctuationCase.Case4)]
    public void Table_agrees_with_the_exact_function_between_its_nodes(FluctuationCase fluctuation)
    {
        var absolute = new Comparison($"Table of Pd over SNR, {fluctuation}", "DetectionProbability, same arguments", 1e-6, 0);
        var relative = new Comparison($"Table of Pd over SNR, {fluctuation}, where Pd < 1e-4", "DetectionProbability, same arguments", 0, 1e-4);
        foreach (var (pulses, pfa) in new[] { (1, 1e-6), (1, 1e-15), (2, 0.5), (10, 1e-4), (15, 1e-8), (64, 1e-6), (300, 1e-10), (1024, 1e-6) })
        {
            var threshold = DetectionThreshold.FromFalseAlarm(pulses, pfa);
            var table = new DetectionTable(fluctuation, pulses, threshold);

            // A step of 0.0777 dB is in no ratio to octaves or their parts.
            for (var db = -100.0; db < 120; db += 0.0777)
            {
                var snrRatio = Scale.Ratio(db);
                var exact = DetectionProbability.Detect(fluctuation, pulses, snrRatio, threshold);
                var name = $"n {pulses} Pfa {pfa} S {db:0.0000} dB";
                absolute.Add(name, exact, table.Detect(snrRatio));
                if (exact < 1e-4)
                {
                    relative.Add(name, exact, table.Detect(snrRatio));
                }
            }
        }

        absolute.Conclude();
        relative.Conclude();
    }

    [Fact]
    public void Ends_are_the_false_alarm_probability_and_one()
    {
        var threshold = DetectionThreshold.FromFalseAlarm(8, 1e-6);
        var table = new DetectionTable(FluctuationCase.Case1, 8, threshold);
        Assert.Equal(1e-6, table.Detect(0), 1e-16);
        Assert.Equal(1e-6, table.Detect(double.Epsilon), 1e-16);
        Assert.Equal(1, table.Detect(1e300));
        Assert.Equal(1, table.Detect(double.PositiveInfinity));
        Assert.True(double.IsNaN(table.Detect(double.NaN)));
        Assert.Throws<ArgumentOutOfRangeException>(() => table.Detect(-1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new DetectionTable(FluctuationCase.Case1, 8, double.NaN));
    }

    [Fact]
    public void Every_ordinary_and_odd_threshold_has_a_table()
    {
        foreach (var fluctuation in Enum.GetValues<FluctuationCase>())
        {
            foreach (var pulses in new[] { 1, 2, 3, 5, 30, 100, 500, 4096 })
            {
                foreach (var pfa in new[] { 0.99, 0.1, 1e-5, 1e-15, 1e-60 })
                {
                    var table = new DetectionTable(fluctuation, pulses, DetectionThreshold.FromFalseAlarm(pulses, pfa));
                    Assert.InRange(table.Detect(1.0 / 3), pfa * (1 - 1e-9), 1);
                }

                Assert.Equal(1, new DetectionTable(fluctuation, pulses, 0).Detect(0.3));
            }
        }
    }

    [Fact]
    public void Reading_from_many_threads_gives_the_same_bits()
    {
        var table = new DetectionTable(FluctuationCase.Case3, 12, DetectionThreshold.FromFalseAlarm(12, 1e-5));
        var snrRatios = Enumerable.Range(0, 20_000).Select(i => Scale.Ratio(-40 + i * 0.005)).ToArray();
        var alone = snrRatios.Select(table.Detect).ToArray();
        var together = new double[snrRatios.Length];
        Parallel.For(0, snrRatios.Length, new ParallelOptions { MaxDegreeOfParallelism = 8 }, i => together[i] = table.Detect(snrRatios[i]));
        Assert.Equal(alone, together);
    }
}
