namespace ScanSim.Recordings;

/// <summary>Which looks the looks table holds.</summary>
public enum LooksKept
{
    /// <summary>One per target and pass of the beam: the strongest detected one, or the strongest if none was detected.</summary>
    Best = 0,
    All = 1,
    None = 2,
}
