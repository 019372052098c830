using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Where one clicks to sort the rows.</summary>
internal static class TimelineHeadBox
{
    private const float Width = 210;

    public static SKRect Order(ReplayLayout layout) =>
        new(layout.Timeline.Right - Width, layout.Timeline.Top + 2, layout.Timeline.Right - 8, layout.Timeline.Top + 22);
}
