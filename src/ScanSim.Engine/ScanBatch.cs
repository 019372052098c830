using System.Collections.Concurrent;

namespace ScanSim.Engine;

/// <summary>A number of consecutive scans, computed side by side into results that are used again for the next batch.</summary>
internal sealed class ScanBatch(RunSetup setup, int capacity)
{
    private readonly ConcurrentBag<ScanWorker> idle = [];
    private readonly ScanResult[] results = [.. Enumerable.Range(0, capacity).Select(_ => new ScanResult())];

    /// <summary>The results of the last computation, in order of scans.</summary>
    public ReadOnlySpan<ScanResult> Results => results.AsSpan(0, Count);

    private int Count { get; set; }

    public void Compute(int firstScan, int count, CancellationToken cancel)
    {
        Count = count;
        var options = new ParallelOptions
        {
            MaxDegreeOfParallelism = setup.Options.Threads > 0 ? setup.Options.Threads : Environment.ProcessorCount,
            CancellationToken = cancel,
        };
        Parallel.For(
            0,
            count,
            options,
            () => idle.TryTake(out var worker) ? worker : new ScanWorker(setup),
            (i, _, worker) =>
            {
                worker.Compute(firstScan + i, results[i]);
                return worker;
            },
            idle.Add);
    }
}
