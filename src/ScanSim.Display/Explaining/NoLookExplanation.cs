using ScanSim.Recordings;

namespace ScanSim.Display.Explaining;

/// <summary>Why there was no look at a target in a scan.</summary>
public sealed record NoLookExplanation
{
    public required TruthRow Row { get; init; }

    public required PassOutcome Outcome { get; init; }

    /// <summary>In words: "below the horizon by 3.2 km: ...".</summary>
    public required string Reason { get; init; }
}
