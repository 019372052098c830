using System.Collections.Immutable;
using ScanSim.Recordings;

namespace ScanSim.Display.Explaining;

/// <summary>One scan of a target: where it was, the looks recorded, and what became of it.</summary>
public sealed record TargetPass
{
    public required int Scan { get; init; }

    /// <summary>When the beam's centre passed it; of a scan without a row of truth the time of its best look.</summary>
    public required double TimeS { get; init; }

    /// <summary>Null when the target did not exist as the beam passed.</summary>
    public required TruthRow? Truth { get; init; }

    /// <summary>In order of time; one with looks "best", more with "all", none where there was no look. Without <see cref="SideLooks"/>.</summary>
    public required ImmutableArray<LookExplanation> Looks { get; init; }

    /// <summary>Further looks without a hit, away from the pass by more than half the widest plot: side lobes, all round near the radar.</summary>
    public required int SideLooks { get; init; }

    /// <summary>The strongest detected look, or the strongest if none was detected; null without looks.</summary>
    public required LookExplanation? Best { get; init; }

    /// <summary>Whether a plot that holds its echo lies at the time of the pass; echoes through side lobes do not count.</summary>
    public required bool HasPlot { get; init; }

    public required PassOutcome Outcome { get; init; }

    public required string Reason { get; init; }

    /// <summary>As runs count it: by geometry and timeline, as the beam's centre passed.</summary>
    public bool InView => Truth?.View == TargetView.InView;

    public bool IsMissed => InView && !HasPlot;
}
