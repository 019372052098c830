using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Full turns: the dwells run on over the north mark, so a dwell belongs to the turn in which its middle lies.</summary>
internal sealed class RotationTimeline : ScanTimeline
{
    public RotationTimeline(Scenario scenario, Scan.Rotation rotation)
        : base(
            scenario,
            new DwellGrid(scenario.Radar),
            fromRad: 0,
            Angles.TurnRad,
            DwellGrid.ToPicoseconds(rotation.PeriodS),
            DwellGrid.ToPicoseconds(rotation.PeriodS))
    {
    }

    public override long FirstDwell(int scan) => Grid.FirstWithMiddleAtOrAfter(Math.Min(scan * ScanPs, RunPs));

    internal override long FirstDwellAtOrAfter(int scan, double timeS) =>
        Math.Clamp(Grid.FirstWithMiddleAtOrAfter(Math.Max(0, DwellGrid.ToPicoseconds(timeS))), FirstDwell(scan), FirstDwell(scan + 1));

    private protected override bool IsClockwise(int scan) => true;

    private protected override int PrfIndex(int scan, long index) => Grid.PrfIndex(index);

    private protected override long MiddlePs(int scan, long index) => Grid.MiddlePs(index);
}
