using ScanSim.Display.Explaining;
using ScanSim.Physics.Earth;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Tests.Explaining;

public sealed class NoLookTests
{
    private static readonly Scenario Scenario = SceneMaking.Scenario(1, 60);

    [Fact]
    public void Below_the_horizon_says_by_how_much()
    {
        // Antenna 45 m, target 5 m, 4/3 earth: √(2·8.5e6·45) + √(2·8.5e6·5) = 27.7 + 9.2 km.
        var earth = new EffectiveEarth(4.0 / 3 * EarthRadius.GaussianMeanM(Scenario.Site.LatitudeRad));
        var seenKm = (earth.HorizonDistanceM(45) + earth.HorizonDistanceM(5)) / 1000;
        Assert.Equal(36.9, seenKm, 0.1);
        var found = Explain(Row(0, 40_000, TargetView.BelowHorizon));
        Assert.Equal(PassOutcome.BelowHorizon, found.Outcome);
        Assert.Equal($"below the horizon by {40 - seenKm:0.00} km: 40.00 km away over ground, in sight to {seenKm:0.00} km (antenna 45 m, target 5 m above sea level)", found.Reason);
    }

    [Fact]
    public void Beyond_the_instrumented_range_says_by_how_much_and_where_a_folded_echo_appears()
    {
        var found = Explain(Row(0, 50_000, TargetView.BeyondInstrumentedRange));
        Assert.Equal((PassOutcome.BeyondInstrumentedRange, "beyond the instrumented range of 46.30 km by 3.70 km"), (found.Outcome, found.Reason));

        // 2000 Hz: unambiguous to 74.95 km; 124 km appears at 49.05 km.
        Assert.Equal("beyond the instrumented range of 46.30 km: its echo comes in the next interval, as if from 49.05 km", Explain(Row(0, 124_000, TargetView.BeyondInstrumentedRange)).Reason);
        Assert.Equal("beyond the instrumented range of 25.00 nmi by 2.00 nmi", Explain(Row(0, 50_004, TargetView.BeyondInstrumentedRange), RangeUnit.NauticalMile).Reason);
    }

    [Fact]
    public void Blanked_and_outside_the_sector_name_the_sector_and_the_bearing()
    {
        const double Degree = Math.PI / 180;
        var blanked = SceneMaking.Scenario(1, 60, blanked: [new AzimuthSector(10 * Degree, 40 * Degree), new AzimuthSector(200 * Degree, 260 * Degree)]);
        Assert.Equal("in the blanked sector 200° to 260° (bearing 225.0°)", Explain(Row(-5000, -5000, TargetView.Blanked), scenario: blanked).Reason);
        var sector = SceneMaking.Scenario(1, 60, new Scan.Sector { Limits = new AzimuthSector(300 * Degree, 60 * Degree), RateRadPerS = 1, TurnaroundS = 0.1 });
        var found = Explain(Row(5000, -5000, TargetView.OutsideSector), scenario: sector);
        Assert.Equal((PassOutcome.OutsideSector, "outside the sector scan 300° to 060° (bearing 135.0°)"), (found.Outcome, found.Reason));
    }

    [Fact]
    public void In_view_without_a_look_the_signal_was_too_weak_or_no_dwell_met_it()
    {
        var target = Scenario.Targets[0];
        var weak = Scenario with { Targets = [target with { RcsM2 = 1e-9 }] };
        var found = Explain(Row(0, 40_000, TargetView.InView), scenario: weak);
        Assert.Equal(PassOutcome.TooWeakForLook, found.Outcome);
        Assert.Matches("^signal too weak for a look: -[0-9.]+ dB per pulse at the beam's peak, summed more than 20 dB below one pulse's noise$", found.Reason);

        found = Explain(Row(0, 10_000, TargetView.InView));
        Assert.Equal(PassOutcome.NoDwell, found.Outcome);
        Assert.EndsWith("but no dwell of this scan met it there", found.Reason, StringComparison.Ordinal);

        found = Explain(Row(0, 10_000, TargetView.InView) with { ElevationDeg = 33 });
        Assert.Equal((PassOutcome.TooWeakForLook, "signal too weak for a look: 33.0° off the beam's elevation, summed more than 20 dB below one pulse's noise"), (found.Outcome, found.Reason));

        // 2.5e-7 s of pulse: deaf to 37.5 m, and an echo from there begins just as the pulse ends; at 0 m nothing of it is heard.
        Assert.Equal("no look: the whole echo came while the receiver was shut", Explain(Row(0, 0, TargetView.InView)).Reason);
    }

    [Fact]
    public void Twenty_decibels_below_one_pulses_noise_is_where_looks_end()
    {
        // The SNR per pulse is said in the words; the pulses are 1.2° / 360° · 2.5 s · 2000 Hz = 16.67, rounded 17: 12.3 dB.
        double At(double rcsM2)
        {
            var found = Explain(Row(0, 40_000, TargetView.InView), scenario: Scenario with { Targets = [Scenario.Targets[0] with { RcsM2 = rcsM2 }] });
            return found.Outcome == PassOutcome.TooWeakForLook ? 1 : 0;
        }

        double low = 1e-12, high = 1e3;
        for (var i = 0; i < 60; i++)
        {
            var middle = Math.Sqrt(low * high);
            (low, high) = At(middle) == 1 ? (middle, high) : (low, middle);
        }

        var edge = Explain(Row(0, 40_000, TargetView.InView), scenario: Scenario with { Targets = [Scenario.Targets[0] with { RcsM2 = low }] });
        Assert.StartsWith("signal too weak for a look: -32.3 dB per pulse", edge.Reason, StringComparison.Ordinal);
    }

    private static NoLookExplanation Explain(TruthRow row, RangeUnit unit = RangeUnit.Kilometre, Scenario? scenario = null) =>
        new LookExplainer(scenario ?? Scenario, unit: unit).Explain(row);

    private static TruthRow Row(double eastM, double northM, TargetView view) => SceneMaking.TruthRow(Scenario.Targets[0].Id, 4, 10, eastM, northM, 0, 0, view);
}
