using System.Collections.Immutable;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Tables;

/// <summary>One target in one dwell's beam.</summary>
internal sealed class LookTable : Table<LookRow>
{
    private readonly Column<LookRow, double> timeS;
    private readonly Column<LookRow, int> scan;
    private readonly Column<LookRow, long> dwell;
    private readonly Column<LookRow, string> target;
    private readonly Column<LookRow, double> rangeM;
    private readonly Column<LookRow, double> azimuthDeg;
    private readonly Column<LookRow, double> elevationDeg;
    private readonly Column<LookRow, double> radialSpeedMps;
    private readonly Column<LookRow, double> beamAzimuthDeg;
    private readonly Column<LookRow, int> pulses;
    private readonly Column<LookRow, double> radarDb;
    private readonly Column<LookRow, double> rcsDb;
    private readonly Column<LookRow, double> spreadingDb;
    private readonly Column<LookRow, double> azimuthBeamDb;
    private readonly Column<LookRow, double> elevationBeamDb;
    private readonly Column<LookRow, double> eclipsingDb;
    private readonly Column<LookRow, double> snrDb;
    private readonly Column<LookRow, double> pd;
    private readonly Column<LookRow, double?> fluctuationDb;
    private readonly Column<LookRow, double> statisticDb;
    private readonly Column<LookRow, bool> detected;
    private readonly Column<LookRow, string> lostTo;
    private readonly Column<LookRow, int> targetsInCell;

    public LookTable()
        : base("looks", "One target in one dwell's beam")
    {
        timeS = Number("time_s", "s", "middle of the dwell, seconds since the scenario's start", (in row) => row.TimeS);
        scan = Count("scan", "turn of the antenna, from 0", (in row) => row.Scan);
        dwell = LongCount("dwell", "dwell of the run", (in row) => row.Dwell);
        target = Text("target", "id of the target", (in row) => row.Target);
        rangeM = Number("range_m", "m", "true slant range", (in row) => row.RangeM);
        azimuthDeg = Number("azimuth_deg", "deg", "true azimuth, clockwise from true north", (in row) => row.AzimuthDeg);
        elevationDeg = Number("elevation_deg", "deg", "true elevation above the horizontal", (in row) => row.ElevationDeg);
        radialSpeedMps = Number("radial_speed_mps", "m/s", "radial speed, positive when the range grows", (in row) => row.RadialSpeedMps);
        beamAzimuthDeg = Number(
            "beam_azimuth_deg",
            "deg",
            "azimuth of the beam's centre in the middle of the dwell",
            (in row) => row.BeamAzimuthDeg
        );
        pulses = Count("pulses", "pulses processed together", (in row) => row.Pulses);
        radarDb = Number(
            "radar_db",
            "dB",
            "term that is the same for all targets: power, gains, wavelength, (4π)³, losses, noise",
            (in row) => row.RadarDb
        );
        rcsDb = Number("rcs_db", "dB", "term: mean radar cross section over 1 m²", (in row) => row.RcsDb);
        spreadingDb = Number("spreading_db", "dB", "term: −40 lg(range / 1 m)", (in row) => row.SpreadingDb);
        azimuthBeamDb = Number(
            "azimuth_beam_db",
            "dB",
            "term: two-way azimuth pattern, mean over the dwell's pulses",
            (in row) => row.AzimuthBeamDb
        );
        elevationBeamDb = Number(
            "elevation_beam_db",
            "dB",
            "term: two-way elevation pattern with the side-lobe floor",
            (in row) => row.ElevationBeamDb
        );
        eclipsingDb = Number(
            "eclipsing_db",
            "dB",
            "term: share of the echo that comes while the receiver is open",
            (in row) => row.EclipsingDb
        );
        snrDb = Number("snr_db", "dB", "sum of the terms: mean signal-to-noise ratio per pulse", (in row) => row.SnrDb);
        pd = Number("pd", null, "analytic probability of detection of this look alone", (in row) => row.Pd);
        fluctuationDb = NumberOrNull(
            "fluctuation_db",
            "dB",
            "drawn over mean radar cross section; null for fluctuation cases 2 and 4, where each pulse has its own",
            (in row) => row.FluctuationDb
        );
        statisticDb = Number("statistic_db", "dB", "drawn detection statistic over the threshold", (in row) => row.StatisticDb);
        detected = Flag("detected", "whether the look gave a hit", (in row) => row.Detected);
        lostTo = Text("lost_to", "what a missed look was lost to; empty when detected", (in row) => EnumTexts.Loss[(int)row.LostTo]);
        targetsInCell = Count("targets_in_cell", "targets in this range cell and dwell, this one included", (in row) => row.TargetsInCell);
    }

    public ImmutableArray<Column> SummaryColumns => [timeS, scan, target, snrDb, detected, lostTo];

    public LookSummary Summary(ColumnBlock block, int row) =>
        new(timeS[block, row], scan[block, row], target[block, row], snrDb[block, row], detected[block, row], EnumTexts.Loss.Parse(lostTo[block, row]));

    public bool IsOf(string id, ColumnBlock block, int row) => string.Equals(target[block, row], id, StringComparison.Ordinal);

    public override LookRow Build(ColumnBlock block, int row) =>
        new()
        {
            TimeS = timeS[block, row],
            Scan = scan[block, row],
            Dwell = dwell[block, row],
            Target = target[block, row],
            RangeM = rangeM[block, row],
            AzimuthDeg = azimuthDeg[block, row],
            ElevationDeg = elevationDeg[block, row],
            RadialSpeedMps = radialSpeedMps[block, row],
            BeamAzimuthDeg = beamAzimuthDeg[block, row],
            Pulses = pulses[block, row],
            RadarDb = radarDb[block, row],
            RcsDb = rcsDb[block, row],
            SpreadingDb = spreadingDb[block, row],
            AzimuthBeamDb = azimuthBeamDb[block, row],
            ElevationBeamDb = elevationBeamDb[block, row],
            EclipsingDb = eclipsingDb[block, row],
            SnrDb = snrDb[block, row],
            Pd = pd[block, row],
            FluctuationDb = fluctuationDb[block, row],
            StatisticDb = statisticDb[block, row],
            Detected = detected[block, row],
            LostTo = EnumTexts.Loss.Parse(lostTo[block, row]),
            TargetsInCell = targetsInCell[block, row],
        };
}
