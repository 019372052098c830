using System.Collections.Immutable;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display;

/// <summary>The rows of one target while a scene is gathered.</summary>
/// <param name="target">The target.</param>
/// <param name="scans">Rows expected of each table: exact room saves copies of everything.</param>
/// <param name="reachS">A plot belongs to the pass that is no further away in time; echoes through side lobes belong to none.</param>
internal sealed class TargetGathering(Target target, double reachS, int scans)
{
    private readonly ImmutableArray<TruthMark>.Builder truth = ImmutableArray.CreateBuilder<TruthMark>(scans);
    private readonly List<LookMark> looks = new(scans);
    private readonly List<double> plotTimesS = [];

    public void Add(in TruthSummary row)
    {
        var (sin, cos) = Math.SinCos(row.AzimuthDeg * (Math.PI / 180));
        truth.Add(new TruthMark(
            row.TimeS, row.Scan, (float)(row.RangeM * sin), (float)(row.RangeM * cos), (float)row.EastMps, (float)row.NorthMps, row.View)
        {
            HeightM = (float)row.HeightM,
        });
    }

    /// <summary>Keeps one look a scan: the strongest detected one, or the strongest if none was detected.</summary>
    public void Add(in LookSummary row)
    {
        var mark = new LookMark(row.TimeS, row.Scan, (float)row.SnrDb, OutcomeOf(row));
        var index = IndexOfScan(mark.Scan);
        if (index < 0)
        {
            looks.Insert(~index, mark);
        }
        else if (IsBetter(mark, looks[index]))
        {
            looks[index] = mark;
        }
    }

    public void AddPlot(double timeS) => plotTimesS.Add(timeS);

    public SceneTarget Build(bool recordingHasLooks)
    {
        plotTimesS.Sort();
        var hasTruth = new bool[looks.Count];
        var marks = ImmutableArray.CreateBuilder<LookMark>(truth.Count);
        var inView = 0;
        var withPlot = 0;
        foreach (var t in truth)
        {
            var index = IndexOfScan(t.Scan);
            var looked = index >= 0;
            if (looked)
            {
                hasTruth[index] = true;
            }

            marks.Add(looked ? looks[index] : new LookMark(t.TimeS, t.Scan, float.NaN, WithoutLook(t, recordingHasLooks)));
            if (t.View == TargetView.InView)
            {
                inView++;
                withPlot += HasPlot(t.TimeS) ? 1 : 0;
            }
        }

        // A look in a scan whose truth row lies beyond the track's end, for instance.
        marks.AddRange(looks.Where((_, i) => !hasTruth[i]));
        marks.Sort(static (a, b) => a.TimeS.CompareTo(b.TimeS));
        return new SceneTarget
        {
            Id = target.Id,
            Class = target.Class,
            Truth = truth.ToImmutable(),
            Looks = marks.DrainToImmutable(),
            ScansInView = inView,
            ScansWithPlot = withPlot,
        };
    }

    /// <summary>Place of a scan's look among the looks, which are in order of scans; the complement of where it would stand if there is none.</summary>
    private int IndexOfScan(int scan)
    {
        // Rows come in order of time: it is the last look or a later one.
        if (looks.Count == 0 || looks[^1].Scan < scan)
        {
            return ~looks.Count;
        }

        var (low, high) = (0, looks.Count - 1);
        if (looks[high].Scan == scan)
        {
            return high;
        }

        while (low <= high)
        {
            var middle = (low + high) >> 1;
            if (looks[middle].Scan == scan)
            {
                return middle;
            }

            (low, high) = looks[middle].Scan < scan ? (middle + 1, high) : (low, middle - 1);
        }

        return ~low;
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

    private static LookOutcome OutcomeOf(in LookSummary row) => (row.Detected, row.LostTo) switch
    {
        (true, _) => LookOutcome.Detected,
        (_, LossReason.AzimuthBeam or LossReason.ElevationBeam) => LookOutcome.MissedBeam,
        (_, LossReason.Fluctuation) => LookOutcome.MissedChance,
        (_, LossReason.Eclipsing or LossReason.SharedCell) => LookOutcome.MissedMasked,
        _ => LookOutcome.MissedRange,
    };
}
