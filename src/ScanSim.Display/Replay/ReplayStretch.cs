using System.Collections.Immutable;

namespace ScanSim.Display.Replay;

/// <summary>Plots and hits of a part of a recording, in order of time.</summary>
public sealed record ReplayStretch(double FromS, double ToS, ImmutableArray<PlotMark> Plots, ImmutableArray<HitMark> Hits)
{
    public static readonly ReplayStretch Nothing = new(0, -1, [], []);

    public bool Covers(double fromS, double toS) => FromS <= fromS && ToS >= toS;
}
