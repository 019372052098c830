using System.Collections.Immutable;
using ScanSim.Physics;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Explaining;

/// <summary>Reasons about the looks of one scenario. Required SNRs are kept once computed: for one thread at a time.</summary>
public sealed class LookExplainer
{
    public const double UsualPd = 0.9;

    /// <summary>Signal, summed over the pulses, to the noise of one pulse, below which a run computes no look (docs/engine.md).</summary>
    public const double SummedSnrFloorDb = -20;

    private const double EvenOdds = 0.5;

    private readonly Scenario scenario;
    private readonly double wantedPd;
    private readonly RangeUnit unit;
    private readonly Dictionary<string, Target> targets;
    private readonly ElevationCut elevationCut;
    private readonly Dictionary<(FluctuationCase Case, int Pulses), (double EvenDb, double WantedDb)> needs = [];

    /// <summary>Begins to reason about one scenario.</summary>
    /// <param name="scenario">The recording's.</param>
    /// <param name="wantedPd">Above the false-alarm probability and below 1; besides even odds, which the margin is counted from.</param>
    /// <param name="unit">Of ranges in words.</param>
    public LookExplainer(Scenario scenario, double wantedPd = UsualPd, RangeUnit unit = RangeUnit.Kilometre)
    {
        this.scenario = scenario;
        this.wantedPd = wantedPd;
        this.unit = unit;
        elevationCut = new ElevationCut(scenario.Radar.Antenna);
        targets = scenario.Targets.ToDictionary(t => t.Id, StringComparer.Ordinal);
    }

    public LookExplanation Explain(in LookRow row, ImmutableArray<string> cellMates = default)
    {
        var mates = cellMates.IsDefault ? [] : cellMates;
        var (evenDb, forWantedDb) = Needs(row);
        var freeSpaceDb = row.RadarDb + row.RcsDb + row.SpreadingDb;
        var beamDb = row.AzimuthBeamDb + row.ElevationBeamDb;
        var byElevation = elevationCut.HoldsAtFloor(row.ElevationDeg, beamDb);
        ImmutableArray<TermLoss> losses =
        [
            new(LookTerm.Range, evenDb - freeSpaceDb),
            new(LookTerm.AzimuthBeam, byElevation ? 0 : -row.AzimuthBeamDb),
            new(LookTerm.ElevationBeam, byElevation ? -beamDb : -row.ElevationBeamDb),
            new(LookTerm.Eclipsing, -row.EclipsingDb),
        ];
        return new LookExplanation
        {
            Row = row,
            CellMates = mates,
            FreeSpaceSnrDb = freeSpaceDb,
            NeededDb = evenDb,
            WantedPd = wantedPd,
            NeededForWantedDb = forWantedDb,
            EvenOddsRangeM = RangeAtM(row, evenDb),
            WantedRangeM = RangeAtM(row, forWantedDb),
            Losses = losses,
            Outcome = byElevation && row.LostTo == LossReason.AzimuthBeam ? PassOutcome.ElevationBeam : OutcomeOf(row),
            Reason = LookWords.Of(row, row.SnrDb - evenDb, losses, mates),
        };
    }

    /// <summary>Why a scan has no look, from where the target truly was.</summary>
    public NoLookExplanation Explain(in TruthRow row) =>
        new NoLookReasons(scenario, unit).Explain(row, TargetOf(row.Target));

    private static PassOutcome OutcomeOf(in LookRow row) => row.LostTo switch
    {
        LossReason.None => PassOutcome.Seen,
        LossReason.Range => PassOutcome.Range,
        LossReason.AzimuthBeam => PassOutcome.AzimuthBeam,
        LossReason.ElevationBeam => PassOutcome.ElevationBeam,
        LossReason.Eclipsing => PassOutcome.Eclipsing,
        LossReason.Fluctuation => PassOutcome.Chance,
        _ => PassOutcome.SharedCell,
    };

    /// <summary>Where radar + RCS − 40 lg R is the SNR needed.</summary>
    private static double RangeAtM(in LookRow row, double neededDb) =>
        Math.Sqrt(Math.Sqrt(Decibels.ToRatio(row.RadarDb + row.RcsDb - neededDb)));

    private (double EvenDb, double WantedDb) Needs(in LookRow row)
    {
        var key = ((FluctuationCase)TargetOf(row.Target).FluctuationCase, row.Pulses);
        if (!needs.TryGetValue(key, out var found))
        {
            var falseAlarms = scenario.Radar.Processing.FalseAlarmProbability;
            found = (
                Decibels.FromRatio(RequiredSnr.Ratio(key.Item1, key.Pulses, falseAlarms, EvenOdds)),
                Decibels.FromRatio(RequiredSnr.Ratio(key.Item1, key.Pulses, falseAlarms, wantedPd)));
            needs[key] = found;
        }

        return found;
    }

    private Target TargetOf(string id) => targets.TryGetValue(id, out var target)
        ? target
        : throw new PictureException($"The recording names target '{id}', which its scenario '{scenario.Name}' does not have.");
}
