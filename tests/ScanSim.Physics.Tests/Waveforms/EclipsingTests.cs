using CsCheck;
using ScanSim.Physics.Waveforms;

namespace ScanSim.Physics.Tests.Waveforms;

public sealed class EclipsingTests
{
    private const double HalfLight = 0.5 * Constants.SpeedOfLightMps;

    /// <summary>Hand-worked: a pulse of 10 µs every 100 µs.</summary>
    [Theory]
    [InlineData(0.0, 0.0)]
    [InlineData(2.5, 0.0625)]
    [InlineData(5.0, 0.25)]
    [InlineData(10.0, 1.0)]
    [InlineData(50.0, 1.0)]
    [InlineData(90.0, 1.0)]
    [InlineData(95.0, 0.25)]
    [InlineData(98.0, 0.04)]
    [InlineData(105.0, 0.25)]
    [InlineData(150.0, 1.0)]
    public void The_part_that_is_heard_counts_squared_at_both_ends_of_the_interval(double delayUs, double ratio)
    {
        Assert.Equal(ratio, Eclipsing.PowerRatio(HalfLight * delayUs * 1e-6, 10e-6, 100e-6), 1e-12);
    }

    /// <summary>Second route: the matched filter's peak summed sample by sample over the time in which the receiver is open.</summary>
    [Fact]
    public void The_ratio_is_the_matched_filter_output_of_the_cut_echo()
    {
        Property.Holds(
            Gen.Select(Gen.Double[0, 3], Gen.Double[0.01, 1.0]),
            1000,
            v =>
            {
                var (delay, duty) = v;
                const int Samples = 4000;
                int heard = 0;
                for (int i = 0; i < Samples; i++)
                {
                    double time = (delay + (i + 0.5) / Samples * duty) % 1.0;
                    heard += time >= duty ? 1 : 0;
                }

                double share = (double)heard / Samples;
                double actual = Eclipsing.PowerRatio(HalfLight * delay * 1e-3, duty * 1e-3, 1e-3);
                return Math.Abs(share - Math.Sqrt(actual)) < 1e-3;
            });
    }

    [Fact]
    public void An_unknown_range_has_an_unknown_ratio() => Assert.Equal(double.NaN, Eclipsing.PowerRatio(double.NaN, 1e-6, 1e-3));
}
