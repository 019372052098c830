using ScanSim.Display.Explaining;
using ScanSim.Physics;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Display.Tests.Explaining;

public sealed class LookExplainerTests
{
    private const double FalseAlarms = 1e-6;

    /// <summary>One pulse, case 1: Pd = Pfa^(1/(1+S)), so S = ln Pfa / ln Pd − 1: 18.9316 for Pd 0.5, 130.126 for Pd 0.9.</summary>
    private const double NeededDb = 12.7719;
    private const double NeededForNineTenthsDb = 21.1437;

    private static readonly Scenario Scenario = WithCase(1);

    [Fact]
    public void A_row_worked_by_hand_is_split_into_its_losses()
    {
        var look = new LookExplainer(Scenario).Explain(Row(-10, -3, -1.5, -0.5, LossReason.Range));
        var worked = new Comparison("Explanation of one look against a row worked by hand", "S = ln Pfa / ln Pd − 1 (one pulse, case 1), four digits", 1e-4, 1e-4, "dB");
        worked.Add("needed for Pd 0.5", NeededDb, look.NeededDb);
        worked.Add("needed for Pd 0.9", NeededForNineTenthsDb, look.NeededForWantedDb);
        worked.Add("free space: 170 - 10 - 160", 0, look.FreeSpaceSnrDb);
        worked.Add("margin: -5 - 12.7719", -17.7719, look.MarginDb);
        worked.Add("margin for Pd 0.9: -5 - 21.1437", -26.1437, look.MarginForWantedDb);
        worked.Add("range loss", 12.7719, look.LossDb(LookTerm.Range));
        worked.Add("azimuth loss", 3, look.LossDb(LookTerm.AzimuthBeam));
        worked.Add("elevation loss", 1.5, look.LossDb(LookTerm.ElevationBeam));
        worked.Add("eclipsing loss", 0.5, look.LossDb(LookTerm.Eclipsing));
        worked.Add("range for Pd 0.5, km: 10 / 18.9316^(1/4)", 4.7941, look.EvenOddsRangeM / 1000);
        worked.Add("range for Pd 0.9, km: 10 / 130.126^(1/4)", 2.9608, look.WantedRangeM / 1000);
        worked.Conclude();
        Assert.Equal(LookTerm.Range, look.Costliest.Term);
        Assert.Equal("missed: 17.8 dB below need: 12.8 dB of range, 3.0 dB off the beam's azimuth, 1.5 dB off the beam's elevation, 0.5 dB of eclipsing", look.Reason);
    }

    [Fact]
    public void The_losses_add_up_to_what_the_margin_lacks()
    {
        var explainer = new LookExplainer(Scenario);
        var draws = new Random(11);
        for (var i = 0; i < 200; i++)
        {
            var look = explainer.Explain(Row(40 * draws.NextDouble() - 20, -40 * draws.NextDouble(), -9 * draws.NextDouble(), -draws.NextDouble(), LossReason.AzimuthBeam, pulses: 1 + draws.Next(32)));
            Assert.Equal(look.MarginDb, -look.Losses.Sum(l => l.LossDb), 1e-9);
            Assert.Equal(look.Losses.Max(l => l.LossDb), look.Costliest.LossDb);
        }
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(4)]
    public void At_margin_0_the_probability_of_detection_is_one_half_and_at_the_other_the_one_asked_for(int fluctuation)
    {
        foreach (var wantedPd in new[] { 0.2, 0.9, 0.99 })
        {
            var explainer = new LookExplainer(WithCase(fluctuation), wantedPd);
            foreach (var pulses in new[] { 1, 7, 13, 64 })
            {
                var look = explainer.Explain(Row(0, 0, 0, 0, LossReason.None, pulses));
                var threshold = DetectionThreshold.FromFalseAlarm(pulses, FalseAlarms);
                Assert.Equal(0.5, DetectionProbability.Detect((FluctuationCase)fluctuation, pulses, Decibels.ToRatio(look.NeededDb), threshold), 1e-9);
                Assert.Equal(wantedPd, DetectionProbability.Detect((FluctuationCase)fluctuation, pulses, Decibels.ToRatio(look.NeededForWantedDb), threshold), 1e-9);
            }
        }
    }

