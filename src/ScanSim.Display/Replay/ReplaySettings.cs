using System.Collections.Immutable;
using ScanSim.Display.Overlays;

namespace ScanSim.Display.Replay;

/// <summary>How a replay starts.</summary>
public sealed record ReplaySettings
{
    public double StartS { get; init; }

    public bool IsPlaying { get; init; } = true;

    public double SpeedRatio { get; init; } = 1;

    public RangeUnit Unit { get; init; }

    public Theme Theme { get; init; }

    public int AfterglowScans { get; init; } = 8;

    /// <summary>Id of the target selected at first.</summary>
    public string? Selected { get; init; }

    /// <summary>Drawn under the plans, in metres from the site.</summary>
    public ImmutableArray<Overlay> Overlays { get; init; } = [];

    /// <summary>Where pictures are saved.</summary>
    public string SaveFolder { get; init; } = ".";
}
