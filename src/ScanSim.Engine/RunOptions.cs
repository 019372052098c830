using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>How a run is carried out. Only <see cref="RunNumber"/> and <see cref="Looks"/> change the tables.</summary>
public sealed record RunOptions
{
    /// <summary>Threads that compute scans; 0: one per processor.</summary>
    public int Threads { get; init; }

    /// <summary>Number of the run: the same seed gives another, independent run for each.</summary>
    public uint RunNumber { get; init; }

    /// <summary>Which rows the looks table holds.</summary>
    public LooksKept Looks { get; init; } = LooksKept.Best;

    /// <summary>Try every target on every dwell instead of those the beam can reach: slow, and the same result. For tests.</summary>
    public bool EveryDwell { get; init; }
}
