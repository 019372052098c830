namespace ScanSim.Recordings;

/// <summary>One turn of the antenna (or one sweep of a sector scan).</summary>
public readonly record struct ScanRow
{
    public required int Scan { get; init; }

    public required double StartS { get; init; }

    public required double EndS { get; init; }

    /// <summary>Looks computed, whether or not the looks table holds them all.</summary>
    public required int Looks { get; init; }

    public required int Hits { get; init; }

    public required int FalseHits { get; init; }

    public required int Plots { get; init; }

    public required int FalsePlots { get; init; }
}
