using ScanSim.Recordings;

namespace ScanSim.Benchmarks;

/// <summary>Counts rows and forgets them.</summary>
internal sealed class NullSink : IRecordingSink
{
    public long Looks { get; private set; }

    public void AddScan(in ScanRow row) => Looks += row.Looks;

    public void AddLooks(ReadOnlySpan<LookRow> rows)
    {
    }

    public void AddHits(ReadOnlySpan<HitRow> rows)
    {
    }

    public void AddPlots(ReadOnlySpan<PlotRow> rows)
    {
    }

    public void AddTruth(ReadOnlySpan<TruthRow> rows)
    {
    }
}
