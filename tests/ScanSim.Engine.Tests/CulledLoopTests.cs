using CsCheck;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine.Tests;

/// <summary>The quick loop tries only the dwells that can see a target; it must give what trying them all gives.</summary>
public class CulledLoopTests
{
    private static readonly RunOptions Quick = new() { Looks = LooksKept.All };
    private static readonly RunOptions Plain = Quick with { EveryDwell = true };

    [Fact]
    public void Culled_and_plain_loop_agree_row_for_row_on_moving_targets_of_all_sizes()
    {
        var target =
            from azimuth in Gen.Double[0, 360]
            from range in Gen.OneOf(Gen.Double[20, 2_000], Gen.Double[500, 45_000])
            from speed in Gen.OneOf(Gen.Const(0.0), Gen.Double[1, 300])
            from turn in Gen.OneOf(Gen.Const(0.0), Gen.Double[-10, 10])
            from rcsDb in Gen.Double[-20, 40]
            from height in Gen.Double[1, 3_000]
            from fluctuation in Gen.Int[0, 4]
            select (azimuth, range, speed, turn, rcs: Math.Pow(10, rcsDb / 10), height, fluctuation);
        target.Array[1, 4].Sample(
            drawn =>
            {
                var scenario = Short(TestScenario.With([.. drawn.Select((t, i) =>
                    TestScenario.Circling($"t{i}", t.azimuth, t.range, t.speed, t.turn, t.rcs, t.fluctuation, t.height))]));
                CollectingSink.Of(scenario, Quick).AssertSame(CollectingSink.Of(scenario, Plain));
            },
            iter: 60,
            seed: "0000KOIRNMP2");
    }

    [Fact]
    public void Culled_and_plain_loop_agree_on_a_sector_scan_with_blanking_and_two_PRFs()
    {
        var scenario = Short(TestScenario.With(
            TestScenario.Moving("a", 10, 9_000, 300, 30, 50, 1),
            TestScenario.Moving("b", 352, 1_200, 90, 60, 5_000, 3),
            TestScenario.Circling("c", 20, 30_000, 90, 3, 1_000, 2)));
        scenario = scenario with
        {
            Radar = scenario.Radar with
            {
                Waveform = scenario.Radar.Waveform with { PrfHz = [1800, 2100] },
                Scan = new Scan.Sector
                {
                    Limits = new AzimuthSector(330 * TestScenario.DegRad, 60 * TestScenario.DegRad),
                    RateRadPerS = 60 * TestScenario.DegRad,
                    TurnaroundS = 0.2,
                },
                Blanked = [new AzimuthSector(15 * TestScenario.DegRad, 25 * TestScenario.DegRad)],
            },
        };
        var quick = CollectingSink.Of(scenario, Quick);
        Assert.NotEmpty(quick.Looks);
        quick.AssertSame(CollectingSink.Of(scenario, Plain));
    }

    private static Scenario Short(Scenario scenario) => scenario with { Run = scenario.Run with { DurationS = 11 } };
}