    [Fact]
    public void At_the_even_odds_range_the_free_space_SNR_is_what_is_needed()
    {
        var look = new LookExplainer(Scenario).Explain(Row(5, -2, 0, 0, LossReason.Range, pulses: 9));
        Assert.Equal(look.NeededDb, look.Row.RadarDb + look.Row.RcsDb - 40 * Math.Log10(look.EvenOddsRangeM), 1e-9);
        Assert.Equal(look.NeededForWantedDb, look.Row.RadarDb + look.Row.RcsDb - 40 * Math.Log10(look.WantedRangeM), 1e-9);
        Assert.True(look.WantedRangeM < look.EvenOddsRangeM);
    }

    [Fact]
    public void A_near_target_has_range_in_hand_against_the_beam()
    {
        var look = new LookExplainer(Scenario).Explain(Row(20, -30, 0, 0, LossReason.AzimuthBeam));
        Assert.Equal(LookTerm.AzimuthBeam, look.Costliest.Term);
        Assert.Equal(PassOutcome.AzimuthBeam, look.Outcome);
        Assert.Equal("missed: 12.8 dB below need: 30.0 dB off the beam's azimuth, 17.2 dB in hand by range", look.Reason);
    }

    [Fact]
    public void What_is_wholly_eclipsed_is_said_so()
    {
        var look = new LookExplainer(Scenario).Explain(Row(0, -1, 0, double.NegativeInfinity, LossReason.Eclipsing));
        Assert.Equal(double.NegativeInfinity, look.MarginDb);
        Assert.Equal(LookTerm.Eclipsing, look.Costliest.Term);
        Assert.Equal(PassOutcome.Eclipsing, look.Outcome);
        Assert.Equal("missed: the whole echo came while the receiver was shut", look.Reason);
    }

    [Fact]
    public void Chance_is_told_by_the_drawn_echo_and_where_there_is_none_by_the_statistic()
    {
        var explainer = new LookExplainer(Scenario);
        var row = Row(20, 0, 0, 0, LossReason.Fluctuation) with { Pd = 0.83, FluctuationDb = -6.1, StatisticDb = -1.2 };
        Assert.Equal("missed by chance: Pd was 0.83, the drawn echo was 6.1 dB below its mean", explainer.Explain(row).Reason);
        Assert.Equal(PassOutcome.Chance, explainer.Explain(row).Outcome);
        Assert.Equal("missed by chance: Pd was 0.83, the drawn signal and noise were 1.2 dB below the threshold", explainer.Explain(row with { FluctuationDb = null }).Reason);
        Assert.Equal("missed by chance: Pd was 0.83, the drawn signal and noise were 1.2 dB below the threshold", explainer.Explain(row with { FluctuationDb = 0.4 }).Reason);
    }

    [Fact]
    public void A_detection_says_what_it_had_to_spare_or_what_chance_gave_it()
    {
        var explainer = new LookExplainer(Scenario);
        Assert.Equal("detected with 17.2 dB to spare", explainer.Explain(Row(20, 0, 0, 0, LossReason.None)).Reason);
        Assert.Equal(
            "detected by chance: 2.8 dB below need, Pd was 0.12, the drawn echo was 4.0 dB above its mean",
            explainer.Explain(Row(0, 0, 0, 0, LossReason.None) with { Pd = 0.12, FluctuationDb = 4, StatisticDb = 0.3 }).Reason);
        Assert.Equal(
            "detected by chance: 2.8 dB below need, Pd was 0.12, the drawn signal and noise were 0.3 dB over the threshold",
            explainer.Explain(Row(0, 0, 0, 0, LossReason.None) with { Pd = 0.12, FluctuationDb = -4, StatisticDb = 0.3 }).Reason);
    }

