namespace ScanSim.Recordings;

/// <summary>When a plot came and whose it is. default(PlotSummary) is no plot.</summary>
/// <param name="TimeS">As <see cref="PlotRow.TimeS"/>.</param>
/// <param name="Kind">What the plot came from.</param>
/// <param name="Target">Ids joined by '+', the strongest first; empty for noise.</param>
public readonly record struct PlotSummary(double TimeS, EchoKind Kind, string Target)
{
    public static PlotSummary Of(in PlotRow row) => new(row.TimeS, row.Kind, row.Target);
}
