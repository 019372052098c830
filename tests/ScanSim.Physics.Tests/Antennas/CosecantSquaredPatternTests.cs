using ScanSim.Physics.Antennas;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Antennas;

public sealed class CosecantSquaredPatternTests
{
    private static readonly double Tilt = Degrees.ToRad(3.6);
    private static readonly CosecantSquaredPattern RadarC = new(Degrees.ToRad(4.8), Tilt, Degrees.ToRad(30.0) + 1e-12);

    [Fact]
    public void The_pattern_agrees_with_the_recommendation()
    {
        var table = ReferenceTable.Load("antenna_m1851_cosecant.csv");
        var comparison = new Comparison("Cosecant-squared elevation pattern", table.Source, 1e-6, 0.0, "dB");
        foreach (string[] row in table.Rows)
        {
            double elevationDeg = table.Number(row, "elevation_deg");
            double gain = RadarC.GainRatio(Degrees.ToRad(elevationDeg) - Tilt);
            comparison.Add($"{elevationDeg} deg", table.Number(row, "level_db"), Math.Max(-55.0, Decibels.FromRatio(gain)));
        }

        comparison.Conclude();
    }

    /// <summary>What the shape is for: at constant height the two-way gain makes up for the range.</summary>
    [Fact]
    public void Echoes_at_constant_height_keep_their_power_over_the_shaped_part()
    {
        double Echo(double elevationRad) => Math.Pow(RadarC.GainRatio(elevationRad - Tilt), 2) * Math.Pow(Math.Sin(elevationRad), 4);
        double reference = Echo(Degrees.ToRad(7.0));
        for (double deg = 6.1; deg < 30.0; deg += 0.5)
        {
            Assert.Equal(1.0, Echo(Degrees.ToRad(deg)) / reference, 1e-12);
        }
    }

    [Fact]
    public void The_shaped_part_begins_without_a_step()
    {
        double offset = Degrees.ToRad(2.4);
        Assert.Equal(RadarC.GainRatio(offset - 1e-10), RadarC.GainRatio(offset + 1e-10), 1e-8);
    }

    [Theory]
    [InlineData(0.1, -0.06, 0.5)]
    [InlineData(0.1, 0.0, 0.04)]
    [InlineData(0.1, 0.0, 1.6)]
    [InlineData(0.1, double.NaN, 0.5)]
    [InlineData(0.1, 0.0, double.NaN)]
    public void A_shaped_part_that_cannot_be_is_refused(double beamwidthRad, double tiltRad, double upToRad)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new CosecantSquaredPattern(beamwidthRad, tiltRad, upToRad));
    }
}
