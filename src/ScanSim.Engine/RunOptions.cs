using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>How a run is carried out. Only <see cref="Looks"/> changes the tables: which rows the looks table holds.</summary>
public sealed record RunOptions
{
    /// <summary>Threads that compute scans; 0: one per processor.</summary>
    public int Threads { get; init; }

    public LooksKept Looks { get; init; } = LooksKept.Best;

    /// <summary>Try every target on every dwell instead of those the beam can reach: slow, and the same result. For tests.</summary>
    public bool EveryDwell { get; init; }
}
