using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>Order of hits within a scan: by dwell, then by range cell; a cell reports once, a target's echo before noise.</summary>
internal static class HitOrder
{
    public static void SortAndKeepOnePerCell(List<Hit> hits)
    {
        hits.Sort(static (a, b) => Compare(a, b));
        var kept = 0;
        for (var i = 1; i < hits.Count; i++)
        {
            if (hits[i].Dwell != hits[kept].Dwell || hits[i].Cell != hits[kept].Cell)
            {
                hits[++kept] = hits[i];
            }
        }

        hits.RemoveRange(kept + 1, hits.Count - kept - 1);
    }

    /// <summary>A total order but for two false alarms of one cell with the same range, which are alike.</summary>
    private static int Compare(in Hit a, in Hit b)
    {
        var byDwell = a.Dwell.CompareTo(b.Dwell);
        if (byDwell != 0)
        {
            return byDwell;
        }

        var byCell = a.Cell.CompareTo(b.Cell);
        if (byCell != 0)
        {
            return byCell;
        }

        var byKind = a.Kind.CompareTo(b.Kind);
        return byKind != 0 ? byKind : a.RangeM.CompareTo(b.RangeM);
    }
}
