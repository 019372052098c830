using System.Collections.Immutable;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Where the parts of the window lie, in layout units: title, plans and panel, timeline, foot.</summary>
internal sealed record ReplayLayout
{
    public const float HeaderHeight = 34;
    public const float FootHeight = 22;
    public const float RowHeight = 17;

    /// <summary>Title and legend of the timeline.</summary>
    public const float TimelineHeadHeight = 46;

    /// <summary>Plots and false plots per scan.</summary>
    public const float StripHeight = 30;
    public const float AxisHeight = 24;
    public const float RowLabelWidth = 110;
    public const float RatioWidth = 76;

    /// <summary>Of the height: the plan keeps the larger part.</summary>
    private const float TimelineShareMost = 0.36f;

    public required SKRect Header { get; init; }

    /// <summary>One for each recording, side by side.</summary>
    public required ImmutableArray<SKRect> Plans { get; init; }

    public required SKRect Panel { get; init; }

    public required SKRect Timeline { get; init; }

    /// <summary>Where time runs in the strip.</summary>
    public required SKRect Strip { get; init; }

    /// <summary>Where time runs in the rows.</summary>
    public required SKRect Rows { get; init; }

    public required SKRect Foot { get; init; }

    /// <summary>Rows that there is room for.</summary>
    public required int RowsFitting { get; init; }

    public static ReplayLayout Of(float width, float height, ReplayWorld world)
    {
        var panelWidth = width >= 1700 ? 360f : width >= 1200 ? 300f : 252f;
        const float rest = TimelineHeadHeight + StripHeight + AxisHeight;
        var fitting = Math.Clamp(world.Rows.Length, 2, Math.Max(2, (int)((TimelineShareMost * height - rest) / RowHeight)));
        var bottom = MathF.Floor(height) - FootHeight;
        var top = bottom - rest - fitting * RowHeight;
        var planWidth = MathF.Floor((width - panelWidth) / world.Recordings.Length);
        var stripTop = top + TimelineHeadHeight;
        var rowsTop = stripTop + StripHeight;
        return new ReplayLayout
        {
            Header = new SKRect(0, 0, width, HeaderHeight),
            Plans = [.. Enumerable.Range(0, world.Recordings.Length).Select(i => new SKRect(i * planWidth, HeaderHeight, (i + 1) * planWidth, top))],
            Panel = new SKRect(world.Recordings.Length * planWidth, HeaderHeight, width, top),
            Timeline = new SKRect(0, top, width, bottom),
            Strip = new SKRect(RowLabelWidth, stripTop, width - RatioWidth, rowsTop),
            Rows = new SKRect(RowLabelWidth, rowsTop, width - RatioWidth, rowsTop + fitting * RowHeight),
            Foot = new SKRect(0, bottom, width, height),
            RowsFitting = fitting,
        };
    }
}
