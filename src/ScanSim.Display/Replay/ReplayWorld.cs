using System.Collections.Immutable;
using ScanSim.Display.Overlays;

namespace ScanSim.Display.Replay;

/// <summary>What the replay shows, apart from how: one recording or two, the plots read so far, the rows of the timeline.</summary>
internal sealed record ReplayWorld
{
    public required ImmutableArray<ReplayRecording> Recordings { get; init; }

    /// <summary>For each recording, what has been read around the time shown.</summary>
    public required ImmutableArray<ReplayStretch> Stretches { get; init; }

    /// <summary>All targets, each once, in the order asked for.</summary>
    public required ImmutableArray<ReplayRow> Rows { get; init; }

    public ImmutableArray<Overlay> Overlays { get; init; } = [];

    public ReplayRecording First => Recordings[0];

    public bool IsComparison => Recordings.Length > 1;

    /// <summary>The longer one's.</summary>
    public double DurationS => Recordings.Max(recording => recording.Scene.DurationS);

    /// <summary>The range that both plans show unless zoomed.</summary>
    public double WholeRangeM => Recordings.Max(recording => recording.Scene.InstrumentedRangeM);

    /// <summary>The folder's name; with the side it is shown on when both folders have the same.</summary>
    public string NameOf(ReplayRecording recording)
    {
        var alike = IsComparison && string.Equals(Recordings[0].Name, Recordings[1].Name, StringComparison.Ordinal);
        return alike ? $"{recording.Name} ({(ReferenceEquals(recording, First) ? "left" : "right")})" : recording.Name;
    }

    public double RangeM(ReplayState state) => state.RangeM ?? WholeRangeM;
}
