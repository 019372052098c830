using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Tables;

/// <summary>One turn of the antenna, or one sweep of a sector scan.</summary>
internal sealed class ScanTable : Table<ScanRow>
{
    private readonly Column<ScanRow, int> scan;
    private readonly Column<ScanRow, double> startS;
    private readonly Column<ScanRow, double> endS;
    private readonly Column<ScanRow, int> looks;
    private readonly Column<ScanRow, int> hits;
    private readonly Column<ScanRow, int> falseHits;
    private readonly Column<ScanRow, int> plots;
    private readonly Column<ScanRow, int> falsePlots;

    public ScanTable()
        : base("scans", "One turn of the antenna, or one sweep of a sector scan")
    {
        scan = Count("scan", "turn of the antenna, from 0", (in row) => row.Scan);
        startS = Number("start_s", "s", "start, seconds since the scenario's start", (in row) => row.StartS);
        endS = Number("end_s", "s", "end, seconds since the scenario's start", (in row) => row.EndS);
        looks = Count("looks", "looks computed, whether or not the looks table holds them all", (in row) => row.Looks);
        hits = Count("hits", "threshold crossings", (in row) => row.Hits);
        falseHits = Count("false_hits", "threshold crossings of noise alone", (in row) => row.FalseHits);
        plots = Count("plots", "plots", (in row) => row.Plots);
        falsePlots = Count("false_plots", "plots of noise alone", (in row) => row.FalsePlots);
    }

    public override ScanRow Build(ColumnBlock block, int row) =>
        new()
        {
            Scan = scan[block, row],
            StartS = startS[block, row],
            EndS = endS[block, row],
            Looks = looks[block, row],
            Hits = hits[block, row],
            FalseHits = falseHits[block, row],
            Plots = plots[block, row],
            FalsePlots = falsePlots[block, row],
        };
}
