using System.Collections.Immutable;
using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Painting;
using ScanSim.Display.Explaining;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>A target's story as text: a summary, the reasons with their shares, the terms that cost most, and the looks.</summary>
internal static class ExplainReport
{
    private const int StretchesShown = 5;

    /// <summary>Of the longest stretch when nothing else was asked for; more is had with --from and --to.</summary>
    private const int MostPassesUnasked = 40;

    public static void Write(TextWriter output, Scenario scenario, TargetStory story, RangeUnit unit, bool whole)
    {
        WriteSummary(output, scenario, story, unit);
        WriteOutcomes(output, story);
        WriteTerms(output, story);
        if (!whole)
        {
            output.WriteLine();
            LookTableText.Write(output, story.Passes, unit);
            return;
        }

        var stretches = story.MissedStretches();
        WriteStretches(output, stretches, unit);
        output.WriteLine();
        if (stretches.IsEmpty)
        {
            output.WriteLine(story.Passes.Any(p => p.InView) ? "It gave a plot in every scan in which it was in view. The looks closest to a miss:" : "It was never in view:");
            LookTableText.Write(output, ClosestToAMiss(story), unit);
            return;
        }

        var longest = stretches[0];
        output.WriteLine(Line($"The looks of the longest stretch, scans {longest[0].Scan} to {longest[^1].Scan}:"));
        LookTableText.Write(output, longest[..Math.Min(longest.Length, MostPassesUnasked)], unit);
        if (longest.Length > MostPassesUnasked)
        {
            output.WriteLine(Line($"and {longest.Length - MostPassesUnasked} more scans: --from \"{Math.Floor(longest[0].TimeS)} s\" --to \"{Math.Ceiling(longest[^1].TimeS)} s\" shows them all."));
        }
    }

    private static void WriteSummary(TextWriter output, Scenario scenario, TargetStory story, RangeUnit unit)
    {
        var target = story.Target;
        output.WriteLine(scenario.Name);
        output.WriteLine(Line($"target {target.Id} ({target.Class}), {target.RcsM2:0.####} m², fluctuation case {target.FluctuationCase}, from {story.FromS:0.0} s to {story.ToS:0.0} s"));
        var looks = story.Passes.Select(p => p.Best).OfType<LookExplanation>().DistinctBy(l => l.Row.Pulses).OrderBy(l => l.Row.Pulses);
        foreach (var look in looks)
        {
            output.WriteLine(Line(
                $"{look.Row.Pulses} pulses, Pfa {scenario.Radar.Processing.FalseAlarmProbability:0.##E+0}: needs {look.NeededDb:0.00} dB per pulse for Pd 0.5, {look.NeededForWantedDb:0.00} dB for Pd {look.WantedPd:0.####}; in free space, with the dwell centred on it, out to {RangeText.Precise(look.EvenOddsRangeM, unit)} and {RangeText.Precise(look.WantedRangeM, unit)}"));
        }

        var inView = story.Passes.Count(p => p.InView);
        var seen = story.Passes.Count(p => p.InView && p.HasPlot);
        var share = inView > 0 ? Line($" ({100.0 * seen / inView:0} %)") : "";
        output.WriteLine(Line($"in view in {inView} of {story.Passes.Length} scans, with a plot in {seen} of these{share}"));
        output.WriteLine();
    }

    private static void WriteOutcomes(TextWriter output, TargetStory story) => TextTable.Write(
        output,
        ["what became of it", ">scans", ">share"],
        story.Outcomes().Select(o => new[] { Words(o.Outcome), Line($"{o.Passes}"), Line($"{100.0 * o.Passes / story.Passes.Length:0.0} %") }));

