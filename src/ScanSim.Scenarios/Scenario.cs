using System.Collections.Immutable;
using ScanSim.Physics.Earth;

namespace ScanSim.Scenarios;

/// <summary>A checked scenario: SI units and radians throughout, immutable, valid by construction.</summary>
/// <remarks>Two scenarios are compared by <see cref="Digest"/>, not by record equality (arrays compare by reference).</remarks>
public sealed record Scenario
{
    public required string Name { get; init; }

    public string Description { get; init; } = "";

    public required Site Site { get; init; }

    public required Radar Radar { get; init; }

    public required Surroundings Environment { get; init; }

    public required ImmutableArray<Target> Targets { get; init; }

    public required RunPlan Run { get; init; }

    /// <summary>SHA-256 (lower-case hex) of the scenario's canonical JSON: comments, white space and key order do not count.</summary>
    public required string Digest { get; init; }

    /// <summary>The file's own text (UTF-8), kept for the recording's scenario.json.</summary>
    public required string SourceText { get; init; }

    /// <summary>The sphere of k times the earth's mean radius at the site, on which rays run straight.</summary>
    public EffectiveEarth EffectiveEarth() => new(Environment.EffectiveEarthFactor * EarthRadius.GaussianMeanM(Site.LatitudeRad));
}
