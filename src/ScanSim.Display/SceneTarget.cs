using System.Collections.Immutable;

namespace ScanSim.Display;

/// <summary>One target's story: where it was and what became of it in each scan, both in order of time.</summary>
public sealed record SceneTarget
{
    public required string Id { get; init; }

    public required string Class { get; init; }

    public required ImmutableArray<TruthMark> Truth { get; init; }

    public required ImmutableArray<LookMark> Looks { get; init; }

    /// <summary>Scans in which the radar could look at it.</summary>
    public required int ScansInView { get; init; }

    /// <summary>Of those, the scans with at least one plot that holds its echo.</summary>
    public required int ScansWithPlot { get; init; }

    /// <summary>The blip-scan ratio; NaN when it was never in view.</summary>
    public double BlipScanRatio => ScansInView == 0 ? double.NaN : (double)ScansWithPlot / ScansInView;
}
