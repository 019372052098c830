using ScanSim.Display.Painting;

namespace ScanSim.Display.Tests;

public sealed class ScaleTests
{
    [Theory]
    [InlineData(0.07, 0.1)]
    [InlineData(1, 1)]
    [InlineData(1.01, 2)]
    [InlineData(2.2, 5)]
    [InlineData(5, 5)]
    [InlineData(5.1, 10)]
    [InlineData(46.3 / 6, 10)]
    public void Steps_of_length_go_by_1_2_5(double least, double expected) => Assert.Equal(expected, NiceStep.AtLeast(least), 1e-12);

    [Theory]
    [InlineData(0.2, 1)]
    [InlineData(11, 15)]
    [InlineData(31, 60)]
    [InlineData(1801, 3600)]
    [InlineData(50_000, 86_400)]
    [InlineData(100_000, 172_800)]
    public void Steps_of_time_are_those_of_a_clock(double leastS, double expected) => Assert.Equal(expected, NiceStep.TimeAtLeast(leastS), 1e-9);

    [Fact]
    public void Ticks_stand_at_round_clock_times_whatever_the_start()
    {
        var start = new DateTimeOffset(2026, 5, 12, 8, 9, 50, TimeSpan.FromHours(2));
        Assert.Equal([10, 310, 610], TimeAxis.TicksS(start, 700, 300));
    }

    [Fact]
    public void Zooming_in_never_crowds_the_rings()
    {
        for (var rangeM = 50.0; rangeM < 400_000; rangeM *= 1.07)
        {
            foreach (var unit in Enum.GetValues<RangeUnit>())
            {
                var stepM = PlanGrid.RingStepM(rangeM, rangeM / 250, unit);
                Assert.InRange(rangeM / stepM, 1.99, 6.01);
            }
        }
    }
}
