using ScanSim.Display.Painting;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>The values of the plot nearest to the pointer.</summary>
internal static class HoverBox
{
    private const float LineHeight = 15;
    private const float Width = 178;

    public static void Paint(Sheet sheet, ReplayState state, ReplayWorld world, int index, SKRect area)
    {
        if (state is not { PointerX: { } x, PointerY: { } y, Drag: DragKind.None, IsHelpShown: false } || !area.Contains(x, y)
            || ReplayPick.Plot(state, world, index, area, new SKPoint(x, y)) is not { } plot)
        {
            return;
        }

        var place = ReplayMoves.Projection(state, world, area).ToPlan(plot.EastM, plot.NorthM);
        var lines = Lines(plot, state, world.Recordings[index].Scene);
        var size = new SKSize(Width, lines.Count * LineHeight + 12);
        var left = place.X + 16 + size.Width < area.Right ? place.X + 16 : place.X - 16 - size.Width;
        var top = Math.Clamp(place.Y - size.Height / 2, area.Top + 6, area.Bottom - size.Height - 6);
        var box = SKRect.Create(left, top, size.Width, size.Height);
        sheet.Ring(place, Glyphs.PlotRadius + 4, 1.5f, sheet.Colours.Ink);
        sheet.Rect(box, sheet.Colours.Panel.WithAlpha(0xF0));
        sheet.Frame(box, 1, sheet.Colours.Trail);
        var baseline = box.Top + 17;
        foreach (var (name, value) in lines)
        {
            sheet.Text(name, box.Left + 9, baseline, TextStyle.Small, sheet.Colours.Quiet);
            sheet.Text(sheet.Fit(value, TextStyle.Small, box.Width - 70), box.Right - 9, baseline, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
            baseline += LineHeight;
        }
    }

    /// <summary>Name and value of all that a plot says.</summary>
    public static IReadOnlyList<(string Name, string Value)> Lines(in PlotMark plot, ReplayState state, Scene scene)
    {
        var rangeM = Math.Sqrt((double)plot.EastM * plot.EastM + (double)plot.NorthM * plot.NorthM);
        var bearingDeg = (Math.Atan2(plot.EastM, plot.NorthM) * (180 / Math.PI) + 360) % 360;
        return
        [
            ("Plot", plot.Kind == EchoKind.Noise ? "false (noise)" : plot.Target),
            ("Range", RangeText.Precise(rangeM, state.Unit)),
            ("Bearing", $"{bearingDeg:000.00}°"),
            ("SNR", $"{plot.SnrDb:0.0} dB"),
            ("Hits", $"{plot.Hits}"),
            ("Time", scene.StartUtc.ToUniversalTime().AddSeconds(plot.TimeS).ToString("HH:mm:ss.f")),
            ("Age", $"{state.TimeS - plot.TimeS:0.0} s, scan {plot.Scan}"),
        ];
    }
}
