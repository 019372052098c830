using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Joins neighbouring hits to plots while the beam goes round. Fed scan by scan, in order; plots come out in order of time.</summary>
internal sealed class PlotExtractor
{
    private readonly PlotRules rules;
    private readonly long mostDwells;
    private readonly bool closesWithScan;
    private readonly PlotMaker maker;
    private readonly List<OpenPlot> open = [];
    private readonly Stack<OpenPlot> spare = [];
    private readonly List<PlotRow> waiting = [];

    public PlotExtractor(RunSetup setup)
    {
        rules = setup.Scenario.Radar.Plots;
        mostDwells = Math.Max(1, (long)Math.Floor(rules.MaximumWidthRad / setup.Timeline.DwellStepRad));
        closesWithScan = setup.Timeline is not RotationTimeline;
        maker = new PlotMaker(setup);
    }

    /// <summary>
    /// Takes the hits of a scan and moves the finished plots that no unfinished one can precede to <paramref name="plots"/>. Returns the
    /// time up to which the plots are complete.
    /// </summary>
    public double Take(List<Hit> hits, long nextScansFirstDwell, double scanEndS, List<PlotRow> plots)
    {
        foreach (var hit in hits)
        {
            CloseBefore(hit.Dwell);
            Place(hit);
        }

        CloseBefore(closesWithScan ? long.MaxValue : nextScansFirstDwell);
        var completeS = scanEndS;
        foreach (var plot in open)
        {
            completeS = Math.Min(completeS, plot.Hits[0].TimeS);
        }

        Release(completeS, plots);
        return completeS;
    }

    /// <summary>Closes what is open at the end of the run.</summary>
    public void Finish(List<PlotRow> plots)
    {
        CloseBefore(long.MaxValue);
        Release(double.PositiveInfinity, plots);
    }

    private void Place(in Hit hit)
    {
        OpenPlot? home = null;
        for (var i = 0; i < open.Count; i++)
        {
            var plot = open[i];
            if (hit.Dwell - plot.FirstDwell > mostDwells || !plot.Touches(hit, rules.RangeGapCells, rules.AzimuthGapDwells))
            {
                continue;
            }

            if (home is null)
            {
                home = plot;
            }
            else
            {
                home.Absorb(plot);
                Discard(i--);
            }
        }

        if (home is null)
        {
            home = spare.Count > 0 ? spare.Pop() : new OpenPlot();
            open.Add(home);
        }

        home.Hits.Add(hit);
    }

    private void CloseBefore(long dwell)
    {
        for (var i = 0; i < open.Count; i++)
        {
            if (dwell - open[i].LastDwell > rules.AzimuthGapDwells + 1)
            {
                if (open[i].Hits.Count >= rules.MinimumHits)
                {
                    waiting.Add(maker.Make(open[i].Hits));
                }

                Discard(i--);
            }
        }
    }

    private void Discard(int index)
    {
        open[index].Hits.Clear();
        spare.Push(open[index]);
        open.RemoveAt(index);
    }

    private void Release(double beforeS, List<PlotRow> plots)
    {
        waiting.Sort(static (a, b) => Compare(a, b));
        var ready = 0;
        while (ready < waiting.Count && waiting[ready].TimeS < beforeS)
        {
            plots.Add(waiting[ready++]);
        }

        waiting.RemoveRange(0, ready);
    }

    private static int Compare(in PlotRow a, in PlotRow b)
    {
        var byTime = a.TimeS.CompareTo(b.TimeS);
        return byTime != 0 ? byTime : a.RangeM.CompareTo(b.RangeM);
    }
}
