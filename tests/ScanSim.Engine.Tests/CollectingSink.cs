using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine.Tests;

/// <summary>Keeps all rows in memory.</summary>
internal sealed class CollectingSink : IRecordingSink
{
    public List<ScanRow> Scans { get; } = [];

    public List<LookRow> Looks { get; } = [];

    public List<HitRow> Hits { get; } = [];

    public List<PlotRow> Plots { get; } = [];

    public List<TruthRow> Truth { get; } = [];

    public static CollectingSink Of(Scenario scenario, RunOptions? options = null)
    {
        var sink = new CollectingSink();
        Run.Execute(scenario, options ?? new RunOptions { Looks = LooksKept.All }, sink, progress: null, CancellationToken.None);
        return sink;
    }

    public void AddScan(in ScanRow row) => Scans.Add(row);

    public void AddLooks(ReadOnlySpan<LookRow> rows) => Looks.AddRange(rows);

    public void AddHits(ReadOnlySpan<HitRow> rows) => Hits.AddRange(rows);

    public void AddPlots(ReadOnlySpan<PlotRow> rows) => Plots.AddRange(rows);

    public void AddTruth(ReadOnlySpan<TruthRow> rows) => Truth.AddRange(rows);

    /// <summary>Fails at the first row that differs.</summary>
    public void AssertSame(CollectingSink other)
    {
        Assert.Equal(Scans, other.Scans);
        Assert.Equal(Looks, other.Looks);
        Assert.Equal(Hits, other.Hits);
        Assert.Equal(Plots, other.Plots);
        Assert.Equal(Truth, other.Truth);
    }
}
