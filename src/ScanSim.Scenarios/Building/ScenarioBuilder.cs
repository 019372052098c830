using System.Collections.Immutable;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>From the checked tree to the scenario: first every rule that can be tried, then, without faults, the records.</summary>
internal sealed class ScenarioBuilder(CheckedBlock root, FaultList faults)
{
    /// <summary>Null when there is a fault.</summary>
    public Scenario? Build(string text, string digest)
    {
        var cuts = Antenna();
        var tracks = Tracks();
        TargetRules.Check(root, faults);
        if (root.BlockOrNull("radar") is { } radar)
        {
            var before = faults.Count;
            new RadarRules(faults).Check(radar);
            if (radar.Sound && faults.Count == before && cuts.Azimuth is not null)
            {
                new DwellRules(faults).Check(radar, cuts.Azimuth.BeamwidthRad, root.BlockOrNull("run"));
            }
        }

        return faults.Count > 0 ? null : Scenario(text, digest, RadarBuilder.Build(root.Block("radar"), cuts.Azimuth!, cuts.Elevation!), tracks);
    }

    private (PatternCut? Azimuth, PatternCut? Elevation) Antenna()
    {
        var antenna = root.BlockOrNull("radar")?.BlockOrNull("antenna");
        return (Cut(antenna?.BlockOrNull("azimuth")), Cut(antenna?.BlockOrNull("elevation")));
    }

    private PatternCut? Cut(CheckedBlock? cut) => cut is { Sound: true } ? PatternCutBuilder.Build(cut, faults) : null;

    private List<Track?> Tracks()
    {
        if (root.BlockOrNull("site") is not { Sound: true } site)
        {
            return [];
        }

        var compiler = new TrackCompiler(new LocalPlane(site.Si("latitude"), site.Si("longitude")), faults);
        return root.Blocks("targets")
            .Select(target => target.BlockOrNull("track") is { Sound: true } track ? compiler.Compile(track) : null)
            .ToList();
    }

    private Scenario Scenario(string text, string digest, Radar radar, List<Track?> tracks)
    {
        var (site, run) = (root.Block("site"), root.Block("run"));
        return new Scenario
        {
            Name = root.Text("name"),
            Description = root.Has("description") ? root.Text("description") : "",
            Site = new Site
            {
                Name = site.Text("name"),
                LatitudeRad = site.Si("latitude"),
                LongitudeRad = site.Si("longitude"),
                GroundHeightM = site.Si("groundHeight"),
                AntennaHeightM = site.Si("antennaHeight"),
            },
            Radar = radar,
            Environment = new Surroundings { EffectiveEarthFactor = root.Block("environment").Block("refraction").Number("effectiveEarthFactor") },
            Targets = root.Blocks("targets").Select((target, index) => Target(target, tracks[index]!)).ToImmutableArray(),
            Run = new RunPlan { Start = run.Instant("start"), DurationS = run.Si("duration"), Seed = run.Whole("seed") },
            Digest = digest,
            SourceText = text,
        };
    }

    private static Target Target(CheckedBlock target, Track track) => new()
    {
        Id = target.Text("id"),
        Class = target.Text("class"),
        RcsM2 = target.Si("rcs"),
        FluctuationCase = (int)target.Whole("fluctuation"),
        Track = track,
    };
}
