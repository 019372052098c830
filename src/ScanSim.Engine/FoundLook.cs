namespace ScanSim.Engine;

/// <summary>A look of the scan at hand, before cells are resolved. Small: a scan may hold hundreds of thousands.</summary>
internal struct FoundLook
{
    public Look Look;

    /// <summary>Counts from the scan's first dwell.</summary>
    public int DwellInScan;
    public int TargetIndex;
    public int Cell;
    public int TargetsInCell;

    /// <summary>Drawn RCS over mean; 1 where each pulse has its own.</summary>
    public double FluctuationRatio;

    /// <summary>Drawn statistic of its cell.</summary>
    public double Statistic;

    public bool Detected;
}
