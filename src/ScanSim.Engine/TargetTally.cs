using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>What a run gave for one target.</summary>
/// <param name="id">The target's id.</param>
/// <param name="scanS">Duration of a scan: plots less than half of it apart belong to one pass of the beam.</param>
public sealed class TargetTally(string id, double scanS)
{
    private double lastPassS = double.NegativeInfinity;
    private double lastPlotS;
    private double lastTruthS;

    public string Id { get; } = id;

    /// <summary>Scans in which the beam passed the target while it was in view.</summary>
    public int ScansInView { get; private set; }

    /// <summary>Scans in which the target existed.</summary>
    public int ScansAlive { get; private set; }

    public int ScansWithPlot { get; private set; }

    public double? FirstPlotS { get; private set; }

    public double? FirstPlotRangeM { get; private set; }

    /// <summary>Longest time between plots, from the first plot to the target's last moment in the run.</summary>
    public double? LongestGapS => FirstPlotS is null ? null : Math.Max(longestGapS, lastTruthS - lastPlotS);

    /// <summary>Share of the scans in view that gave a plot; null when it was never in view.</summary>
    public double? BlipScanRatio => ScansInView == 0 ? null : Math.Min(1, (double)ScansWithPlot / ScansInView);

    private double longestGapS;

    internal void AddTruth(in TruthRow row)
    {
        ScansAlive++;
        ScansInView += row.View == TargetView.InView ? 1 : 0;
        lastTruthS = row.TimeS;
    }

    internal void AddPlot(in PlotRow row)
    {
        if (row.TimeS - lastPassS > 0.5 * scanS)
        {
            ScansWithPlot++;
            lastPassS = row.TimeS;
        }

        if (FirstPlotS is null)
        {
            FirstPlotS = row.TimeS;
            FirstPlotRangeM = row.RangeM;
        }
        else
        {
            longestGapS = Math.Max(longestGapS, row.TimeS - lastPlotS);
        }

        lastPlotS = row.TimeS;
    }
}
