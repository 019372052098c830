using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Scans from left to right: a strip with plots and false plots, a row for each target, and the time shown as a line.</summary>
internal sealed class ReplayTimeline : IDisposable
{
    private readonly Layer layer = new();
    private readonly Dictionary<string, RowMarks> compared = new(StringComparer.Ordinal);

    public int Renewals => layer.Renewals;

    public void Paint(Frame frame, Sheet sheet, ReplayState state, ReplayWorld world, ReplayLayout layout)
    {
        var key = (state.TimelineFromS, state.TimelineToS, state.FirstRow, state.Order, state.Theme, state.Selected ?? "", state.Width);
        layer.Show(frame, layout.Timeline, key, canvas =>
        {
            using var own = frame.SheetOn(canvas, sheet.Colours);
            PaintStill(own, state, world, layout);
        });
        PaintLoop(sheet, state, layout);
        PaintNow(sheet, state, layout);
    }

    public void Dispose() => layer.Dispose();

    private void PaintStill(Sheet sheet, ReplayState state, ReplayWorld world, ReplayLayout layout)
    {
        var area = layout.Timeline;
        sheet.Rect(area, sheet.Colours.Ground);
        sheet.Line(new SKPoint(area.Left, area.Top + 0.5f), new SKPoint(area.Right, area.Top + 0.5f), 1, sheet.Colours.Rule);
        new TimelineHeading(sheet, state, world, layout).Paint();
        new ScanStrip(sheet, state, world, layout).Paint();
        var scene = world.First.Scene;
        new TimeAxis(sheet, scene, layout.Rows).Paint(state.TimelineFromS, state.TimelineToS);
        for (var i = 0; i < layout.RowsFitting && state.FirstRow + i < world.Rows.Length; i++)
        {
            var top = layout.Rows.Top + i * ReplayLayout.RowHeight;
            PaintRow(sheet, state, world, world.Rows[state.FirstRow + i], new SKRect(layout.Rows.Left, top, layout.Rows.Right, top + ReplayLayout.RowHeight), area);
        }

        PaintScroll(sheet, state, world, layout);
    }

    private void PaintRow(Sheet sheet, ReplayState state, ReplayWorld world, ReplayRow row, SKRect box, SKRect area)
    {
        var baseline = box.MidY + 4;
        var isSelected = string.Equals(row.Id, state.Selected, StringComparison.Ordinal);
        if (isSelected)
        {
            sheet.Rect(new SKRect(area.Left, box.Top + 0.5f, area.Right, box.Bottom - 0.5f), sheet.Colours.Ink.WithAlpha(0x1E));
        }

        sheet.Line(new SKPoint(box.Left, box.Bottom), new SKPoint(box.Right, box.Bottom), 0.5f, sheet.Colours.Rule);
        var id = sheet.Fit(row.Id, TextStyle.Small, ReplayLayout.RowLabelWidth - 26);
        sheet.Text(id, box.Left - 10, baseline, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
        sheet.Text(Ratio(world, row), area.Right - 14, baseline, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
        sheet.Canvas.Save();
        sheet.Canvas.ClipRect(box);
        new RowPainter(sheet, SKRect.Inflate(box, 0, -1.5f), state.TimelineFromS, state.TimelineToS, PeriodS(world)).Paint(MarksOf(world, row));
        sheet.Canvas.Restore();
    }

    /// <summary>Of the marks: with two recordings the longer one's.</summary>
    private static double PeriodS(ReplayWorld world) => world.Recordings.Max(recording => recording.Scene.Beam.PeriodS);

    private static string Ratio(ReplayWorld world, ReplayRow row)
    {
        var left = Percent(world.Recordings[0], row.Left);
        return world.IsComparison ? $"{left}/{Percent(world.Recordings[1], row.Right)}" : left + (left.Length > 0 && left[0] != '–' ? " %" : "");
    }

    private static string Percent(ReplayRecording recording, int target) =>
        target >= 0 && recording.Scene.Targets[target].BlipScanRatio is var ratio && !double.IsNaN(ratio) ? $"{100 * ratio:0}" : "–";

    private RowMarks MarksOf(ReplayWorld world, ReplayRow row)
    {
        if (!world.IsComparison)
        {
            return new OutcomeMarks(world.First.Scene.Targets[row.Left].Looks, world.First.Shades);
        }

        if (!compared.TryGetValue(row.Id, out var marks))
        {
            var (left, right) = (world.Recordings[0].Scene, world.Recordings[1].Scene);
            marks = new ComparisonMarks(Comparison.Of(
                row.Left >= 0 ? left.Targets[row.Left] : null, left.Beam.PeriodS, row.Right >= 0 ? right.Targets[row.Right] : null, right.Beam.PeriodS));
            compared.Add(row.Id, marks);
        }

        return marks;
    }

    private static void PaintScroll(Sheet sheet, ReplayState state, ReplayWorld world, ReplayLayout layout)
    {
        if (world.Rows.Length <= layout.RowsFitting)
        {
            return;
        }

        var track = new SKRect(layout.Timeline.Right - 8, layout.Rows.Top, layout.Timeline.Right - 4, layout.Rows.Bottom);
        sheet.Rect(track, sheet.Colours.Grid.WithAlpha(0x60));
        var unit = track.Height / world.Rows.Length;
        var top = track.Top + state.FirstRow * unit;
        sheet.Rect(new SKRect(track.Left, top, track.Right, Math.Max(top + 6, top + layout.RowsFitting * unit)), sheet.Colours.Trail);
    }

    private static float X(ReplayState state, SKRect rows, double timeS) =>
        rows.Left + (float)((timeS - state.TimelineFromS) / (state.TimelineToS - state.TimelineFromS)) * rows.Width;

    private static void PaintLoop(Sheet sheet, ReplayState state, ReplayLayout layout)
    {
        if (state.LoopFromS is not { } fromS)
        {
            return;
        }

        var (left, right) = (layout.Rows.Left, layout.Rows.Right);
        var from = Math.Clamp(X(state, layout.Rows, fromS), left, right);
        var to = Math.Clamp(X(state, layout.Rows, state.LoopToS ?? fromS), left, right);
        var edge = sheet.Colours.FalsePlot;
        sheet.Rect(new SKRect(from, layout.Strip.Top - 5, Math.Max(to, from + 2), layout.Strip.Top - 2), edge);
        foreach (var x in (float[])[from, to])
        {
            sheet.Line(new SKPoint(x, layout.Strip.Top - 5), new SKPoint(x, layout.Rows.Bottom), 1, edge.WithAlpha(0xA0));
        }
    }

    private static void PaintNow(Sheet sheet, ReplayState state, ReplayLayout layout)
    {
        if (state.TimeS < state.TimelineFromS || state.TimeS > state.TimelineToS)
        {
            return;
        }

        var x = X(state, layout.Rows, state.TimeS);
        var top = layout.Strip.Top - 1;
        sheet.Line(new SKPoint(x, top), new SKPoint(x, layout.Rows.Bottom + 4), 1.2f, sheet.Colours.Ink);
        using var tip = new SKPath();
        tip.MoveTo(x - 4.5f, top - 6);
        tip.LineTo(x + 4.5f, top - 6);
        tip.LineTo(x, top);
        tip.Close();
        sheet.Fill(tip, sheet.Colours.Ink);
    }
}
