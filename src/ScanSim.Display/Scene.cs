using System.Collections.Immutable;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display;

/// <summary>All that is drawn of a recording, made small: immutable, in metres east and north of the site, seconds since the start.</summary>
public sealed record Scene
{
    public required string ScenarioName { get; init; }

    public required string SiteName { get; init; }

    public required double InstrumentedRangeM { get; init; }

    public required BeamMotion Beam { get; init; }

    /// <summary>Between the one-way half-power points in azimuth.</summary>
    public required double BeamwidthRad { get; init; }

    public required ImmutableArray<AzimuthSector> Blanked { get; init; }

    public required DateTimeOffset StartUtc { get; init; }

    public required double DurationS { get; init; }

    /// <summary>In the scenario's order.</summary>
    public required ImmutableArray<SceneTarget> Targets { get; init; }

    /// <summary>In order of time.</summary>
    public required ImmutableArray<ScanRow> Scans { get; init; }

    /// <summary>In order of time.</summary>
    public required ImmutableArray<PlotMark> Plots { get; init; }
}
