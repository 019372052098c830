using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>One row a target, the scans from left to right, each with what became of it.</summary>
internal sealed class TimelineView
{
    /// <summary>What the timeline needs below its rows.</summary>
    public const float AxisHeight = 26;

    /// <summary>Kept at the right for the blip-scan ratio.</summary>
    public const float ShareWidth = 62;

    /// <summary>Narrower scans are gathered in columns.</summary>
    private const float LeastMarkPx = 7;
    private const float ColumnHeightMost = 14;
    private const float MostLabelWidth = 150;

    private readonly Sheet sheet;
    private readonly Scene scene;
    private readonly double timeS;
    private readonly SKRect area;
    private readonly TimelineHead head;
    private readonly SKRect rows;
    private readonly float rowHeight;
    private readonly int shown;
    private readonly float bottom;
    private readonly int firstScan;

    public TimelineView(Sheet sheet, Scene scene, double timeS, PictureLayout layout, TimelineHead head)
    {
        this.sheet = sheet;
        this.scene = scene;
        this.timeS = timeS;
        area = layout.Timeline;
        rowHeight = layout.RowHeight;
        shown = layout.ShownTargets;
        this.head = head;
        var labels = scene.Targets.Select(t => sheet.Width(t.Id, TextStyle.Small)).DefaultIfEmpty(0).Max();
        var left = MathF.Ceiling(area.Left + 16 + Math.Clamp(labels, 40, MostLabelWidth) + 10);
        rows = new SKRect(left, area.Top + head.Height, area.Right - ShareWidth, area.Bottom - AxisHeight);
        bottom = rows.Bottom;
        firstScan = scene.Scans.IsEmpty ? 0 : scene.Scans[0].Scan;
    }

    private float ScanPx => (float)(rows.Width * scene.Beam.PeriodS / scene.DurationS);

    public void Paint()
    {
        sheet.Line(new SKPoint(area.Left, area.Top), new SKPoint(area.Right, area.Top), 1, sheet.Colours.Rule);
        var columns = ScanPx < LeastMarkPx;
        head.Paint(area.Top, columns);
        sheet.Text("blip/scan", area.Right - 16, area.Top + head.Height - 4, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        new TimeAxis(sheet, scene, rows).Paint();
        for (var i = 0; i < shown; i++)
        {
            var row = new SKRect(rows.Left, rows.Top + i * rowHeight, rows.Right, rows.Top + (i + 1) * rowHeight);
            PaintRow(scene.Targets[i], row, columns);
        }

        if (shown < scene.Targets.Length)
        {
            sheet.Text($"+ {scene.Targets.Length - shown} more targets", rows.Left, bottom - 4, TextStyle.Small, sheet.Colours.Quiet);
        }

        PaintNow();
    }

    private void PaintRow(SceneTarget target, SKRect row, bool columns)
    {
        var baseline = row.MidY + 4;
        sheet.Line(new SKPoint(row.Left, row.Bottom), new SKPoint(row.Right, row.Bottom), 0.5f, sheet.Colours.Rule);
        var id = sheet.Fit(target.Id, TextStyle.Small, row.Left - 10 - area.Left - 16);
        sheet.Text(id, row.Left - 10, baseline, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
        var share = double.IsNaN(target.BlipScanRatio) ? "–" : $"{100 * target.BlipScanRatio:0} %";
        sheet.Text(share, area.Right - 16, baseline, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
        if (columns)
        {
            new TimelineColumns(sheet, ScanPx, SKRect.Inflate(row, 0, -Math.Max(2, MathF.Floor((rowHeight - ColumnHeightMost) / 2)))).Paint(target.Looks, firstScan);
            return;
        }

        var r = Math.Min(Math.Min(ScanPx - 1.5f, rowHeight - 5) / 2, 5.5f);
        foreach (var marks in target.Looks.GroupBy(look => look.Outcome))
        {
            Glyphs.Outcomes(sheet, marks.Key, [.. marks.Select(look => new SKPoint(X(look.TimeS), row.MidY))], r);
        }
    }

    private float X(double atS) => rows.Left + (float)(atS / scene.DurationS) * rows.Width;

    private void PaintNow()
    {
        var x = X(timeS);
        var top = rows.Top - 1;
        sheet.Line(new SKPoint(x, top), new SKPoint(x, bottom + 4), 1.2f, sheet.Colours.Ink);
        using var tip = new SKPath();
        tip.MoveTo(x - 4.5f, top - 6);
        tip.LineTo(x + 4.5f, top - 6);
        tip.LineTo(x, top);
        tip.Close();
        sheet.Fill(tip, sheet.Colours.Ink);
    }
}
