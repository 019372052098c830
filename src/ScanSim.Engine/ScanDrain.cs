using System.Runtime.InteropServices;
using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>Takes finished scans in order: extracts plots, hands all rows to the sink. The sequential end of the run.</summary>
internal sealed class ScanDrain(RunSetup setup, IRecordingSink sink)
{
    private readonly PlotExtractor extractor = new(setup);
    private readonly List<PlotRow> plots = [];
    private readonly List<HitRow> hitRows = [];
    private readonly Queue<ScanRow> openScans = [];

    /// <summary>Takes a batch on another thread, or at once when the run has only one.</summary>
    public Task Start(ScanBatch batch, Action<int, int>? progress)
    {
        if (setup.Options.Threads == 1)
        {
            Take(batch, progress);
            return Task.CompletedTask;
        }

        return Task.Run(() => Take(batch, progress));
    }

    public void Finish()
    {
        plots.Clear();
        extractor.Finish(plots);
        Count(plots);
        sink.AddPlots(CollectionsMarshal.AsSpan(plots));
        WriteScansUpTo(double.PositiveInfinity);
    }

    private void Take(ScanBatch batch, Action<int, int>? progress)
    {
        var done = 0;
        foreach (var result in batch.Results)
        {
            Take(result);
            done = result.Scan + 1;
        }

        progress?.Invoke(done, setup.Timeline.ScanCount);
    }

    private void Take(ScanResult result)
    {
        var endS = setup.Timeline.ScanEndS(result.Scan);
        openScans.Enqueue(new ScanRow
        {
            Scan = result.Scan,
            StartS = setup.Timeline.ScanStartS(result.Scan),
            EndS = endS,
            Looks = result.LookCount,
            Hits = result.Hits.Count,
            FalseHits = result.FalseHitCount,
            Plots = 0,
            FalsePlots = 0,
        });
        sink.AddTruth(CollectionsMarshal.AsSpan(result.Truth));
        sink.AddLooks(CollectionsMarshal.AsSpan(result.Looks));
        WriteHits(result.Hits);
        plots.Clear();
        var completeS = extractor.Take(result.Hits, setup.Timeline.FirstDwell(result.Scan + 1), endS, plots);
        Count(plots);
        sink.AddPlots(CollectionsMarshal.AsSpan(plots));
        WriteScansUpTo(completeS);
    }

    private void WriteHits(List<Hit> hits)
    {
        hitRows.Clear();
        foreach (var hit in hits)
        {
            hitRows.Add(new HitRow
            {
                TimeS = hit.TimeS,
                Scan = hit.Scan,
                Dwell = hit.Dwell,
                BeamAzimuthDeg = hit.BeamAzimuthRad * Angles.DegPerRad,
                RangeM = hit.RangeM,
                SnrDb = Physics.Decibels.FromRatio(hit.SummedSnrRatio / hit.Pulses),
                Kind = hit.Kind,
                Target = hit.Target,
            });
        }

        sink.AddHits(CollectionsMarshal.AsSpan(hitRows));
    }

    /// <summary>Adds the plots to the counts of their scans, which are still open.</summary>
    private void Count(List<PlotRow> finished)
    {
        if (finished.Count == 0)
        {
            return;
        }

        var rows = openScans.ToArray();
        foreach (var plot in finished)
        {
            ref var row = ref rows[plot.Scan - rows[0].Scan];
            row = row with { Plots = row.Plots + 1, FalsePlots = row.FalsePlots + (plot.Kind == EchoKind.Noise ? 1 : 0) };
        }

        openScans.Clear();
        foreach (var row in rows)
        {
            openScans.Enqueue(row);
        }
    }

    private void WriteScansUpTo(double completeS)
    {
        while (openScans.Count > 0 && openScans.Peek().EndS <= completeS)
        {
            sink.AddScan(openScans.Dequeue());
        }
    }
}
