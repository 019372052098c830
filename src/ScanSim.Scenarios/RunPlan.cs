namespace ScanSim.Scenarios;

/// <summary>What to run: UTC start of the scenario's time 0, how long, and the seed of all draws.</summary>
public sealed record RunPlan
{
    public required DateTimeOffset Start { get; init; }

    public required double DurationS { get; init; }

    public required ulong Seed { get; init; }
}
