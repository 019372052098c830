using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>Computes one scan at a time: looks, cells, hits, false alarms, truth. One worker per thread; its buffers are its own.</summary>
/// <remarks>A scan depends on the setup and its number only, so any worker may compute any scan in any order.</remarks>
internal sealed class ScanWorker
{
    private readonly RunSetup setup;
    private readonly LookFinder finder;
    private readonly CellResolver resolver;
    private readonly LookRows lookRows;
    private readonly List<DwellRange> ranges = [];
    private readonly double[] pulseSnr;
    private FoundLook[] looks = new FoundLook[256];
    private ulong[] keys = new ulong[256];
    private int[] order = new int[256];
    private int[] dwellEnds = [];
    private Dwell[] dwells = [];
    private long firstDwell;
    private int dwellCount;
    private int count;

    public ScanWorker(RunSetup setup)
    {
        this.setup = setup;
        finder = new LookFinder(setup.Model, setup.Timeline);
        resolver = new CellResolver(setup);
        lookRows = new LookRows(setup);
        pulseSnr = new double[setup.Timeline.Grid.Pulses.Max()];
    }

    public void Compute(int scan, ScanResult result)
    {
        result.Begin(scan);
        ListDwells(scan);
        FindLooks(scan, result);
        ResolveCells(result);
        AddFalseAlarms(result);
        lookRows.Add(looks, order.AsSpan(0, count), dwells, result.Looks);
        result.LookCount = count;
    }

    /// <summary>The scan's dwells, worked out once for all targets.</summary>
    private void ListDwells(int scan)
    {
        firstDwell = setup.Timeline.FirstDwell(scan);
        dwellCount = (int)(setup.Timeline.FirstDwell(scan + 1) - firstDwell);
        if (dwells.Length < dwellCount)
        {
            dwells = new Dwell[dwellCount];
            dwellEnds = new int[dwellCount];
        }

        for (var i = 0; i < dwellCount; i++)
        {
            dwells[i] = setup.Timeline.DwellAt(scan, firstDwell + i);
        }
    }

    private void FindLooks(int scan, ScanResult result)
    {
        count = 0;
        for (var index = 0; index < setup.Targets.Length; index++)
        {
            var target = setup.Targets[index];
            TruthRows.Add(setup, target, scan, result.Truth);
            if (setup.Options.EveryDwell)
            {
                finder.TakeAll(target, scan, ranges);
            }
            else
            {
                finder.Find(target, scan, ranges);
            }

            foreach (var range in ranges)
            {
                for (var dwell = range.First; dwell < range.End; dwell++)
                {
                    TryDwell(index, target, dwells[dwell - firstDwell]);
                }
            }
        }
    }

    private void TryDwell(int targetIndex, RunTarget target, in Dwell dwell)
    {
        if (dwell.MiddleS < target.Life.FromS || dwell.MiddleS > target.Life.ToS || setup.Timeline.IsBlanked(dwell.BeamAzimuthRad))
        {
            return;
        }

        if (count == looks.Length)
        {
            Array.Resize(ref looks, 2 * count);
            Array.Resize(ref keys, 2 * count);
            Array.Resize(ref order, 2 * count);
        }

        ref var found = ref looks[count];
        if (!setup.Model.TryLook(target.RcsM2, target.Track.At(dwell.MiddleS), dwell, pulseSnr, out found.Look))
        {
            return;
        }

        count++;
        found.DwellInScan = (int)(dwell.Index - firstDwell);
        found.TargetIndex = targetIndex;
        found.Cell = (int)(found.Look.ApparentRangeM / setup.CellM);
        found.TargetsInCell = 1;
        resolver.DrawAlone(ref found, dwell, pulseSnr.AsSpan(0, dwell.Pulses));
    }

    /// <summary>
    /// Puts the looks in order of dwell, cell and target, joins those that share a cell, and collects the hits. By counting into dwells,
    /// then by sorting keys within each; a key holds all that most looks need, so that their memory is not touched again.
    /// </summary>
    private void ResolveCells(ScanResult result)
    {
        var ends = dwellEnds.AsSpan(0, dwellCount);
        ends.Clear();
        for (var i = 0; i < count; i++)
        {
            ends[looks[i].DwellInScan]++;
        }

        for (var dwell = 1; dwell < dwellCount; dwell++)
        {
            ends[dwell] += ends[dwell - 1];
        }

        for (var i = count - 1; i >= 0; i--)
        {
            keys[--ends[looks[i].DwellInScan]] = CellKey.Of(looks[i].Cell, i, looks[i].Detected);
        }

        // The ends have become starts.
        for (var dwell = 0; dwell < dwellCount; dwell++)
        {
            ResolveDwell(dwells[dwell], ends[dwell], dwell + 1 < dwellCount ? ends[dwell + 1] : count, result.Hits);
        }
    }

    private void ResolveDwell(in Dwell dwell, int start, int end, List<Hit> hits)
    {
        keys.AsSpan(start, end - start).Sort();
        for (var from = start; from < end;)
        {
            var to = from;
            do
            {
                order[to] = CellKey.Index(keys[to]);
                to++;
            }
            while (to < end && CellKey.SameCell(keys[to], keys[from]));

            if (to - from > 1 || CellKey.Detected(keys[from]))
            {
                resolver.Resolve(looks, order.AsSpan(from, to - from), dwell, hits);
            }

            from = to;
        }
    }

    private void AddFalseAlarms(ScanResult result)
    {
        var hits = result.Hits;
        var targetHits = hits.Count;
        foreach (ref readonly var dwell in dwells.AsSpan(0, dwellCount))
        {
            if (!setup.Timeline.IsBlanked(dwell.BeamAzimuthRad))
            {
                FalseAlarms.Draw(setup, dwell, hits);
            }
        }

        if (hits.Count > targetHits)
        {
            HitOrder.SortAndKeepOnePerCell(hits);
        }

        result.FalseHitCount = 0;
        foreach (var hit in hits)
        {
            result.FalseHitCount += hit.Kind == EchoKind.Noise ? 1 : 0;
        }
    }
}
