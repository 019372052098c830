using System.Collections.Immutable;

namespace ScanSim.Display.Replay;

/// <summary>One target's row: its index in each recording, −1 where it is not in it.</summary>
internal readonly record struct ReplayRow(string Id, int Left, int Right)
{
    /// <summary>Each id once: in the first recording's order, then those that only the second has; sorted as asked, ties in that order.</summary>
    public static ImmutableArray<ReplayRow> Of(ImmutableArray<ReplayRecording> recordings, RowOrder order)
    {
        var left = recordings[0];
        var right = recordings.Length > 1 ? recordings[1] : null;
        var rows = left.Scene.Targets.Select((target, i) => new ReplayRow(target.Id, i, right?.IndexOf(target.Id) ?? -1)).ToList();
        if (right is not null)
        {
            rows.AddRange(right.Scene.Targets.Select((target, i) => new ReplayRow(target.Id, left.IndexOf(target.Id), i)).Where(row => row.Left < 0));
        }

        return order switch
        {
            RowOrder.Id => [.. rows.OrderBy(row => row.Id, StringComparer.Ordinal)],
            RowOrder.FirstDetection => [.. rows.OrderBy(row => Facts(row).Min(facts => facts.FirstDetectionS))],
            RowOrder.WorstGap => [.. rows.OrderByDescending(row => Facts(row).Max(facts => facts.WorstGapScans))],
            _ => [.. rows],
        };

        IEnumerable<TargetFacts> Facts(ReplayRow row)
        {
            if (row.Left >= 0)
            {
                yield return left.Facts[row.Left];
            }

            if (row.Right >= 0)
            {
                yield return right!.Facts[row.Right];
            }
        }
    }
}
