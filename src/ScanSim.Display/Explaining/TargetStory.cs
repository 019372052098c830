using System.Collections.Immutable;
using ScanSim.Scenarios;

namespace ScanSim.Display.Explaining;

/// <summary>The passes of the beam over one target during a span of time, each with its reason.</summary>
public sealed record TargetStory
{
    public required Target Target { get; init; }

    public required double FromS { get; init; }

    public required double ToS { get; init; }

    /// <summary>In order of scans.</summary>
    public required ImmutableArray<TargetPass> Passes { get; init; }

    /// <summary>Passes by outcome, seen ones too; the most frequent first.</summary>
    public IEnumerable<(PassOutcome Outcome, int Passes)> Outcomes() => Passes
        .GroupBy(p => p.Outcome)
        .Select(g => (g.Key, g.Count()))
        .OrderByDescending(g => g.Item2)
        .ThenBy(g => g.Key);

    /// <summary>Mean loss by a term over the best looks of the missed (or the seen) passes; NaN when there are none with a finite one.</summary>
    public double MeanLossDb(LookTerm term, bool missed) => MeanOrNaN(BestLooks(missed).Select(l => l.LossDb(term)));

    /// <summary>Missed passes in which this term cost most.</summary>
    public int CostliestIn(LookTerm term) => BestLooks(missed: true).Count(l => l.Costliest.Term == term);

    /// <summary>Stretches of passes in view without a plot, one after the other; the longest first.</summary>
    public ImmutableArray<ImmutableArray<TargetPass>> MissedStretches()
    {
        var stretches = new List<ImmutableArray<TargetPass>>();
        for (var first = 0; first < Passes.Length; first++)
        {
            var end = first;
            while (end < Passes.Length && Passes[end].IsMissed)
            {
                end++;
            }

            if (end > first)
            {
                stretches.Add(Passes[first..end]);
                first = end;
            }
        }

        return [.. stretches.OrderByDescending(s => s.Length)];
    }

    private IEnumerable<LookExplanation> BestLooks(bool missed) => Passes
        .Where(p => missed ? p.IsMissed : p.InView && p.HasPlot)
        .Select(p => p.Best)
        .OfType<LookExplanation>();

    private static double MeanOrNaN(IEnumerable<double> valuesDb)
    {
        var finite = valuesDb.Where(double.IsFinite).ToList();
        return finite.Count == 0 ? double.NaN : finite.Average();
    }
}
