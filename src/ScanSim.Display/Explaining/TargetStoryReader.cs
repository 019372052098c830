using System.Collections.Immutable;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Explaining;

/// <summary>Gathers one target's story from a recording that kept looks.</summary>
public sealed class TargetStoryReader(Recording recording, Scenario scenario, LookExplainer explainer)
{
    /// <summary>A plot belongs to the pass that is no further away in time than half the widest plot, as runs count it.</summary>
    private readonly double reachS = scenario.Radar.PlotReachS;

    /// <summary>The scans of a span of time; a scan that is cut by its ends is told as far as it lies within.</summary>
    public TargetStory Read(Target target, double fromS, double toS) => Read(target, fromS, toS, scan: null);

    /// <summary>One scan.</summary>
    public TargetStory Read(Target target, in ScanRow scan) => Read(target, scan.StartS, scan.EndS, scan.Scan);

    private TargetStory Read(Target target, double fromS, double toS, int? scan)
    {
        var looks = Looks(target.Id, fromS, toS, scan);
        var plots = Plots(target.Id, fromS, toS);
        var truth = recording.Truth(fromS, toS)
            .Where(t => IsOf(t.Target, target.Id) && (scan is null || t.Scan == scan))
            .ToDictionary(t => t.Scan);
        var passes = truth.Keys.Union(looks.Keys).Order()
            .Select(s => PassOf(s, truth.TryGetValue(s, out var row) ? row : null, looks.GetValueOrDefault(s, []), plots));
        return new TargetStory { Target = target, FromS = fromS, ToS = toS, Passes = [.. passes] };
    }

    private Dictionary<int, List<LookExplanation>> Looks(string id, double fromS, double toS, int? scan)
    {
        var rows = new List<LookRow>();
        var cells = new CellMates();
        foreach (var row in recording.Looks(fromS, toS))
        {
            cells.Add(row);
            if (IsOf(row.Target, id) && (scan is null || row.Scan == scan))
            {
                rows.Add(row);
            }
        }

        return rows
            .Select(row => explainer.Explain(row, cells.Of(row)))
            .GroupBy(look => look.Row.Scan)
            .ToDictionary(g => g.Key, g => g.OrderBy(look => look.Row.TimeS).ToList());
    }

    /// <summary>The plots that hold the target's echo, by time.</summary>
    private SortedList<double, string> Plots(string id, double fromS, double toS)
    {
        var plots = new SortedList<double, string>();
        foreach (var plot in recording.Plots(fromS - 2 * reachS, toS + 2 * reachS))
        {
            if (plot.Kind == EchoKind.Target && plot.Target.Split('+').Contains(id, StringComparer.Ordinal))
            {
                plots.TryAdd(plot.TimeS, plot.Target);
            }
        }

        return plots;
    }

    /// <summary>Others in a plot of the target within a time of a pass; null when there is no such plot.</summary>
    private static string? OthersInPlot(SortedList<double, string> plots, string id, double timeS, double withinS)
    {
        var near = plots.Where(p => Math.Abs(p.Key - timeS) <= withinS).Select(p => p.Value).FirstOrDefault();
        return near is null ? null : string.Join(" and ", near.Split('+').Where(other => !IsOf(other, id)));
    }

    private TargetPass PassOf(int scan, TruthRow? truth, List<LookExplanation> looks, SortedList<double, string> plots)
    {
        var best = looks.OrderByDescending(l => l.Row.Detected).ThenByDescending(l => l.Row.SnrDb).FirstOrDefault();
        var timeS = truth?.TimeS ?? best!.Row.TimeS;
        var hasPlot = HasPlot(plots, timeS);
        var (outcome, reason) = OutcomeOf(truth, best, hasPlot, plots);
        ImmutableArray<LookExplanation> told = [.. looks.Where(l => ReferenceEquals(l, best) || l.Row.Detected || Math.Abs(l.Row.TimeS - timeS) <= reachS)];
        return new TargetPass
        {
            Scan = scan,
            TimeS = timeS,
            Truth = truth,
            Looks = told,
            SideLooks = looks.Count - told.Length,
            Best = best,
            HasPlot = hasPlot,
            Outcome = outcome,
            Reason = reason,
        };
    }

    private (PassOutcome Outcome, string Reason) OutcomeOf(TruthRow? truth, LookExplanation? best, bool hasPlot, SortedList<double, string> plots)
    {
        if (hasPlot)
        {
            return (PassOutcome.Seen, best is { Row.Detected: true } ? best.Reason : "seen in a look that counts to the neighbouring scan");
        }

        if (truth is { } row && (best is null || row.View != TargetView.InView))
        {
            var noLook = explainer.Explain(row);
            return (noLook.Outcome, noLook.Reason);
        }

        return best!.Row.Detected ? (PassOutcome.HitWithoutPlot, best.Reason + WithoutPlot(truth, best, plots)) : (best.Outcome, best.Reason);
    }

    private string WithoutPlot(TruthRow? truth, LookExplanation best, SortedList<double, string> plots)
    {
        if (truth is not { } row || Math.Abs(best.Row.TimeS - row.TimeS) > reachS)
        {
            return ", through a side lobe: no plot where it was";
        }

        // A plot is no wider than the widest one, so one that holds this echo lies within that.
        if (OthersInPlot(plots, row.Target, row.TimeS, 2 * reachS) is { Length: > 0 } others)
        {
            return $", but its echo went into a plot with {others}, away from where it was";
        }

        var minimum = scenario.Radar.Plots.MinimumHits;
        return minimum > 1 ? $", no plot: fewer than the {minimum} hits that make one" : ", no plot where it was";
    }

    private bool HasPlot(SortedList<double, string> plots, double timeS)
    {
        var (low, high) = (0, plots.Count);
        while (low < high)
        {
            var middle = (low + high) / 2;
            (low, high) = plots.Keys[middle] < timeS - reachS ? (middle + 1, high) : (low, middle);
        }

        return low < plots.Count && plots.Keys[low] <= timeS + reachS;
    }

    private static bool IsOf(string target, string id) => string.Equals(target, id, StringComparison.Ordinal);
}
