using System.Collections.Immutable;
using ScanSim.Recordings;

namespace ScanSim.Display.Replay;

/// <summary>The selected target's looks with all their terms, one array for each recording, in order of time.</summary>
/// <param name="Id">Of the target; "" while nothing is selected.</param>
/// <param name="Looks">By recording; empty where it has none.</param>
/// <param name="IsWhole">Whether they are all; otherwise those around a time only.</param>
public sealed record SelectedLooks(string Id, ImmutableArray<ImmutableArray<LookRow>> Looks, bool IsWhole)
{
    public static readonly SelectedLooks Nothing = new("", [[], []], true);

    /// <summary>The strongest look of the last pass at or before a time: the one that a plot would come of.</summary>
    public LookRow? At(int recording, double timeS, double periodS)
    {
        var looks = Looks[recording];
        LookRow? best = null;
        for (var i = LastUpTo(looks, timeS); i >= 0 && timeS - looks[i].TimeS <= periodS; i--)
        {
            if (best is { } known && known.Scan != looks[i].Scan)
            {
                break;
            }

            if (best is not { } other || (looks[i].Detected, looks[i].SnrDb).CompareTo((other.Detected, other.SnrDb)) > 0)
            {
                best = looks[i];
            }
        }

        return best;
    }

    public static int LastUpTo(ImmutableArray<LookRow> looks, double timeS)
    {
        var (low, high) = (0, looks.Length);
        while (low < high)
        {
            var middle = (low + high) >> 1;
            (low, high) = looks[middle].TimeS <= timeS ? (middle + 1, high) : (low, middle);
        }

        return low - 1;
    }
}
