using System.Collections.Immutable;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Tables;

/// <summary>One extracted report: the hits of one pass that hang together.</summary>
internal sealed class PlotTable : Table<PlotRow>
{
    private readonly Column<PlotRow, double> timeS;
    private readonly Column<PlotRow, int> scan;
    private readonly Column<PlotRow, double> rangeM;
    private readonly Column<PlotRow, double> azimuthDeg;
    private readonly Column<PlotRow, double> snrDb;
    private readonly Column<PlotRow, int> hits;
    private readonly Column<PlotRow, double> sigmaRangeM;
    private readonly Column<PlotRow, double> sigmaAzimuthDeg;
    private readonly Column<PlotRow, string> kind;
    private readonly Column<PlotRow, string> target;

    public PlotTable()
        : base("plots", "One extracted report: the hits of one pass that hang together")
    {
        timeS = Number(
            "time_s",
            "s",
            "when the beam's centre pointed at the plot's azimuth, seconds since the scenario's start",
            (in row) => row.TimeS
        );
        scan = Count("scan", "turn of the antenna, from 0", (in row) => row.Scan);
        rangeM = Number("range_m", "m", "measured slant range", (in row) => row.RangeM);
        azimuthDeg = Number("azimuth_deg", "deg", "measured azimuth, clockwise from true north", (in row) => row.AzimuthDeg);
        snrDb = Number("snr_db", "dB", "measured signal-to-noise ratio per pulse of the strongest hit", (in row) => row.SnrDb);
        hits = Count("hits", "hits in the plot", (in row) => row.Hits);
        sigmaRangeM = Number(
            "sigma_range_m",
            "m",
            "standard deviation of the range error as the extractor states it",
            (in row) => row.SigmaRangeM
        );
        sigmaAzimuthDeg = Number(
            "sigma_azimuth_deg",
            "deg",
            "standard deviation of the azimuth error as the extractor states it",
            (in row) => row.SigmaAzimuthDeg
        );
        kind = Text("kind", "what the plot came from", (in row) => EnumTexts.Echo[(int)row.Kind]);
        target = Text("target", "ids joined by '+', the strongest first; empty for noise", (in row) => row.Target);
    }

    public ImmutableArray<Column> SummaryColumns => [timeS, kind, target];

    public PlotSummary Summary(ColumnBlock block, int row) => new(timeS[block, row], EnumTexts.Echo.Parse(kind[block, row]), target[block, row]);

    public override PlotRow Build(ColumnBlock block, int row) =>
        new()
        {
            TimeS = timeS[block, row],
            Scan = scan[block, row],
            RangeM = rangeM[block, row],
            AzimuthDeg = azimuthDeg[block, row],
            SnrDb = snrDb[block, row],
            Hits = hits[block, row],
            SigmaRangeM = sigmaRangeM[block, row],
            SigmaAzimuthDeg = sigmaAzimuthDeg[block, row],
            Kind = EnumTexts.Echo.Parse(kind[block, row]),
            Target = target[block, row],
        };
}
