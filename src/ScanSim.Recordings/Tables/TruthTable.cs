using System.Collections.Immutable;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Tables;

/// <summary>Where one target really was when the beam's centre passed it, or at mid-scan where the beam never does.</summary>
internal sealed class TruthTable : Table<TruthRow>
{
    private readonly Column<TruthRow, double> timeS;
    private readonly Column<TruthRow, int> scan;
    private readonly Column<TruthRow, string> target;
    private readonly Column<TruthRow, double> latitudeDeg;
    private readonly Column<TruthRow, double> longitudeDeg;
    private readonly Column<TruthRow, double> heightM;
    private readonly Column<TruthRow, double> eastM;
    private readonly Column<TruthRow, double> northM;
    private readonly Column<TruthRow, double> eastMps;
    private readonly Column<TruthRow, double> northMps;
    private readonly Column<TruthRow, double> upMps;
    private readonly Column<TruthRow, double> rangeM;
    private readonly Column<TruthRow, double> azimuthDeg;
    private readonly Column<TruthRow, double> elevationDeg;
    private readonly Column<TruthRow, string> view;

    public TruthTable()
        : base("truth", "Where one target really was when the beam's centre passed it, or at mid-scan where the beam never does")
    {
        timeS = Number("time_s", "s", "instant of this position, seconds since the scenario's start", (in row) => row.TimeS);
        scan = Count("scan", "turn of the antenna, from 0", (in row) => row.Scan);
        target = Text("target", "id of the target", (in row) => row.Target);
        latitudeDeg = Number("latitude_deg", "deg", "geodetic latitude, WGS 84", (in row) => row.LatitudeDeg);
        longitudeDeg = Number("longitude_deg", "deg", "longitude, WGS 84", (in row) => row.LongitudeDeg);
        heightM = Number("height_m", "m", "height above mean sea level", (in row) => row.HeightM);
        eastM = Number("east_m", "m", "east of the site in its azimuthal-equidistant plane", (in row) => row.EastM);
        northM = Number("north_m", "m", "north of the site in its azimuthal-equidistant plane", (in row) => row.NorthM);
        eastMps = Number("east_mps", "m/s", "velocity to the east", (in row) => row.EastMps);
        northMps = Number("north_mps", "m/s", "velocity to the north", (in row) => row.NorthMps);
        upMps = Number("up_mps", "m/s", "velocity upwards", (in row) => row.UpMps);
        rangeM = Number("range_m", "m", "slant range on the effective earth", (in row) => row.RangeM);
        azimuthDeg = Number("azimuth_deg", "deg", "azimuth, clockwise from true north", (in row) => row.AzimuthDeg);
        elevationDeg = Number("elevation_deg", "deg", "elevation above the horizontal", (in row) => row.ElevationDeg);
        view = Text(
            "view",
            "whether the radar could look at it at all, by geometry and timeline alone",
            (in row) => EnumTexts.View[(int)row.View]
        );
    }

    public ImmutableArray<Column> SummaryColumns => [timeS, scan, target, heightM, eastMps, northMps, rangeM, azimuthDeg, view];

    public TruthSummary Summary(ColumnBlock block, int row) =>
        new()
        {
            TimeS = timeS[block, row],
            Scan = scan[block, row],
            Target = target[block, row],
            HeightM = heightM[block, row],
            EastMps = eastMps[block, row],
            NorthMps = northMps[block, row],
            RangeM = rangeM[block, row],
            AzimuthDeg = azimuthDeg[block, row],
            View = EnumTexts.View.Parse(view[block, row]),
        };

    public override TruthRow Build(ColumnBlock block, int row) =>
        new()
        {
            TimeS = timeS[block, row],
            Scan = scan[block, row],
            Target = target[block, row],
            LatitudeDeg = latitudeDeg[block, row],
            LongitudeDeg = longitudeDeg[block, row],
            HeightM = heightM[block, row],
            EastM = eastM[block, row],
            NorthM = northM[block, row],
            EastMps = eastMps[block, row],
            NorthMps = northMps[block, row],
            UpMps = upMps[block, row],
            RangeM = rangeM[block, row],
            AzimuthDeg = azimuthDeg[block, row],
            ElevationDeg = elevationDeg[block, row],
            View = EnumTexts.View.Parse(view[block, row]),
        };
}
