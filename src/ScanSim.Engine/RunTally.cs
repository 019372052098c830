using System.Collections.Immutable;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Counts what a run gave on its way to another sink; memory does not grow with the run.</summary>
public sealed class RunTally : IRecordingSink
{
    private readonly IRecordingSink next;
    private readonly Dictionary<string, TargetTally> targets;
    private readonly ImmutableArray<string> ids;

    /// <summary>Begins to count.</summary>
    /// <param name="scenario">Gives the targets, and how long the beam takes over the widest plot.</param>
    /// <param name="next">Where the rows go on to.</param>
    public RunTally(Scenario scenario, IRecordingSink next)
    {
        this.next = next;
        ids = [.. scenario.Targets.Select(t => t.Id)];
        targets = ids.ToDictionary(id => id, id => new TargetTally(id, scenario.Radar.PlotReachS), StringComparer.Ordinal);
    }

    public int Scans { get; private set; }

    public long Looks { get; private set; }

    public long Hits { get; private set; }

    public long FalseHits { get; private set; }

    public long Plots { get; private set; }

    public long FalsePlots { get; private set; }

    /// <summary>In the scenario's order.</summary>
    public IEnumerable<TargetTally> Targets => ids.Select(id => targets[id]);

    /// <summary>Counts the passes that are still open; call it when the run is over.</summary>
    public void Finish()
    {
        foreach (var target in targets.Values)
        {
            target.Finish();
        }
    }

    public void AddScan(in ScanRow row)
    {
        Scans++;
        Looks += row.Looks;
        Hits += row.Hits;
        FalseHits += row.FalseHits;
        next.AddScan(row);
    }

    public void AddLooks(ReadOnlySpan<LookRow> rows) => next.AddLooks(rows);

    public void AddHits(ReadOnlySpan<HitRow> rows) => next.AddHits(rows);

    public void AddPlots(ReadOnlySpan<PlotRow> rows)
    {
        foreach (ref readonly var row in rows)
        {
            Plots++;
            if (row.Kind == EchoKind.Noise)
            {
                FalsePlots++;
                continue;
            }

            foreach (var id in row.Target.Split('+'))
            {
                targets[id].AddPlot(row);
            }
        }

        next.AddPlots(rows);
    }

    public void AddTruth(ReadOnlySpan<TruthRow> rows)
    {
        foreach (ref readonly var row in rows)
        {
            targets[row.Target].AddTruth(row);
        }

        next.AddTruth(rows);
    }
}
