using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Sweeps to and fro: the dwells start afresh with each sweep, as many as fit; none while the antenna turns round.</summary>
internal sealed class SectorTimeline : ScanTimeline
{
    private readonly long dwellsPerSweep;

    public SectorTimeline(Scenario scenario, Scan.Sector sector)
        : base(
            scenario,
            new DwellGrid(scenario.Radar),
            sector.Limits.FromRad,
            sector.Limits.WidthRad,
            DwellGrid.ToPicoseconds(sector.Limits.WidthRad / sector.RateRadPerS),
            DwellGrid.ToPicoseconds(sector.Limits.WidthRad / sector.RateRadPerS) + DwellGrid.ToPicoseconds(sector.TurnaroundS))
    {
        var count = Grid.FirstWithMiddleAtOrAfter(SweepPs);
        while (count > 0 && Grid.StartPs(count) > SweepPs)
        {
            count--;
        }

        dwellsPerSweep = count;
    }

    public override long FirstDwell(int scan)
    {
        if (scan < ScanCount)
        {
            return scan * dwellsPerSweep;
        }

        var last = ScanCount - 1;
        return last * dwellsPerSweep + Math.Min(dwellsPerSweep, Grid.FirstWithMiddleAtOrAfter(RunPs - last * ScanPs));
    }

    internal override long FirstDwellAtOrAfter(int scan, double timeS)
    {
        var inSweep = Grid.FirstWithMiddleAtOrAfter(Math.Max(0, DwellGrid.ToPicoseconds(timeS) - scan * ScanPs));
        return Math.Clamp(scan * dwellsPerSweep + inSweep, FirstDwell(scan), FirstDwell(scan + 1));
    }

    private protected override bool IsClockwise(int scan) => scan % 2 == 0;

    private protected override int PrfIndex(int scan, long index) => Grid.PrfIndex(index - scan * dwellsPerSweep);

    private protected override long MiddlePs(int scan, long index) => scan * ScanPs + Grid.MiddlePs(index - scan * dwellsPerSweep);
}
