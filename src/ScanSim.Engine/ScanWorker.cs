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
        FindLooks(scan, result);
        ResolveCells(scan, result);
        AddFalseAlarms(scan, result);
        lookRows.Add(looks, order.AsSpan(0, count), result.Looks);
        result.LookCount = count;
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
                    TryDwell(index, target, setup.Timeline.DwellAt(scan, dwell));
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

        var state = target.Track.At(dwell.MiddleS);
        if (!setup.Model.TryLook(target.RcsM2, state, dwell, pulseSnr, out var look))
        {
            return;
        }

        if (count == looks.Length)
        {
            Array.Resize(ref looks, 2 * count);
            Array.Resize(ref keys, 2 * count);
            Array.Resize(ref order, 2 * count);
        }

        ref var found = ref looks[count++];
        found = new FoundLook { Look = look, Dwell = dwell, TargetIndex = targetIndex, Cell = (int)(look.ApparentRangeM / setup.CellM), TargetsInCell = 1 };
        resolver.DrawAlone(ref found, pulseSnr.AsSpan(0, dwell.Pulses));
    }

    /// <summary>Puts the looks in order of dwell, cell and target, and joins those that share a cell.</summary>
    private void ResolveCells(int scan, ScanResult result)
    {
        var first = setup.Timeline.FirstDwell(scan);
        for (var i = 0; i < count; i++)
        {
            keys[i] = SortKey(looks[i].Dwell.Index - first, looks[i].Cell, looks[i].TargetIndex);
            order[i] = i;
        }

        Array.Sort(keys, order, 0, count);
        for (var from = 0; from < count;)
        {
            var to = from + 1;
            while (to < count && keys[to] >> RunLimits.TargetBits == keys[from] >> RunLimits.TargetBits)
            {
                to++;
            }

            resolver.Resolve(looks, order.AsSpan(from, to - from), result.Hits);
            from = to;
        }
    }

    private void AddFalseAlarms(int scan, ScanResult result)
    {
        var hits = result.Hits;
        var targetHits = hits.Count;
        var end = setup.Timeline.FirstDwell(scan + 1);
        for (var index = setup.Timeline.FirstDwell(scan); index < end; index++)
        {
            var dwell = setup.Timeline.DwellAt(scan, index);
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

    /// <summary>Room is kept by <see cref="RunLimits"/>.</summary>
    private static ulong SortKey(long dwellInScan, int cell, int target) =>
        ((ulong)dwellInScan << (RunLimits.CellBits + RunLimits.TargetBits)) | ((ulong)cell << RunLimits.TargetBits) | (uint)target;
}
