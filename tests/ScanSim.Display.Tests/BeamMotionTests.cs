using ScanSim.Scenarios;

namespace ScanSim.Display.Tests;

public sealed class BeamMotionTests
{
    [Theory]
    [InlineData(0, 0)]
    [InlineData(0.625, 90)]
    [InlineData(2.499, 359.856)]
    [InlineData(2.5, 0)]
    [InlineData(1000 * 2.5 + 1.25, 180)]
    public void A_rotating_beam_starts_at_north_and_turns_clockwise(double timeS, double expectedDeg)
    {
        var beam = new BeamMotion(new Scan.Rotation { PeriodS = 2.5 });
        Assert.Equal(expectedDeg, beam.AzimuthRad(timeS) * 180 / Math.PI, 1e-9);
        Assert.Equal(2.5, beam.PeriodS);
    }

    [Theory]
    [InlineData(0, 330)]
    [InlineData(1, 350)]
    [InlineData(3, 30)]
    [InlineData(3.9, 30)]
    [InlineData(4, 30)]
    [InlineData(5, 10)]
    [InlineData(7, 330)]
    [InlineData(7.5, 330)]
    [InlineData(9, 350)]
    public void A_sector_beam_sweeps_to_and_fro_and_waits_while_it_turns_round(double timeS, double expectedDeg)
    {
        const double degree = Math.PI / 180;
        var beam = new BeamMotion(new Scan.Sector { Limits = new AzimuthSector(330 * degree, 30 * degree), RateRadPerS = 20 * degree, TurnaroundS = 1 });
        Assert.Equal(expectedDeg, beam.AzimuthRad(timeS) / degree, 1e-9);
        Assert.Equal(4, beam.PeriodS, 1e-12);
    }
}
