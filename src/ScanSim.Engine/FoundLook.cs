namespace ScanSim.Engine;

/// <summary>A look of the scan at hand, before cells are resolved.</summary>
internal struct FoundLook
{
    public Look Look;
    public Dwell Dwell;
    public int TargetIndex;
    public int Cell;

    /// <summary>Drawn RCS over mean; 1 where each pulse has its own.</summary>
    public double FluctuationRatio;

    /// <summary>Drawn statistic of its cell.</summary>
    public double Statistic;

    public double Pd;

    public bool Detected;

    public int TargetsInCell;
}
