using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Tables;

/// <summary>One threshold crossing: one range cell of one dwell.</summary>
internal sealed class HitTable : Table<HitRow>
{
    private readonly Column<HitRow, double> timeS;
    private readonly Column<HitRow, int> scan;
    private readonly Column<HitRow, long> dwell;
    private readonly Column<HitRow, double> beamAzimuthDeg;
    private readonly Column<HitRow, double> rangeM;
    private readonly Column<HitRow, double> snrDb;
    private readonly Column<HitRow, string> kind;
    private readonly Column<HitRow, string> target;

    public HitTable()
        : base("hits", "One threshold crossing: one range cell of one dwell")
    {
        timeS = Number("time_s", "s", "middle of the dwell, seconds since the scenario's start", (in row) => row.TimeS);
        scan = Count("scan", "turn of the antenna, from 0", (in row) => row.Scan);
        dwell = LongCount("dwell", "dwell of the run", (in row) => row.Dwell);
        beamAzimuthDeg = Number(
            "beam_azimuth_deg",
            "deg",
            "azimuth of the beam's centre in the middle of the dwell",
            (in row) => row.BeamAzimuthDeg
        );
        rangeM = Number("range_m", "m", "measured slant range, apparent and perhaps folded", (in row) => row.RangeM);
        snrDb = Number("snr_db", "dB", "measured signal-to-noise ratio per pulse", (in row) => row.SnrDb);
        kind = Text("kind", "what the hit came from", (in row) => EnumTexts.Echo[(int)row.Kind]);
        target = Text(
            "target",
            "id; several targets in one cell are joined by '+', the strongest first; empty for noise",
            (in row) => row.Target
        );
    }

    public override HitRow Build(ColumnBlock block, int row) =>
        new()
        {
            TimeS = timeS[block, row],
            Scan = scan[block, row],
            Dwell = dwell[block, row],
            BeamAzimuthDeg = beamAzimuthDeg[block, row],
            RangeM = rangeM[block, row],
            SnrDb = snrDb[block, row],
            Kind = EnumTexts.Echo.Parse(kind[block, row]),
            Target = target[block, row],
        };
}
