using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>When the beam is where: scans (turns or sweeps) cut into dwells, up to the end of the run.</summary>
public abstract class ScanTimeline
{
    private readonly AzimuthSector[] blanked;
    private readonly double fromRad;
    private readonly double widthRad;

    private protected ScanTimeline(Scenario scenario, DwellGrid grid, double fromRad, double widthRad, long sweepPs, long scanPs)
    {
        Grid = grid;
        this.fromRad = fromRad;
        this.widthRad = widthRad;
        SweepPs = sweepPs;
        ScanPs = scanPs;
        RunPs = DwellGrid.ToPicoseconds(scenario.Run.DurationS);
        ScanCount = checked((int)((RunPs + ScanPs - 1) / ScanPs));
        blanked = [.. scenario.Radar.Blanked];
    }

    /// <summary>Scans that start within the run; the last one may be cut short.</summary>
    public int ScanCount { get; }

    /// <summary>Duration of a whole scan.</summary>
    public double ScanS => ScanPs / DwellGrid.PicosecondsPerSecond;

    /// <summary>Angle of azimuth between the centres of neighbouring dwells (mean over the PRFs).</summary>
    public double DwellStepRad => BeamSpeedRadPerS * Grid.MeanDwellS;

    public double BeamSpeedRadPerS => widthRad / SweepPs * DwellGrid.PicosecondsPerSecond;

    internal DwellGrid Grid { get; }

    private protected long SweepPs { get; }

    private protected long ScanPs { get; }

    private protected long RunPs { get; }

    public static ScanTimeline Of(Scenario scenario) => scenario.Radar.Scan switch
    {
        Scan.Rotation rotation => new RotationTimeline(scenario, rotation),
        Scan.Sector sector => new SectorTimeline(scenario, sector),
        _ => throw new InvalidOperationException("unknown kind of scan"),
    };

    public double ScanStartS(int scan) => scan * ScanPs / DwellGrid.PicosecondsPerSecond;

    /// <summary>End of the scan, or of the run if that comes first.</summary>
    public double ScanEndS(int scan) => Math.Min((scan + 1L) * ScanPs, RunPs) / DwellGrid.PicosecondsPerSecond;

    public int ScanAt(double timeS) => (int)Math.Clamp(DwellGrid.ToPicoseconds(timeS) / ScanPs, 0, ScanCount - 1);

    /// <summary>First dwell of a scan, and (for scan = <see cref="ScanCount"/>) one past the last of the run.</summary>
    public abstract long FirstDwell(int scan);

    /// <summary>The dwell with this index, which must belong to <paramref name="scan"/>.</summary>
    public Dwell DwellAt(int scan, long index)
    {
        var prf = PrfIndex(scan, index);
        var middlePs = MiddlePs(scan, index);
        return new Dwell
        {
            Index = index,
            Scan = scan,
            PrfIndex = prf,
            Pulses = Grid.Pulses[prf],
            MiddleS = middlePs / DwellGrid.PicosecondsPerSecond,
            PriS = Grid.PriPs[prf] / DwellGrid.PicosecondsPerSecond,
            BeamAzimuthRad = AzimuthAfter(scan, middlePs - scan * ScanPs),
            BeamRateRadPerS = IsClockwise(scan) ? BeamSpeedRadPerS : -BeamSpeedRadPerS,
        };
    }

    /// <summary>Beam azimuth at a time, whatever the transmitter does; during a turnaround the edge it turns at.</summary>
    public double BeamAzimuthRad(double timeS)
    {
        var scan = ScanAt(timeS);
        return AzimuthAfter(scan, Math.Clamp(DwellGrid.ToPicoseconds(timeS) - scan * ScanPs, 0, SweepPs));
    }

    /// <summary>Time in the scan at which the beam points to an azimuth; null when the sweep does not reach it.</summary>
    public double? TimeOfAzimuthS(int scan, double azimuthRad)
    {
        var travelRad = Angles.ToTurn(azimuthRad - fromRad);
        return travelRad > widthRad ? null : TimeOfTravelS(scan, IsClockwise(scan) ? travelRad : widthRad - travelRad);
    }

    public bool IsBlanked(double beamAzimuthRad)
    {
        foreach (var sector in blanked)
        {
            if (sector.Contains(beamAzimuthRad))
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>
    /// The times of a scan in which the beam's centre is within <paramref name="halfWidthRad"/> of an azimuth: none, one or
    /// two spans (two when the span crosses the scan's seam). Returns how many were written.
    /// </summary>
    internal int SpansNear(int scan, double azimuthRad, double halfWidthRad, Span<TimeSpanS> spans)
    {
        if (halfWidthRad >= Math.PI)
        {
            spans[0] = new TimeSpanS(ScanStartS(scan), ScanEndS(scan));
            return 1;
        }

        var travelRad = Angles.ToTurn(azimuthRad - fromRad);
        var count = 0;
        for (var turn = -1; turn <= 1; turn++)
        {
            var low = Math.Max(0, travelRad - halfWidthRad + turn * Angles.TurnRad);
            var high = Math.Min(widthRad, travelRad + halfWidthRad + turn * Angles.TurnRad);
            if (low <= high)
            {
                spans[count++] = IsClockwise(scan)
                    ? new TimeSpanS(TimeOfTravelS(scan, low), TimeOfTravelS(scan, high))
                    : new TimeSpanS(TimeOfTravelS(scan, widthRad - high), TimeOfTravelS(scan, widthRad - low));
            }
        }

        return count;
    }

    /// <summary>First dwell of the scan whose middle is at or after a time (clamped to the scan's dwells).</summary>
    internal abstract long FirstDwellAtOrAfter(int scan, double timeS);

    private protected abstract bool IsClockwise(int scan);

    private protected abstract int PrfIndex(int scan, long index);

    private protected abstract long MiddlePs(int scan, long index);

    private double TimeOfTravelS(int scan, double travelRad) => ScanStartS(scan) + travelRad / BeamSpeedRadPerS;

    private double AzimuthAfter(int scan, long elapsedPs)
    {
        var travelRad = widthRad * elapsedPs / SweepPs;
        return Angles.ToTurn(fromRad + (IsClockwise(scan) ? travelRad : widthRad - travelRad));
    }
}
