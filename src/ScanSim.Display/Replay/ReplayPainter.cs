using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Paints the window: title, plans, panel, timeline, foot, and the help page over them.</summary>
internal sealed class ReplayPainter : IDisposable
{
    private const string Caution = "Planning estimate from models, not proof of performance.";
    private readonly ReplayPlan[] plans = [new ReplayPlan(), new ReplayPlan()];
    private readonly ReplayTimeline timeline = new();

    public void Paint(Frame frame, ReplayState state, ReplayWorld world, SelectedLooks looks)
    {
        var layout = ReplayLayout.Of(state.Width, state.Height, world);
        using var sheet = frame.SheetOn(frame.Canvas, Colours.Of(state.Theme));
        for (var i = 0; i < world.Recordings.Length; i++)
        {
            plans[i].Paint(frame, sheet, state, world, i, layout.Plans[i]);
        }

        ReplayPanel.Paint(sheet, state, world, looks, layout.Panel);
        timeline.Paint(frame, sheet, state, world, layout);
        PaintHeader(sheet, state, world, layout.Header);
        PaintFoot(sheet, state, layout.Foot);
        for (var i = 0; i < world.Recordings.Length; i++)
        {
            HoverBox.Paint(sheet, state, world, i, layout.Plans[i]);
        }

        if (state.IsHelpShown)
        {
            HelpPage.Paint(sheet, state.Width, state.Height);
        }
    }

    /// <summary>How often the costly parts were made anew, for whoever tunes them.</summary>
    public IEnumerable<string> Counts() =>
        [$"ground {plans[0].Renewals}", $"labels {plans[0].Layouts}", $"timeline {timeline.Renewals}"];

    public void Dispose()
    {
        foreach (var plan in plans)
        {
            plan.Dispose();
        }

        timeline.Dispose();
    }

    private static void PaintHeader(Sheet sheet, ReplayState state, ReplayWorld world, SKRect area)
    {
        var scene = world.First.Scene;
        sheet.Rect(area, sheet.Colours.Panel);
        sheet.Line(new SKPoint(area.Left, area.Bottom - 0.5f), new SKPoint(area.Right, area.Bottom - 0.5f), 1, sheet.Colours.Rule);
        var baseline = area.MidY + 6;
        var right = area.Right - 14;
        var clock = scene.StartUtc.ToUniversalTime().AddSeconds(state.TimeS).ToString("yyyy-MM-dd  HH:mm:ss") + " UTC";
        sheet.Text(clock, right, baseline, TextStyle.Title, sheet.Colours.Ink, SKTextAlign.Right);
        right -= sheet.Width(clock, TextStyle.Title) + 20;
        var pace = (state.IsPlaying ? "playing " : "paused ") + PaceText(state.SpeedRatio) + (state.LoopToS is null ? "" : ", loop");
        sheet.Text(pace, right, baseline, TextStyle.Body, state.IsPlaying ? sheet.Colours.Ink : sheet.Colours.Quiet, SKTextAlign.Right);
        PaintPlaying(sheet, state.IsPlaying, new SKPoint(right - sheet.Width(pace, TextStyle.Body) - 14, area.MidY));
        right -= sheet.Width("playing 1/4 ×, loop", TextStyle.Body) + 24;
        var room = right - area.Left - 40;
        var name = string.Join("  |  ", world.Recordings.Select(recording => recording.Scene.ScenarioName).Distinct(StringComparer.Ordinal));
        var after = sheet.Text(sheet.Fit(name, TextStyle.Title, room), area.Left + 16, baseline, TextStyle.Title, sheet.Colours.Ink);
        var site = sheet.Fit(scene.SiteName, TextStyle.Body, Math.Max(0, right - after - 44));
        if (site.Length > 2)
        {
            sheet.Text(site, after + 16, baseline, TextStyle.Body, sheet.Colours.Quiet);
        }
    }

    private static string PaceText(double ratio) => ratio switch { 0.25 => "1/4 ×", 0.5 => "1/2 ×", _ => $"{ratio:0.##} ×" };

    /// <summary>A triangle while time runs, two bars while it stands.</summary>
    private static void PaintPlaying(Sheet sheet, bool isPlaying, SKPoint centre)
    {
        if (!isPlaying)
        {
            sheet.Rect(new SKRect(centre.X - 5, centre.Y - 6, centre.X - 1.5f, centre.Y + 6), sheet.Colours.Quiet);
            sheet.Rect(new SKRect(centre.X + 1.5f, centre.Y - 6, centre.X + 5, centre.Y + 6), sheet.Colours.Quiet);
            return;
        }

        using var path = new SKPath();
        path.MoveTo(centre.X - 5, centre.Y - 6.5f);
        path.LineTo(centre.X + 6, centre.Y);
        path.LineTo(centre.X - 5, centre.Y + 6.5f);
        path.Close();
        sheet.Fill(path, sheet.Colours.Ink);
    }

    private static void PaintFoot(Sheet sheet, ReplayState state, SKRect area)
    {
        sheet.Rect(area, sheet.Colours.Panel);
        var baseline = area.Bottom - 7;
        const string help = "? keys";
        sheet.Text(help, area.Right - 16, baseline, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        var message = state.Message.Length > 0 ? state.Message : Caution;
        var room = area.Width - 48 - sheet.Width(help, TextStyle.Small);
        sheet.Text(sheet.Fit(message, TextStyle.Small, room), area.Left + 16, baseline, TextStyle.Small, state.Message.Length > 0 ? sheet.Colours.Ink : sheet.Colours.Quiet);
    }
}
