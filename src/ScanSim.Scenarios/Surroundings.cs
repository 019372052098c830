namespace ScanSim.Scenarios;

/// <summary>The environment block: what lies between the radar and its targets.</summary>
public sealed record Surroundings
{
    /// <summary>Ratio of the effective to the true earth radius, k. Default 4/3 (common practice for a standard atmosphere).</summary>
    public required double EffectiveEarthFactor { get; init; }
}
