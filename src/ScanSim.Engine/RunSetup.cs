using System.Collections.Immutable;
using ScanSim.Physics.Waveforms;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>All that the workers of a run share: made once, never changed.</summary>
internal sealed class RunSetup
{
    public RunSetup(Scenario scenario, RunOptions options)
    {
        Scenario = scenario;
        Options = options;
        Timeline = ScanTimeline.Of(scenario);
        Model = new LookModel(scenario);
        Targets = [.. scenario.Targets.Select(t => new RunTarget(t))];
        Detectors = Detector.For(scenario, Timeline.Grid);
        Cells = [.. Timeline.Grid.PriPs.Select(priPs => RangeCells.Of(scenario.Radar, priPs / DwellGrid.PicosecondsPerSecond))];
        ShortestPriS = Timeline.Grid.PriPs.Min() / DwellGrid.PicosecondsPerSecond;
        CellM = RangeResolution.CellM(scenario.Radar.Waveform.CompressedWidthS);
        Seed = scenario.Run.Seed;
    }

    public Scenario Scenario { get; }

    public RunOptions Options { get; }

    public ScanTimeline Timeline { get; }

    public LookModel Model { get; }

    public ImmutableArray<RunTarget> Targets { get; }

    /// <summary>By PRF index.</summary>
    public ImmutableArray<Detector> Detectors { get; }

    /// <summary>By PRF index.</summary>
    public ImmutableArray<RangeCells> Cells { get; }

    public double ShortestPriS { get; }

    /// <summary>Size of a range cell.</summary>
    public double CellM { get; }

    public ulong Seed { get; }

    /// <summary>Part of every draw's address.</summary>
    public uint Run => Options.RunNumber;
}
