using System.Collections.Immutable;
using ScanSim.Recordings;

namespace ScanSim.Display.Painting;

/// <summary>A target's true place between its truth rows.</summary>
internal static class TruthAtTime
{
    /// <summary>Index of the last row at or before a time; −1 before the first.</summary>
    public static int IndexAt(ImmutableArray<TruthMark> truth, double timeS)
    {
        var low = 0;
        var high = truth.Length;
        while (low < high)
        {
            var middle = (low + high) >> 1;
            if (truth[middle].TimeS <= timeS)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        return low - 1;
    }

    /// <summary>
    /// Between two rows in a straight line; for up to one scan beyond the first or the last row by its speed; otherwise the target is not there.
    /// </summary>
    public static TruthMark? At(ImmutableArray<TruthMark> truth, double timeS, double periodS)
    {
        if (truth.IsEmpty)
        {
            return null;
        }

        var index = IndexAt(truth, timeS);
        var near = truth[Math.Max(index, 0)];
        if (index >= 0 && index + 1 < truth.Length && truth[index + 1].Scan - near.Scan <= 2)
        {
            var next = truth[index + 1];
            var share = (float)((timeS - near.TimeS) / (next.TimeS - near.TimeS));
            return near with
            {
                EastM = near.EastM + share * (next.EastM - near.EastM),
                NorthM = near.NorthM + share * (next.NorthM - near.NorthM),
            };
        }

        var sinceS = timeS - near.TimeS;
        return Math.Abs(sinceS) > periodS
            ? null
            : near with { EastM = near.EastM + (float)sinceS * near.EastMps, NorthM = near.NorthM + (float)sinceS * near.NorthMps };
    }
}