    [Fact]
    public void A_shared_cell_names_the_others_when_they_are_known()
    {
        var explainer = new LookExplainer(Scenario);
        var lost = Row(20, 0, 0, 0, LossReason.SharedCell) with { Pd = 0.83, TargetsInCell = 2, FluctuationDb = 1 };
        Assert.Equal("cancelled by tug in the same cell: Pd alone was 0.83", explainer.Explain(lost, ["tug"]).Reason);
        Assert.Equal("cancelled by another target in the same cell: Pd alone was 0.83", explainer.Explain(lost).Reason);
        Assert.Equal(
            "missed in one cell with tug: Pd alone was 0.83, the drawn echo was 18.0 dB below its mean",
            explainer.Explain(lost with { FluctuationDb = -18 }, ["tug"]).Reason);
        Assert.Equal(
            "detected with 17.2 dB to spare, in one cell with tug and barge",
            explainer.Explain(Row(20, 0, 0, 0, LossReason.None) with { TargetsInCell = 3 }, ["tug", "barge"]).Reason);
        Assert.Equal(
            "detected together with tug in the same cell: 2.8 dB below need by itself, Pd 0.01",
            explainer.Explain(Row(0, 0, 0, 0, LossReason.None) with { TargetsInCell = 2, Pd = 0.01 }, ["tug"]).Reason);
    }

    [Fact]
    public void On_the_side_lobe_floor_the_elevation_bears_the_loss_when_it_alone_would_hold_the_look_there()
    {
        // Floor 1e-4 both ways: -80 dB. A Gaussian beam of 20° is at its floor from 20°·√(40 / 12.04) = 36.5° on.
        var explainer = new LookExplainer(Scenario);
        var row = Row(60, -80, 0, 0, LossReason.AzimuthBeam);
        var overhead = explainer.Explain(row with { ElevationDeg = 40 });
        Assert.Equal((0, 80), (overhead.LossDb(LookTerm.AzimuthBeam), overhead.LossDb(LookTerm.ElevationBeam)));
        Assert.Equal(PassOutcome.ElevationBeam, overhead.Outcome);
        Assert.Equal("missed: 22.8 dB below need: 80.0 dB off the beam's elevation, 57.2 dB in hand by range", overhead.Reason);
        foreach (var elsewhere in new[] { row with { ElevationDeg = 33 }, row with { ElevationDeg = 40, AzimuthBeamDb = -79, SnrDb = row.SnrDb + 1 } })
        {
            var look = explainer.Explain(elsewhere);
            Assert.Equal(-elsewhere.AzimuthBeamDb, look.LossDb(LookTerm.AzimuthBeam));
            Assert.Equal(PassOutcome.AzimuthBeam, look.Outcome);
        }
    }

    [Fact]
    public void A_target_that_the_scenario_does_not_have_is_an_error()
    {
        var fault = Assert.Throws<PictureException>(() => new LookExplainer(Scenario).Explain(Row(0, 0, 0, 0, LossReason.None) with { Target = "ghost" }));
        Assert.Contains("ghost", fault.Message, StringComparison.Ordinal);
    }

    private static Scenario WithCase(int fluctuation)
    {
        var scenario = SceneMaking.Scenario(1, 60);
        return scenario with { Targets = [scenario.Targets[0] with { FluctuationCase = fluctuation }] };
    }

    /// <summary>A look at 10 km by a radar of 170 dB.</summary>
    private static LookRow Row(double rcsDb, double azimuthDb, double elevationDb, double eclipsingDb, LossReason lostTo, int pulses = 1) =>
        SceneMaking.LookRow(Scenario.Targets[0].Id, 3, 8, 170 + rcsDb - 160 + azimuthDb + elevationDb + eclipsingDb, lostTo == LossReason.None, lostTo) with
        {
            Pulses = pulses,
            RadarDb = 170,
            RcsDb = rcsDb,
            SpreadingDb = -160,
            AzimuthBeamDb = azimuthDb,
            ElevationBeamDb = elevationDb,
            EclipsingDb = eclipsingDb,
        };
}
