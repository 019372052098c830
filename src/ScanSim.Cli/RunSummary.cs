using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Painting;
using ScanSim.Engine;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>What a run gave, in a few lines and a table of the targets.</summary>
internal static class RunSummary
{
    private const string Never = "–";

    public static void Write(TextWriter output, Scenario scenario, RunTally tally, RangeUnit unit)
    {
        var perScan = tally.Scans > 0 ? (double)tally.FalsePlots / tally.Scans : 0;
        output.WriteLine(Line($"{scenario.Name}"));
        output.WriteLine(Line($"{tally.Scans} scans in {scenario.Run.DurationS:0.###} s, seed {scenario.Run.Seed}"));
        output.WriteLine(Line($"{tally.Looks} looks, {tally.Hits} hits ({tally.FalseHits} false), {tally.Plots} plots ({tally.FalsePlots} false, {perScan:0.###} a scan)"));
        output.WriteLine();
        TextTable.Write(
            output,
            ["target", "class", ">first plot", ">at range", ">scans in view", ">with a plot", ">share", ">longest gap"],
            tally.Targets.Zip(scenario.Targets, (t, target) => Row(t, target, unit)));
    }

    private static string[] Row(TargetTally tally, Target target, RangeUnit unit) =>
    [
        tally.Id,
        target.Class,
        tally.FirstPlotS is { } firstS ? Line($"{firstS:0.0} s") : Never,
        tally.FirstPlotRangeM is { } rangeM ? RangeText.Precise(rangeM, unit) : Never,
        Line($"{tally.ScansInView} of {tally.ScansAlive}"),
        Line($"{tally.ScansWithPlot}"),
        tally.BlipScanRatio is { } ratio ? Line($"{100 * ratio:0} %") : Never,
        tally.LongestGapS is { } gapS ? Line($"{gapS:0.0} s") : Never,
    ];

    private static string Line(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
