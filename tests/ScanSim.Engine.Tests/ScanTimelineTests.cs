using ScanSim.Scenarios;

namespace ScanSim.Engine.Tests;

public class ScanTimelineTests
{
    private const double DegRad = TestScenario.DegRad;

    [Fact]
    public void A_dwell_of_one_beamwidth_has_theta_times_PRF_over_6_rpm_pulses()
    {
        // 1.2 deg · 1800 Hz / (6 · 24 rpm) = 15
        var timeline = ScanTimeline.Of(TestScenario.With());
        Assert.Equal(15, timeline.DwellAt(0, 0).Pulses);
        Assert.Equal(1.2 * DegRad, timeline.DwellStepRad, 1e-9);
    }

    [Fact]
    public void Dwells_follow_one_another_without_gaps_over_ten_hours()
    {
        var scenario = TestScenario.With();
        var timeline = ScanTimeline.Of(scenario with { Run = scenario.Run with { DurationS = 36_000 } });
        Assert.Equal(14_400, timeline.ScanCount);
        long previousEnd = 0;
        for (var scan = 0; scan < timeline.ScanCount; scan += 711)
        {
            var first = timeline.FirstDwell(scan);
            Assert.True(first >= previousEnd);
            for (var index = first; index < timeline.FirstDwell(scan + 1); index++)
            {
                var dwell = timeline.DwellAt(scan, index);

                // 15 pulses at 1800 Hz (rounded to 555,555,556 ps): the middle is 7 intervals after the start.
                var expectedPs = (decimal)index * 15 * 555_555_556 + 7 * 555_555_556m;
                Assert.Equal((double)(expectedPs / 1_000_000_000_000m), dwell.MiddleS);
                Assert.InRange(dwell.MiddleS, timeline.ScanStartS(scan), timeline.ScanStartS(scan + 1));
            }

            previousEnd = timeline.FirstDwell(scan + 1);
        }
    }

    [Fact]
    public void Every_dwell_belongs_to_exactly_one_scan()
    {
        var timeline = ScanTimeline.Of(TestScenario.With());
        Assert.Equal(0, timeline.FirstDwell(0));
        var total = timeline.FirstDwell(timeline.ScanCount);
        Assert.Equal((long)(60 / (15 * 555_555_556e-12)), total, 1.0);
    }

    [Fact]
    public void The_beam_points_where_the_turn_has_got_to()
    {
        var timeline = ScanTimeline.Of(TestScenario.With());
        var dwell = timeline.DwellAt(3, timeline.FirstDwell(3) + 100);
        Assert.Equal((dwell.MiddleS - 7.5) / 2.5 * 2 * Math.PI, dwell.BeamAzimuthRad, 1e-9);
        Assert.Equal(dwell.BeamAzimuthRad, timeline.BeamAzimuthRad(dwell.MiddleS), 1e-9);
        Assert.Equal(dwell.MiddleS, timeline.TimeOfAzimuthS(3, dwell.BeamAzimuthRad)!.Value, 1e-9);
    }

    [Fact]
    public void Several_PRFs_take_turns_dwell_by_dwell()
    {
        var scenario = TestScenario.With();
        scenario = scenario with { Radar = scenario.Radar with { Waveform = scenario.Radar.Waveform with { PrfHz = [1800, 1200] } } };
        var timeline = ScanTimeline.Of(scenario);
        var first = timeline.DwellAt(0, 0);
        var second = timeline.DwellAt(0, 1);
        var third = timeline.DwellAt(0, 2);
        Assert.Equal((15, 10, 15), (first.Pulses, second.Pulses, third.Pulses));
        Assert.Equal(15 / 1800.0 + 10 / 1200.0, third.MiddleS - first.MiddleS, 1e-9);
    }

    [Fact]
    public void A_sector_scan_goes_to_and_fro_and_has_no_dwell_while_it_turns_round()
    {
        var timeline = ScanTimeline.Of(Sector(350, 30));

        // 40° at 40°/s and 0.5 s to turn round; the sector crosses north.
        Assert.Equal(1.5, timeline.ScanS, 1e-12);
        var there = timeline.DwellAt(0, timeline.FirstDwell(0));
        var back = timeline.DwellAt(1, timeline.FirstDwell(1));
        Assert.InRange(there.BeamAzimuthRad, 350 * DegRad, 351.5 * DegRad);
        Assert.InRange(back.BeamAzimuthRad, 28.5 * DegRad, 30 * DegRad);
        Assert.True(there.BeamRateRadPerS > 0 && back.BeamRateRadPerS < 0);
        for (var scan = 0; scan < timeline.ScanCount; scan++)
        {
            for (var index = timeline.FirstDwell(scan); index < timeline.FirstDwell(scan + 1); index++)
            {
                Assert.InRange(timeline.DwellAt(scan, index).MiddleS - timeline.ScanStartS(scan), 0, 1.0);
            }
        }
    }

    [Theory]
    [InlineData(355, 0, 1.0 / 8)]
    [InlineData(355, 1, 7.0 / 8)]
    [InlineData(20, 0, 6.0 / 8)]
    [InlineData(20, 1, 2.0 / 8)]
    public void A_sector_scan_passes_an_azimuth_once_a_sweep(double azimuthDeg, int scan, double share)
    {
        var timeline = ScanTimeline.Of(Sector(350, 30));
        Assert.Equal(timeline.ScanStartS(scan) + share, timeline.TimeOfAzimuthS(scan, azimuthDeg * DegRad)!.Value, 1e-9);
        Assert.Null(timeline.TimeOfAzimuthS(scan, 180 * DegRad));
    }

    [Fact]
    public void Spans_near_an_azimuth_are_split_at_the_north_mark()
    {
        var timeline = ScanTimeline.Of(TestScenario.With());
        Span<TimeSpanS> spans = stackalloc TimeSpanS[3];
        Assert.Equal(2, timeline.SpansNear(2, 1 * DegRad, 3 * DegRad, spans));
        var total = spans[0].ToS - spans[0].FromS + spans[1].ToS - spans[1].FromS;
        Assert.Equal(2.5 * 6 / 360, total, 1e-9);
        Assert.Equal(1, timeline.SpansNear(2, 90 * DegRad, 3 * DegRad, spans));
        Assert.Equal(5 + 2.5 * 87 / 360, spans[0].FromS, 1e-9);
    }

    [Fact]
    public void Blanked_sectors_may_cross_north()
    {
        var scenario = TestScenario.With();
        scenario = scenario with { Radar = scenario.Radar with { Blanked = [new AzimuthSector(350 * DegRad, 10 * DegRad)] } };
        var timeline = ScanTimeline.Of(scenario);
        Assert.True(timeline.IsBlanked(355 * DegRad));
        Assert.True(timeline.IsBlanked(5 * DegRad));
        Assert.False(timeline.IsBlanked(11 * DegRad));
    }

    private static Scenario Sector(double fromDeg, double toDeg)
    {
        var scenario = TestScenario.With();
        return scenario with
        {
            Radar = scenario.Radar with
            {
                Scan = new Scan.Sector { Limits = new AzimuthSector(fromDeg * DegRad, toDeg * DegRad), RateRadPerS = 40 * DegRad, TurnaroundS = 0.5 },
            },
        };
    }
}
