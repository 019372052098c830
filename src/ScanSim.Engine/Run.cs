using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>A whole run: scans are computed in batches on all cores, and written in order while the next batch is computed.</summary>
public static class Run
{
    /// <summary>Looks that a batch should hold about: enough work for the cores, little enough memory.</summary>
    private const int LooksPerBatch = 20_000;
    private const int FewestScans = 4;
    private const int MostScans = 256;

    /// <summary>Runs a scenario into a sink. The rows do not depend on <see cref="RunOptions.Threads"/>.</summary>
    /// <param name="scenario">What to run.</param>
    /// <param name="options">How.</param>
    /// <param name="sink">Gets the rows, on one thread at a time, in the order of the tables.</param>
    /// <param name="progress">Called with scans written and scans in all, after each batch; may be null.</param>
    /// <param name="cancel">Stops between batches with an <see cref="OperationCanceledException"/>; the sink then holds part of the rows.</param>
    public static void Execute(Scenario scenario, RunOptions options, IRecordingSink sink, Action<int, int>? progress, CancellationToken cancel)
    {
        var setup = new RunSetup(scenario, options);
        var scans = setup.Timeline.ScanCount;
        var batchSize = Math.Clamp(LooksPerBatch / Math.Max(1, setup.Targets.Length), FewestScans, MostScans);
        var compute = new ScanBatch(setup, batchSize);
        var write = new ScanBatch(setup, batchSize);
        var drain = new ScanDrain(setup, sink);
        var writing = Task.CompletedTask;
        for (var first = 0; first < scans; first += batchSize)
        {
            cancel.ThrowIfCancellationRequested();
            compute.Compute(first, Math.Min(batchSize, scans - first), cancel);
            writing.GetAwaiter().GetResult();
            (compute, write) = (write, compute);
            writing = drain.Start(write, progress);
        }

        writing.GetAwaiter().GetResult();
        drain.Finish();
    }
}
