namespace ScanSim.Recordings;

/// <summary>What is known of a recording before its first row: written into the manifest when the run is complete.</summary>
public sealed record RecordingHead
{
    public required string ScenarioName { get; init; }

    /// <summary>Digest of the scenario's canonical JSON.</summary>
    public required string ScenarioDigest { get; init; }

    /// <summary>Text of scenario.json as it is copied into the folder.</summary>
    public required string ScenarioText { get; init; }

    public required string ProgramVersion { get; init; }

    public required ulong Seed { get; init; }

    public required DateTimeOffset StartUtc { get; init; }

    public required double DurationS { get; init; }

    public required LooksKept Looks { get; init; }

    public required TableFormat Format { get; init; }
}
