using System.Collections.Immutable;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display;

/// <summary>The rows of one target while a scene is gathered.</summary>
/// <param name="target">The target.</param>
/// <param name="reachS">A plot belongs to the pass that is no further away in time; echoes through side lobes belong to none.</param>
internal sealed class TargetGathering(Target target, double reachS)
{
    private readonly List<TruthMark> truth = [];
    private readonly Dictionary<int, LookMark> looks = [];
    private readonly List<double> plotTimesS = [];

    public void Add(in TruthRow row)
    {
        var (sin, cos) = Math.SinCos(row.AzimuthDeg * (Math.PI / 180));
        truth.Add(new TruthMark(
            row.TimeS, row.Scan, (float)(row.RangeM * sin), (float)(row.RangeM * cos), (float)row.EastMps, (float)row.NorthMps, row.View)
        {
            HeightM = (float)row.HeightM,
        });
    }

    /// <summary>Keeps one look a scan: the strongest detected one, or the strongest if none was detected.</summary>
    public void Add(in LookRow row)
    {
        var mark = new LookMark(row.TimeS, row.Scan, (float)row.SnrDb, OutcomeOf(row));
        if (!looks.TryGetValue(mark.Scan, out var known) || IsBetter(mark, known))
        {
            looks[mark.Scan] = mark;
        }
    }

    public void AddPlot(double timeS) => plotTimesS.Add(timeS);

    public SceneTarget Build(bool recordingHasLooks)
    {
        plotTimesS.Sort();
        var looksWithoutTruth = new HashSet<int>(looks.Keys);
        var marks = ImmutableArray.CreateBuilder<LookMark>(truth.Count);
        var inView = 0;
        var withPlot = 0;
        foreach (var t in truth)
        {
            var looked = looks.TryGetValue(t.Scan, out var look);
            looksWithoutTruth.Remove(t.Scan);
            marks.Add(looked ? look : new LookMark(t.TimeS, t.Scan, float.NaN, WithoutLook(t, recordingHasLooks)));
            if (t.View == TargetView.InView || looked)
            {
                inView++;
                withPlot += HasPlot(t.TimeS) ? 1 : 0;
            }
        }

        // A look in a scan whose truth row lies beyond the track's end, for instance.
        marks.AddRange(looksWithoutTruth.Select(scan => looks[scan]));
        marks.Sort(static (a, b) => a.TimeS.CompareTo(b.TimeS));
        return new SceneTarget
        {
            Id = target.Id,
            Class = target.Class,
            Truth = [.. truth],
            Looks = marks.DrainToImmutable(),
            ScansInView = inView,
            ScansWithPlot = withPlot,
        };
    }

    private bool HasPlot(double passS)
    {
        var index = plotTimesS.BinarySearch(passS - reachS);
        index = index < 0 ? ~index : index;
        return index < plotTimesS.Count && plotTimesS[index] <= passS + reachS;
    }

    private LookOutcome WithoutLook(in TruthMark mark, bool recordingHasLooks)
    {
        if (recordingHasLooks || mark.View != TargetView.InView)
        {
            return LookOutcome.NoLook;
        }

        return HasPlot(mark.TimeS) ? LookOutcome.Detected : LookOutcome.MissedUnrecorded;
    }

    private static bool IsBetter(in LookMark mark, in LookMark known)
    {
        var (isDetected, wasDetected) = (mark.Outcome == LookOutcome.Detected, known.Outcome == LookOutcome.Detected);
        return isDetected == wasDetected ? mark.SnrDb > known.SnrDb : isDetected;
    }

    private static LookOutcome OutcomeOf(in LookRow row) => (row.Detected, row.LostTo) switch
    {
        (true, _) => LookOutcome.Detected,
        (_, LossReason.AzimuthBeam or LossReason.ElevationBeam) => LookOutcome.MissedBeam,
        (_, LossReason.Fluctuation) => LookOutcome.MissedChance,
        (_, LossReason.Eclipsing or LossReason.SharedCell) => LookOutcome.MissedMasked,
        _ => LookOutcome.MissedRange,
    };
}
