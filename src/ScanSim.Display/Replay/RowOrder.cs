namespace ScanSim.Display.Replay;

/// <summary>How the rows of the scan timeline are sorted.</summary>
public enum RowOrder
{
    Scenario = 0,
    Id = 1,
    FirstDetection = 2,

    /// <summary>The longest stretch in view without a detection comes first.</summary>
    WorstGap = 3,
}
