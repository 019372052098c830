namespace ScanSim.Physics.Tests;

public sealed class DecibelsTests
{
    [Theory]
    [InlineData(0, 1)]
    [InlineData(10, 10)]
    [InlineData(-30, 1e-3)]
    [InlineData(3.0102999566398120, 2)]
    [InlineData(double.NegativeInfinity, 0)]
    [InlineData(double.PositiveInfinity, double.PositiveInfinity)]
    public void Levels_and_ratios_are_ten_times_the_common_logarithm_apart(double db, double ratio)
    {
        Assert.Equal(ratio, Decibels.ToRatio(db), double.IsFinite(ratio) ? 1e-14 * ratio : 0);
        if (double.IsFinite(db))
        {
            Assert.Equal(db, Decibels.FromRatio(ratio), 1e-14);
        }
    }

    [Fact]
    public void A_level_survives_the_way_through_its_ratio_over_six_hundred_decades()
    {
        for (double db = -3000; db <= 3000; db += 0.37)
        {
            Assert.Equal(db, Decibels.FromRatio(Decibels.ToRatio(db)), 1e-12);
        }
    }

    [Fact]
    public void Zero_is_minus_infinity_and_a_negative_ratio_is_no_level()
    {
        Assert.Equal(double.NegativeInfinity, Decibels.FromRatio(0));
        Assert.Equal(double.NaN, Decibels.FromRatio(-1));
        Assert.Equal(double.NaN, Decibels.FromRatio(double.NaN));
        Assert.Equal(double.NaN, Decibels.ToRatio(double.NaN));
    }
}
