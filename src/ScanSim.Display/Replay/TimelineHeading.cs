using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>The timeline's title, the order of its rows, and what its marks mean.</summary>
internal sealed class TimelineHeading(Sheet sheet, ReplayState state, ReplayWorld world, ReplayLayout layout)
{
    private const float SwatchWidth = 20;

    public void Paint()
    {
        var area = layout.Timeline;
        sheet.Text("Scan timeline", area.Left + 16, area.Top + 17, TextStyle.Strong, sheet.Colours.Ink);
        var order = TimelineHeadBox.Order(layout);
        var part = world.Rows.Length > layout.RowsFitting ? $" {state.FirstRow + 1}–{state.FirstRow + layout.RowsFitting} of {world.Rows.Length}" : "";
        sheet.Text($"rows{part} by {OrderText(state.Order)}", order.Right, area.Top + 17, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
        sheet.Text(world.IsComparison ? "blip/scan %" : "blip/scan", area.Right - 14, layout.Rows.Top - 4, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        var start = area.Left + 16 + sheet.Width("Scan timeline", TextStyle.Strong) + 24;
        var (x, y, end) = (start, area.Top + 17, order.Left);
        var inColumns = RowPainter.IsInColumns(layout.Rows.Width, state.TimelineToS - state.TimelineFromS, world.Recordings.Max(r => r.Scene.Beam.PeriodS));
        foreach (var (text, paint) in Entries(inColumns))
        {
            var needed = SwatchWidth + sheet.Width(text, TextStyle.Small) + 16;
            if (x + needed > end)
            {
                (x, y, end) = (start, area.Top + 33, area.Right);
            }

            paint(new SKPoint(x + 7, y - 4));
            sheet.Text(text, x + SwatchWidth, y, TextStyle.Small, sheet.Colours.Quiet);
            x += needed;
        }

        if (!world.IsComparison && !inColumns)
        {
            PaintShades(y > area.Top + 20 ? x : start, area.Top + 33);
        }
    }

    private static string OrderText(RowOrder order) => order switch
    {
        RowOrder.Id => "id",
        RowOrder.FirstDetection => "first detection",
        RowOrder.WorstGap => "worst gap",
        _ => "scenario",
    };

    private IEnumerable<(string Text, Action<SKPoint> Paint)> Entries(bool inColumns)
    {
        if (world.IsComparison)
        {
            return Enum.GetValues<ComparedOutcome>().Select(outcome => (ComparedGlyphs.TextOf(outcome), (Action<SKPoint>)(centre =>
            {
                if (inColumns)
                {
                    ComparedGlyphs.Fill(sheet, outcome, Swatch(centre));
                }
                else
                {
                    ComparedGlyphs.Draw(sheet, outcome, [centre], 4.5f);
                }
            })));
        }

        return TimelineHead.Occurring(world.First.Scene).Select(outcome => (OutcomeText.Of(outcome), (Action<SKPoint>)(centre =>
        {
            if (inColumns)
            {
                OutcomeTexture.Fill(sheet, outcome, Swatch(centre));
            }
            else
            {
                Glyphs.Outcome(sheet, outcome, centre, 4.5f);
            }
        })));
    }

    private static SKRect Swatch(SKPoint centre) => new(centre.X - 7, centre.Y - 5, centre.X + 9, centre.Y + 5);

    private void PaintShades(float left, float baseline)
    {
        var shades = world.First.Shades;
        string[] texts = [$"below {shades.LowDb:0}", $"{shades.LowDb:0} to {shades.MiddleDb:0}", $"{shades.MiddleDb:0} to {shades.HighDb:0}", $"above {shades.HighDb:0} dB"];
        if (left + sheet.Width("SNR" + string.Concat(texts), TextStyle.Small) + 10 + 28 * texts.Length > layout.Timeline.Right)
        {
            return;
        }

        var x = sheet.Text("SNR", left, baseline, TextStyle.Small, sheet.Colours.Quiet) + 10;
        for (var shade = 0; shade < SnrShades.Count; shade++)
        {
            Glyphs.Outcomes(sheet, LookOutcome.Detected, [new SKPoint(x + 5, baseline - 4)], 4.5f, SnrShades.Alpha(shade));
            x = sheet.Text(texts[shade], x + 14, baseline, TextStyle.Small, sheet.Colours.Quiet) + 14;
        }
    }
}
