using System.Collections.Immutable;
using ScanSim.Recordings;

namespace ScanSim.Display.Explaining;

/// <summary>Which targets shared a range cell: looks of one cell have the same dwell and the same drawn statistic, to the bit.</summary>
internal sealed class CellMates
{
    private readonly Dictionary<(long Dwell, double StatisticDb), List<string>> cells = [];

    public void Add(in LookRow row)
    {
        if (row.TargetsInCell < 2)
        {
            return;
        }

        var key = (row.Dwell, row.StatisticDb);
        if (!cells.TryGetValue(key, out var ids))
        {
            cells[key] = ids = [];
        }

        ids.Add(row.Target);
    }

    /// <summary>The others in a look's cell that were added.</summary>
    public ImmutableArray<string> Of(in LookRow row)
    {
        var own = row.Target;
        return row.TargetsInCell > 1 && cells.TryGetValue((row.Dwell, row.StatisticDb), out var ids)
            ? [.. ids.Where(id => !string.Equals(id, own, StringComparison.Ordinal))]
            : [];
    }
}
