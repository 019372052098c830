namespace ScanSim.Engine;

/// <summary>What a draw is for: part of its address. These numbers are format: never renumber or reuse one.</summary>
internal static class DrawPurpose
{
    /// <summary>RCS of a target in one pass of the beam (cases 1 and 3). Entity: target; index: pass.</summary>
    public const byte PassFluctuation = 1;

    /// <summary>Detection statistic of a range cell. Entity: (strongest) target; index: dwell.</summary>
    public const byte CellStatistic = 2;

    /// <summary>Phase of one of several targets in a cell. Entity: target; index: dwell.</summary>
    public const byte CellPhase = 3;

    /// <summary>RCS pulse by pulse of one of several targets in a cell (cases 2 and 4). Entity: target; index: dwell.</summary>
    public const byte CellFluctuation = 4;

    /// <summary>Range error of a hit. Entity: (strongest) target; index: dwell.</summary>
    public const byte HitRange = 5;

    /// <summary>False alarms of a dwell: how many, where, how strong. Entity: 0; index: dwell.</summary>
    public const byte FalseAlarms = 6;

    /// <summary>Instrument errors of a plot. Entity: strongest target, or range cell for noise; index: dwell of the strongest hit.</summary>
    public const byte PlotInstrument = 7;

    /// <summary>As <see cref="PlotInstrument"/>, for plots of noise alone.</summary>
    public const byte NoisePlotInstrument = 8;
}
