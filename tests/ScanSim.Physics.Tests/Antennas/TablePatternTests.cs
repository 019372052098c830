using ScanSim.Physics.Antennas;

namespace ScanSim.Physics.Tests.Antennas;

public sealed class TablePatternTests
{
    private static readonly TablePattern Pattern = new([-0.4, -0.1, 0.0, 0.1, 0.3], [-30.0, -6.0, 0.0, -6.0, -20.0]);

    [Theory]
    [InlineData(0.0, 0.0)]
    [InlineData(0.05, -3.0)]
    [InlineData(0.2, -13.0)]
    [InlineData(-0.25, -18.0)]
    [InlineData(0.3, -20.0)]
    [InlineData(3.0, -20.0)]
    [InlineData(-0.4, -30.0)]
    [InlineData(-3.0, -30.0)]
    public void Levels_run_linearly_in_decibels_and_hold_at_the_ends(double offsetRad, double levelDb)
    {
        Assert.Equal(levelDb, Decibels.FromRatio(Pattern.GainRatio(offsetRad)), 1e-12);
    }

    [Fact]
    public void The_beamwidth_lies_between_the_half_power_crossings()
    {
        Assert.Equal(0.2 * 3.0102999566398120 / 6.0, Pattern.BeamwidthRad, 1e-14);
        Assert.Equal(2.0 * Math.PI, new TablePattern([-1.0, 1.0], [-1.0, 0.0]).BeamwidthRad);
    }

    [Fact]
    public void Bad_tables_are_refused_with_the_row_that_is_wrong()
    {
        Assert.Contains("at least two rows", Assert.Throws<ArgumentException>(() => new TablePattern([0.0], [0.0])).Message, StringComparison.Ordinal);
        Assert.Contains("2 offsets and 1 levels", Assert.Throws<ArgumentException>(() => new TablePattern([0.0, 1.0], [0.0])).Message, StringComparison.Ordinal);
        Assert.Contains("row 3", Assert.Throws<ArgumentException>(() => new TablePattern([0.0, 1.0, 1.0], [0.0, -1.0, -2.0])).Message, StringComparison.Ordinal);
        Assert.Contains("row 2", Assert.Throws<ArgumentException>(() => new TablePattern([0.0, 1.0], [0.0, 3.0])).Message, StringComparison.Ordinal);
        Assert.Contains("row 1", Assert.Throws<ArgumentException>(() => new TablePattern([double.NaN, 1.0], [0.0, -3.0])).Message, StringComparison.Ordinal);
        Assert.Contains("row 2", Assert.Throws<ArgumentException>(() => new TablePattern([0.0, 1.0], [0.0, double.NegativeInfinity])).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_unknown_angle_has_an_unknown_gain() => Assert.Equal(double.NaN, Pattern.GainRatio(double.NaN));
}
