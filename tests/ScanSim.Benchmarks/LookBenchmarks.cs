using BenchmarkDotNet.Attributes;
using ScanSim.Engine;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Benchmarks;

/// <summary>One thread: what a look costs, with all terms, the drawn statistic and (where rows are kept) the analytic Pd.</summary>
[MemoryDiagnoser]
public class LookBenchmarks
{
    private readonly Scenario scenario = BusyScenario.Of(200, 0.02);
    private readonly double[] pulseSnr = new double[15];
    private LookModel model = null!;
    private ScanWorker keepingAll = null!;
    private ScanWorker keepingNone = null!;
    private ScanResult result = null!;
    private Detector detector = null!;
    private Dwell dwell;

    [GlobalSetup]
    public void Setup()
    {
        model = new LookModel(scenario);
        keepingAll = new ScanWorker(new RunSetup(scenario, new RunOptions { Looks = LooksKept.All }));
        keepingNone = new ScanWorker(new RunSetup(scenario, new RunOptions { Looks = LooksKept.None }));
        result = new ScanResult();
        detector = new Detector(15, 1e-6, [FluctuationCase.Case1, FluctuationCase.Case2]);
        var timeline = ScanTimeline.Of(scenario);
        dwell = timeline.DwellAt(0, 0) with { BeamAzimuthRad = model.SightOf(scenario.Targets[0].Track.At(0)).AzimuthRad };
        model.LookAt(1, scenario.Targets[0].Track.At(0), dwell, pulseSnr);
    }

    /// <summary>Geometry, beam, SNR of 15 pulses.</summary>
    [Benchmark]
    public double LookAlone()
    {
        model.TryLook(10, scenario.Targets[0].Track.At(dwell.MiddleS), dwell, pulseSnr, out var look);
        return look.SnrRatio;
    }

    [Benchmark]
    public double ProbabilityFromTable() => detector.Probability(FluctuationCase.Case1, 3.0, pulseSnr);

    [Benchmark]
    public double ProbabilityOfUnequalPulses() => detector.Probability(FluctuationCase.Case2, 3.0, pulseSnr);

    /// <summary>A scan over 200 targets: candidate search, looks, draws, cells, false alarms, truth.</summary>
    [Benchmark]
    public int ScanOf200Targets()
    {
        keepingNone.Compute(3, result);
        return result.LookCount;
    }

    [Benchmark]
    public int ScanOf200TargetsKeepingAllLooks()
    {
        keepingAll.Compute(3, result);
        return result.LookCount;
    }
}
