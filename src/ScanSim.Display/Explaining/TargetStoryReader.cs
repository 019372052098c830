using System.Collections.Immutable;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Explaining;

/// <summary>Gathers one target's story from a recording that kept looks.</summary>
public sealed class TargetStoryReader(Recording recording, Scenario scenario, LookExplainer explainer)
{
    /// <summary>A plot belongs to the pass that is no further away in time than half the widest plot, as runs count it.</summary>
    private readonly double reachS = 0.5 * scenario.Radar.Plots.MaximumWidthRad / BeamRadPerS(scenario.Radar.Scan);

    /// <summary>The scans of a span of time; a scan that is cut by its ends is told as far as it lies within.</summary>
    public TargetStory Read(Target target, double fromS, double toS) => Read(target, fromS, toS, scan: null);

    /// <summary>One scan.</summary>
    public TargetStory Read(Target target, in ScanRow scan) => Read(target, scan.StartS, scan.EndS, scan.Scan);

    private TargetStory Read(Target target, double fromS, double toS, int? scan)
    {
        var looks = Looks(target.Id, fromS, toS, scan);
        var plotTimesS = PlotTimesS(target.Id, fromS, toS);
        var truth = recording.Truth(fromS, toS)
            .Where(t => IsOf(t.Target, target.Id) && (scan is null || t.Scan == scan))
            .ToDictionary(t => t.Scan);
        var passes = truth.Keys.Union(looks.Keys).Order()
            .Select(s => PassOf(s, truth.TryGetValue(s, out var row) ? row : null, looks.GetValueOrDefault(s, []), plotTimesS));
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

    private List<double> PlotTimesS(string id, double fromS, double toS) => recording.Plots(fromS - reachS, toS + reachS)
        .Where(p => p.Kind == EchoKind.Target && p.Target.Split('+').Contains(id, StringComparer.Ordinal))
        .Select(p => p.TimeS)
        .Order()
        .ToList();

    private TargetPass PassOf(int scan, TruthRow? truth, List<LookExplanation> looks, List<double> plotTimesS)
    {
        var best = looks.OrderByDescending(l => l.Row.Detected).ThenByDescending(l => l.Row.SnrDb).FirstOrDefault();
        var timeS = truth?.TimeS ?? best!.Row.TimeS;
        var index = plotTimesS.BinarySearch(timeS - reachS);
        index = index < 0 ? ~index : index;
        var hasPlot = index < plotTimesS.Count && plotTimesS[index] <= timeS + reachS;
        var (outcome, reason) = OutcomeOf(truth, best, hasPlot);
        return new TargetPass
        {
            Scan = scan,
            TimeS = timeS,
            Truth = truth,
            Looks = [.. looks],
            Best = best,
            HasPlot = hasPlot,
            Outcome = outcome,
            Reason = reason,
        };
    }

    private (PassOutcome Outcome, string Reason) OutcomeOf(TruthRow? truth, LookExplanation? best, bool hasPlot)
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

        return best!.Row.Detected ? (PassOutcome.HitWithoutPlot, best.Reason + WithoutPlot(truth, best)) : (best.Outcome, best.Reason);
    }

    private string WithoutPlot(TruthRow? truth, LookExplanation best)
    {
        var minimum = scenario.Radar.Plots.MinimumHits;
        return truth is not { } row || Math.Abs(best.Row.TimeS - row.TimeS) > reachS ? ", through a side lobe: no plot where it was"
            : minimum > 1 ? $", no plot: fewer than the {minimum} hits that make one"
            : ", no plot where it was";
    }

    private static bool IsOf(string target, string id) => string.Equals(target, id, StringComparison.Ordinal);

    private static double BeamRadPerS(Scan scan) => scan switch
    {
        Scan.Rotation rotation => 2 * Math.PI / rotation.PeriodS,
        Scan.Sector sector => sector.RateRadPerS,
        _ => throw new InvalidOperationException("unknown kind of scan"),
    };
}
