namespace ScanSim.Engine;

/// <summary>
/// Finds the dwells of a scan in which a target can possibly give a look, without trying them all. Every step is an upper bound, so
/// that the result is the same as trying each dwell.
/// </summary>
/// <remarks>
/// Within a span of time the target stays within (greatest speed × half the span) of its place at the middle. That bounds range and
/// azimuth, hence how far off the beam may point; the beam is there during a shorter span, and so on until the span shrinks no more.
/// </remarks>
internal sealed class LookFinder(LookModel model, ScanTimeline timeline)
{
    private const int MostSteps = 6;

    /// <summary>Covers the rounding of times (10 h in a double: 7e-12 s) and the growth of slant range over path length on the effective earth.</summary>
    private const double MarginS = 1e-9;
    private const double ReachMargin = 1.02;
    private const double ReachMarginM = 1e-3;

    private readonly int mostPulses = timeline.Grid.Pulses.Max();
    private readonly double longestHalfDwellS = 0.5 * timeline.Grid.Pulses.Zip(timeline.Grid.PriPs, (n, priPs) => n * priPs).Max() / DwellGrid.PicosecondsPerSecond;

    /// <summary>Appends the ranges, in rising order and without overlap, to an emptied list.</summary>
    public void Find(RunTarget target, int scan, List<DwellRange> ranges)
    {
        ranges.Clear();
        var scanSpan = new TimeSpanS(timeline.ScanStartS(scan), timeline.ScanEndS(scan));
        Narrow(target, scan, scanSpan.Within(target.Life), MostSteps, ranges);
        if (ranges.Count > 1)
        {
            Merge(ranges);
        }
    }

    /// <summary>Appends the one range of all the scan's dwells during the target's life: the plain way, kept as the oracle of the quick one.</summary>
    public void TakeAll(RunTarget target, int scan, List<DwellRange> ranges)
    {
        ranges.Clear();
        Add(scan, target.Life.Within(new TimeSpanS(timeline.ScanStartS(scan), timeline.ScanEndS(scan))), ranges);
    }

    private static void Merge(List<DwellRange> ranges)
    {
        ranges.Sort(static (a, b) => a.First.CompareTo(b.First));
        var kept = 0;
        for (var i = 1; i < ranges.Count; i++)
        {
            if (ranges[i].First <= ranges[kept].End)
            {
                ranges[kept] = new DwellRange(ranges[kept].First, Math.Max(ranges[kept].End, ranges[i].End));
            }
            else
            {
                ranges[++kept] = ranges[i];
            }
        }

        ranges.RemoveRange(kept + 1, ranges.Count - kept - 1);
    }

    private void Narrow(RunTarget target, int scan, TimeSpanS span, int stepsLeft, List<DwellRange> ranges)
    {
        if (span.ToS < span.FromS)
        {
            return;
        }

        Span<TimeSpanS> near = stackalloc TimeSpanS[3];
        var count = SpansOf(target, scan, span, near);
        for (var i = 0; i < count; i++)
        {
            var part = near[i].Within(span);
            if (stepsLeft > 0 && part.HalfS < 0.5 * span.HalfS)
            {
                Narrow(target, scan, part, stepsLeft - 1, ranges);
            }
            else
            {
                Add(scan, part, ranges);
            }
        }
    }

    private int SpansOf(RunTarget target, int scan, TimeSpanS span, Span<TimeSpanS> near)
    {
        var sight = model.SightOf(target.Track.At(span.MiddleS));
        var reachM = target.Track.MaximumSpeedMps * span.HalfS * ReachMargin + ReachMarginM;
        var highestRad = Math.Abs(sight.ElevationRad) + (sight.RangeM > reachM ? Math.Asin(reachM / sight.RangeM) : Math.PI);
        var widthRad = model.WidestOffsetRad(target.RcsM2, Math.Max(sight.RangeM - reachM, ReachMarginM), highestRad, mostPulses);
        if (widthRad < 0)
        {
            return 0;
        }

        if (sight.GroundM <= reachM)
        {
            near[0] = span;
            return 1;
        }

        var fastestAzimuthRadPerS = target.Track.MaximumSpeedMps * ReachMargin / (sight.GroundM - reachM);
        widthRad += Math.Asin(reachM / sight.GroundM) + longestHalfDwellS * (timeline.BeamSpeedRadPerS + fastestAzimuthRadPerS);
        return timeline.SpansNear(scan, sight.AzimuthRad, widthRad, near);
    }

    private void Add(int scan, TimeSpanS span, List<DwellRange> ranges)
    {
        if (span.ToS < span.FromS)
        {
            return;
        }

        var range = new DwellRange(
            timeline.FirstDwellAtOrAfter(scan, span.FromS - MarginS),
            timeline.FirstDwellAtOrAfter(scan, span.ToS + MarginS));
        if (range.First < range.End)
        {
            ranges.Add(range);
        }
    }
}
