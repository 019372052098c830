using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>How a run is carried out. None of these changes a number in the tables, but <see cref="Looks"/> which rows the looks table holds.</summary>
public sealed record RunOptions
{
    /// <summary>Workers; 0: one per processor.</summary>
    public int Threads { get; init; }

    public LooksKept Looks { get; init; } = LooksKept.Best;
}
