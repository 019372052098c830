using System.Collections.Immutable;
using System.Runtime.InteropServices;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display;

/// <summary>Gathers the rows of a run or a recording into a <see cref="Scene"/>. Rows come in order of time, as a sink gets them.</summary>
public sealed class SceneBuilder : IRecordingSink
{
    private readonly Scenario scenario;
    private readonly Dictionary<string, TargetGathering> gatherings = new(StringComparer.Ordinal);
    private readonly List<ScanRow> scans = [];
    private readonly List<PlotMark> plots = [];
    private bool anyLooks;

    public SceneBuilder(Scenario scenario)
        : this(scenario, 0)
    {
    }

    /// <summary>The same with room for a known number of scans.</summary>
    internal SceneBuilder(Scenario scenario, int scans)
    {
        this.scenario = scenario;
        foreach (var target in scenario.Targets)
        {
            gatherings.Add(target.Id, new TargetGathering(target, scenario.Radar.PlotReachS, scans));
        }
    }

    /// <summary>Plots before this time count in the timeline but are not kept for the plan.</summary>
    public double PlotsFromS { get; init; } = double.NegativeInfinity;

    /// <summary>Plots after this time count in the timeline but are not kept for the plan.</summary>
    public double PlotsToS { get; init; } = double.PositiveInfinity;

    public void AddScan(in ScanRow row) => scans.Add(row);

    public void AddLooks(ReadOnlySpan<LookRow> rows)
    {
        foreach (ref readonly var row in rows)
        {
            Add(LookSummary.Of(row));
        }
    }

    /// <summary>Hits are not drawn yet; the plots made of them are.</summary>
    public void AddHits(ReadOnlySpan<HitRow> rows)
    {
    }

    public void AddPlots(ReadOnlySpan<PlotRow> rows)
    {
        foreach (ref readonly var row in rows)
        {
            if (row.TimeS >= PlotsFromS && row.TimeS <= PlotsToS)
            {
                plots.Add(MarkOf(row));
            }

            Add(PlotSummary.Of(row));
        }
    }

    public void AddTruth(ReadOnlySpan<TruthRow> rows)
    {
        foreach (ref readonly var row in rows)
        {
            Add(TruthSummary.Of(row));
        }
    }

    /// <summary>A look in short. Looks, plots and truth may be added by one thread each at the same time.</summary>
    internal void Add(in LookSummary row)
    {
        anyLooks = true;
        Of(row.Target, "looks").Add(row);
    }

    /// <summary>A plot that counts in the timeline only.</summary>
    internal void Add(in PlotSummary row)
    {
        if (row.Kind != EchoKind.Target)
        {
            return;
        }

        if (!row.Target.Contains('+', StringComparison.Ordinal))
        {
            Of(row.Target, "plots").AddPlot(row.TimeS);
            return;
        }

        foreach (var id in row.Target.Split('+'))
        {
            Of(id, "plots").AddPlot(row.TimeS);
        }
    }

    internal void Add(in TruthSummary row) => Of(row.Target, "truth").Add(row);

    public Scene Build()
    {
        // Plots close after the beam has passed: neighbours in azimuth may come in the other order.
        CollectionsMarshal.AsSpan(plots).Sort(static (a, b) => a.TimeS.CompareTo(b.TimeS));
        return new Scene
        {
            ScenarioName = scenario.Name,
            SiteName = scenario.Site.Name,
            InstrumentedRangeM = scenario.Radar.InstrumentedRangeM,
            Beam = new BeamMotion(scenario.Radar.Scan),
            BeamwidthRad = scenario.Radar.Antenna.Azimuth.BeamwidthRad,
            Blanked = scenario.Radar.Blanked,
            StartUtc = scenario.Run.Start,
            DurationS = scenario.Run.DurationS,
            Targets = [.. scenario.Targets.Select(t => gatherings[t.Id].Build(anyLooks))],
            Scans = [.. scans],
            Plots = [.. plots],
        };
    }

    /// <summary>A plot's place on the plan.</summary>
    internal static PlotMark MarkOf(in PlotRow row)
    {
        var (sin, cos) = Math.SinCos(row.AzimuthDeg * (Math.PI / 180));
        return new PlotMark(row.TimeS, row.Scan, (float)(row.RangeM * sin), (float)(row.RangeM * cos), row.Kind)
        {
            SnrDb = (float)row.SnrDb,
            Hits = row.Hits,
            Target = row.Target,
        };
    }

    private TargetGathering Of(string id, string table) => gatherings.TryGetValue(id, out var found)
        ? found
        : throw new PictureException($"The recording's {table} table names target '{id}', which its scenario '{scenario.Name}' does not have.");
}
