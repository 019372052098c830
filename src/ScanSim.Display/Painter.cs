using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display;

/// <summary>Draws a scene at one time: the same call makes pictures in all formats, film frames and the window's contents.</summary>
public sealed class Painter(Scene scene)
{
    private const string Caution = "Planning estimate from models, not proof of performance.";

    /// <summary>For an SVG canvas: text as outlines, as the reader's system may lack our letters, and plots as circles.</summary>
    public bool ForSvg { get; init; }

    /// <summary>Where each piece of text was set is added here, if given.</summary>
    internal ICollection<DrawnText>? Journal { get; init; }

    /// <summary>Paints the whole picture; throws <see cref="PictureException"/> for a size, view or time that cannot be drawn.</summary>
    public void Paint(SKCanvas canvas, PictureSize size, ViewOptions view, double timeS)
    {
        Check(size, view, timeS);
        canvas.Save();
        canvas.Scale((float)size.Scale);
        using (var sheet = new Sheet(canvas, Colours.Of(view.Theme), ForSvg, Journal))
        {
            var head = new TimelineHead(sheet, scene, size.Width);
            var layout = PictureLayout.Of(size.Width, size.Height, scene.Targets.Length, head.Height + TimelineView.AxisHeight);
            sheet.Rect(new SKRect(0, 0, size.Width, size.Height), sheet.Colours.Ground);
            PlanView.Paint(sheet, scene, view, timeS, layout.Plan);
            new SidePanel(sheet, scene, view, timeS, layout.Panel).Paint();
            PaintHeader(sheet, layout.Header);
            new TimelineView(sheet, scene, timeS, layout, head).Paint();
            sheet.Text(Caution, layout.Foot.Left + 16, layout.Foot.Bottom - 7, TextStyle.Small, sheet.Colours.Quiet);
        }

        canvas.Restore();
    }

    private void Check(PictureSize size, ViewOptions view, double timeS)
    {
        size.Check();
        view.Check();
        if (!(timeS >= 0 && timeS <= scene.DurationS))
        {
            throw new PictureException($"Time {timeS} s lies outside the recording: it must be between 0 and {scene.DurationS} s.");
        }
    }

    private void PaintHeader(Sheet sheet, SKRect area)
    {
        sheet.Rect(area, sheet.Colours.Panel);
        sheet.Line(new SKPoint(area.Left, area.Bottom), new SKPoint(area.Right, area.Bottom), 1, sheet.Colours.Rule);
        var site = sheet.Fit(scene.SiteName, TextStyle.Body, area.Width / 4);
        var room = area.Width - 32 - sheet.Width(site, TextStyle.Body) - 24;
        sheet.Text(sheet.Fit(scene.ScenarioName, TextStyle.Title, room), area.Left + 16, area.MidY + 6, TextStyle.Title, sheet.Colours.Ink);
        sheet.Text(site, area.Right - 14, area.MidY + 5, TextStyle.Body, sheet.Colours.Quiet, SKTextAlign.Right);
    }
}
