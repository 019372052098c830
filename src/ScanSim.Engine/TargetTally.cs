using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>What a run gave for one target, counted pass by pass of the beam over it.</summary>
/// <remarks>
/// A plot belongs to a pass when it is no further from it in time than half the widest plot; echoes through side lobes belong to none.
/// The last few passes stay open, because a plot may come out before or after the truth of its pass.
/// </remarks>
public sealed class TargetTally
{
    private const int OpenPasses = 3;

    private readonly double reachS;
    private readonly List<Pass> open = [];
    private readonly List<PlotRow> early = [];
    private double? lastPlotS;
    private double longestGapS;
    private double lastPassS;

    internal TargetTally(string id, double reachS)
    {
        Id = id;
        this.reachS = reachS;
    }

    public string Id { get; }

    /// <summary>Scans in which the beam passed the target while it was in view.</summary>
    public int ScansInView { get; private set; }

    /// <summary>Scans in which the target existed.</summary>
    public int ScansAlive { get; private set; }

    /// <summary>Of the scans in view, those that gave a plot.</summary>
    public int ScansWithPlot { get; private set; }

    public double? FirstPlotS { get; private set; }

    public double? FirstPlotRangeM { get; private set; }

    /// <summary>Longest time between plots, counted from the first plot to the last pass.</summary>
    public double? LongestGapS => lastPlotS is { } lastS ? Math.Max(longestGapS, lastPassS - lastS) : null;

    /// <summary>Share of the scans in view that gave a plot (blip-scan ratio); null when it was never in view.</summary>
    public double? BlipScanRatio => ScansInView == 0 ? null : (double)ScansWithPlot / ScansInView;

    internal void AddTruth(in TruthRow row)
    {
        open.Add(new Pass(row.TimeS, row.View == TargetView.InView, null));
        foreach (var plot in early)
        {
            Match(plot);
        }

        early.RemoveAll(plot => plot.TimeS <= open[^1].TimeS + reachS);
        if (open.Count > OpenPasses)
        {
            Close(open[0]);
            open.RemoveAt(0);
        }
    }

    internal void AddPlot(in PlotRow row)
    {
        if (!Match(row) && (open.Count == 0 || row.TimeS > open[^1].TimeS))
        {
            early.Add(row);
        }
    }

    internal void Finish()
    {
        foreach (var pass in open)
        {
            Close(pass);
        }

        open.Clear();
        early.Clear();
    }

    private bool Match(in PlotRow plot)
    {
        for (var i = open.Count - 1; i >= 0; i--)
        {
            if (Math.Abs(plot.TimeS - open[i].TimeS) <= reachS)
            {
                open[i] = open[i] with { Plot = open[i].Plot ?? plot };
                return true;
            }
        }

        return false;
    }

    private void Close(Pass pass)
    {
        ScansAlive++;
        lastPassS = pass.TimeS;
        if (pass.InView)
        {
            ScansInView++;
            ScansWithPlot += pass.Plot is null ? 0 : 1;
        }

        if (pass.Plot is not { } plot)
        {
            return;
        }

        FirstPlotS ??= plot.TimeS;
        FirstPlotRangeM ??= plot.RangeM;
        longestGapS = lastPlotS is { } lastS ? Math.Max(longestGapS, plot.TimeS - lastS) : 0;
        lastPlotS = plot.TimeS;
    }

    private readonly record struct Pass(double TimeS, bool InView, PlotRow? Plot);
}
