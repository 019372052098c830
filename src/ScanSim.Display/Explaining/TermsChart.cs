using System.Collections.Immutable;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Explaining;

/// <summary>
/// Losses stacked from the free-space SNR of the nearest look (or from need, if that look lies below it) downwards, so that their lower edge is the SNR of each look; the SNR that
/// was needed as dashed lines; misses marked on the SNR; a strip with the outcome of each pass.
/// </summary>
internal sealed class TermsChart(Sheet sheet, TargetStory story, ChartData data, DateTimeOffset startUtc, RangeUnit unit)
{
    private const string Caution = "Planning estimate from models, not proof of performance.";
    private const float MarkRadius = 4;

    private static readonly SKRect Plot = new(74, 118, 1076, 618);
    private static readonly SKRect Strip = new(Plot.Left, Plot.Bottom + 6, Plot.Right, Plot.Bottom + 20);

    private readonly ChartAxes axes = new(sheet, data, startUtc, Plot, Strip);

    public void Paint(string title, PictureSize size)
    {
        var colours = sheet.Colours;
        sheet.Rect(new SKRect(0, 0, size.Width, size.Height), colours.Ground);
        sheet.Text(sheet.Fit(title, TextStyle.Title, size.Width - 32), 16, 30, TextStyle.Title, colours.Ink);
        sheet.Text(Subtitle(), 16, 50, TextStyle.Body, colours.Quiet);
        ChartLegend.Paint(sheet, data, unit, new SKRect(Plot.Left, 62, Plot.Right, Plot.Top));
        axes.Paint();
        sheet.Canvas.Save();
        sheet.Canvas.ClipRect(Plot);
        PaintAreas();
        PaintSnr();
        PaintNeeds();
        PaintMarks();
        sheet.Canvas.Restore();
        LabelNeeds();
        PaintStrip();
        sheet.Frame(Plot, 1, colours.Rule);
        sheet.Text(Caution, 16, size.Height - 12, TextStyle.Small, colours.Quiet);
    }

    private string Subtitle()
    {
        var inView = story.Passes.Count(p => p.InView);
        var seen = story.Passes.Count(p => p.InView && p.HasPlot);
        var target = story.Target;
        return $"{target.Class}, {target.RcsM2:0.####} m², fluctuation case {target.FluctuationCase}: in view in {inView} of {story.Passes.Length} scans, with a plot in {seen}";
    }

    private void PaintAreas()
    {
        foreach (var run in data.Runs())
        {
            var upper = run.Select(_ => data.TopDb).ToArray();
            foreach (var term in Enum.GetValues<LookTerm>())
            {
                var lower = run.Select((p, i) => upper[i] - LossDb(p.Look, term)).ToArray();
                using var area = new SKPath();
                Trace(area, run, upper, lower);
                sheet.Fill(area, TermColours.Of(term));
                upper = lower;
            }
        }
    }

    /// <summary>Range counts from the nearest look here, so that no loss is negative.</summary>
    private double LossDb(LookExplanation look, LookTerm term)
    {
        var lossDb = term == LookTerm.Range ? data.TopDb - look.FreeSpaceSnrDb : look.LossDb(term);
        return double.IsFinite(lossDb) ? lossDb : data.HighestDb - data.LowestDb;
    }

    private void Trace(SKPath path, ImmutableArray<ChartPoint> run, double[] upper, double[] lower)
    {
        path.MoveTo(axes.At(run[0].TimeS - data.HalfStepS, upper[0]));
        for (var i = 0; i < run.Length; i++)
        {
            path.LineTo(axes.At(run[i].TimeS, upper[i]));
        }

        path.LineTo(axes.At(run[^1].TimeS + data.HalfStepS, upper[^1]));
        path.LineTo(axes.At(run[^1].TimeS + data.HalfStepS, lower[^1]));
        for (var i = run.Length - 1; i >= 0; i--)
        {
            path.LineTo(axes.At(run[i].TimeS, lower[i]));
        }

        path.LineTo(axes.At(run[0].TimeS - data.HalfStepS, lower[0]));
        path.Close();
    }

    private void PaintSnr()
    {
        using var line = new SKPath();
        foreach (var run in data.Runs())
        {
            line.MoveTo(axes.At(run[0].TimeS - data.HalfStepS, run[0].Look.Row.SnrDb));
            foreach (var point in run)
            {
                line.LineTo(axes.At(point.TimeS, point.Look.Row.SnrDb));
            }

            line.LineTo(axes.At(run[^1].TimeS + data.HalfStepS, run[^1].Look.Row.SnrDb));
        }

        sheet.Outline(line, 1.2f, sheet.Colours.Ink);
    }

    private void PaintNeeds()
    {
        foreach (var (neededDb, _, colour) in Needs())
        {
            ChartLegend.Dashes(sheet, axes.At(data.FromS, neededDb), Plot.Right, colour);
        }
    }

    private void LabelNeeds()
    {
        var last = float.NegativeInfinity;
        foreach (var (neededDb, text, _) in Needs().OrderByDescending(n => n.NeededDb))
        {
            var y = Math.Max(axes.At(0, neededDb).Y + 4, last + 14);
            sheet.Text(text, Plot.Right + 6, y, TextStyle.Small, sheet.Colours.Ink);
            last = y;
        }
    }

    /// <summary>With several PRFs dwells may differ in their pulses: then each has its lines.</summary>
    private IEnumerable<(double NeededDb, string Text, SKColor Colour)> Needs()
    {
        var byPulses = data.Points.Select(p => p.Look).DistinctBy(l => l.Row.Pulses).ToList();
        foreach (var look in byPulses)
        {
            var pulses = byPulses.Count > 1 ? $", {look.Row.Pulses} pulses" : "";
            yield return (look.NeededDb, $"Pd 0.5: {look.NeededDb:0.0} dB{pulses}", sheet.Colours.Ink);
            yield return (look.NeededForWantedDb, $"Pd {look.WantedPd:0.####}: {look.NeededForWantedDb:0.0} dB{pulses}", sheet.Colours.Quiet);
        }
    }

    private void PaintMarks()
    {
        foreach (var group in data.Points.Where(p => p.Outcome is not (LookOutcome.Detected or LookOutcome.NoLook)).GroupBy(p => p.Outcome))
        {
            Glyphs.Outcomes(sheet, group.Key, [.. group.Select(p => axes.At(p.TimeS, Math.Max(p.Look.Row.SnrDb, data.LowestDb)))], MarkRadius);
        }
    }

    private void PaintStrip()
    {
        foreach (var group in data.Outcomes.GroupBy(o => o.Outcome))
        {
            using var boxes = new SKPath();
            foreach (var (timeS, _) in group)
            {
                var left = Math.Max(axes.At(timeS - data.HalfStepS, 0).X, Strip.Left);
                var right = Math.Min(axes.At(timeS + data.HalfStepS, 0).X, Strip.Right);
                boxes.AddRect(new SKRect(left, Strip.Top, right, Strip.Bottom));
            }

            sheet.Fill(boxes, sheet.Colours.Outcomes[(int)group.Key]);
        }

        sheet.Text(data.EachLook ? "each look" : "each pass", Strip.Right + 6, Strip.Bottom - 3, TextStyle.Small, sheet.Colours.Quiet);
    }
}