    private static void WriteTerms(TextWriter output, TargetStory story)
    {
        var terms = Enum.GetValues<LookTerm>();
        var missed = terms.Sum(story.CostliestIn);
        if (missed == 0)
        {
            return;
        }

        output.WriteLine();
        TextTable.Write(
            output,
            ["term", ">mean loss, missed", ">mean loss, seen", ">difference", ">cost most in"],
            terms.OrderByDescending(story.CostliestIn).ThenByDescending(t => DifferenceDb(story, t)).Select(t => new[]
            {
                Words(t), Loss(story.MeanLossDb(t, missed: true)), Loss(story.MeanLossDb(t, missed: false)), Loss(DifferenceDb(story, t)), Line($"{story.CostliestIn(t)} of {missed} missed looks"),
            }));
        var costliest = terms.MaxBy(story.CostliestIn);
        output.WriteLine(Line($"The term that cost most: {Words(costliest)}, in {story.CostliestIn(costliest)} of {missed} missed looks."));
        var telling = terms.MaxBy(t => DifferenceDb(story, t));
        if (DifferenceDb(story, telling) > 0)
        {
            output.WriteLine(Line($"What set missed looks apart from seen ones most: {Words(telling)}, {DifferenceDb(story, telling):0.0} dB in the mean."));
        }

        output.WriteLine("Losses are against free space with the dwell centred on the target; range counts from where Pd is 0.5, and below 0 it is in hand.");
    }

    private static double DifferenceDb(TargetStory story, LookTerm term) => story.MeanLossDb(term, missed: true) - story.MeanLossDb(term, missed: false);

    private static void WriteStretches(TextWriter output, ImmutableArray<ImmutableArray<TargetPass>> stretches, RangeUnit unit)
    {
        if (stretches.IsEmpty)
        {
            return;
        }

        output.WriteLine();
        TextTable.Write(
            output,
            [stretches.Length > StretchesShown ? Line($"longest of {stretches.Length} stretches unseen in view") : "stretches unseen in view", ">scans", ">from", ">to", ">at range", ">to range", "mostly"],
            stretches.Take(StretchesShown).Select(s => new[]
            {
                Line($"{s[0].Scan} to {s[^1].Scan}"),
                Line($"{s.Length}"),
                Line($"{s[0].TimeS:0.0} s"),
                Line($"{s[^1].TimeS:0.0} s"),
                RangeText.Precise(s[0].Truth!.Value.RangeM, unit),
                RangeText.Precise(s[^1].Truth!.Value.RangeM, unit),
                Words(s.GroupBy(p => p.Outcome).MaxBy(g => g.Count())!.Key),
            }));
    }

    private static IEnumerable<TargetPass> ClosestToAMiss(TargetStory story)
    {
        const int Shown = 10;
        var looked = story.Passes.Where(p => p.InView).OrderBy(p => p.Best?.MarginDb ?? double.NegativeInfinity).Take(Shown).OrderBy(p => p.Scan).ToList();
        return looked.Count > 0 ? looked : story.Passes;
    }

    private static string Words(PassOutcome outcome) => outcome switch
    {
        PassOutcome.Seen => "seen",
        PassOutcome.Range => "missed: range",
        PassOutcome.AzimuthBeam => "missed: off the beam's azimuth",
        PassOutcome.ElevationBeam => "missed: off the beam's elevation",
        PassOutcome.Eclipsing => "missed: eclipsed",
        PassOutcome.Chance => "missed by chance (Pd 0.5 or more)",
        PassOutcome.SharedCell => "missed in one cell with another target",
        PassOutcome.HitWithoutPlot => "hit, but no plot",
        PassOutcome.TooWeakForLook => "too weak for a look",
        PassOutcome.NoDwell => "no dwell met it",
        PassOutcome.BelowHorizon => "below the horizon",
        PassOutcome.BeyondInstrumentedRange => "beyond the instrumented range",
        PassOutcome.Blanked => "in a blanked sector",
        _ => "outside the sector scan",
    };

    private static string Words(LookTerm term) => term switch
    {
        LookTerm.Range => "range",
        LookTerm.AzimuthBeam => "azimuth beam",
        LookTerm.ElevationBeam => "elevation beam",
        _ => "eclipsing",
    };

    private static string Loss(double lossDb) => double.IsNaN(lossDb) ? "–" : Line($"{Math.Round(lossDb, 1) + 0.0:0.0} dB");

    private static string Line(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
