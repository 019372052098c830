using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Where the parts of a picture lie, in layout units: title above, plan and panel in the middle, timeline, caution at the foot.</summary>
internal sealed record PictureLayout
{
    public const float HeaderHeight = 42;
    public const float FootHeight = 22;

    /// <summary>Of the picture's height: the plan keeps the larger part.</summary>
    private const float TimelineShareMost = 0.42f;

    /// <summary>Room for one row of the timeline when there is plenty, on a picture of 900 and more; less on lower ones.</summary>
    public const float RowHeightMost = 22;

    /// <summary>11-unit text still fits without touching its neighbours.</summary>
    public const float RowHeightLeast = 14;

    public required SKRect Header { get; init; }

    public required SKRect Plan { get; init; }

    public required SKRect Panel { get; init; }

    public required SKRect Timeline { get; init; }

    public required SKRect Foot { get; init; }

    /// <summary>Height of a row of the timeline.</summary>
    public required float RowHeight { get; init; }

    /// <summary>Targets with a row; the rest is counted in one row more.</summary>
    public required int ShownTargets { get; init; }

    /// <summary>The parts of a picture of a size; the timeline takes what its rows ask for, up to its share.</summary>
    /// <param name="width">Of the picture.</param>
    /// <param name="height">Of the picture.</param>
    /// <param name="targets">Number of rows the timeline would like.</param>
    /// <param name="timelineRest">What the timeline needs besides its rows: heading, legend, axis.</param>
    public static PictureLayout Of(float width, float height, int targets, float timelineRest)
    {
        var panelWidth = width >= 1100 ? 236f : 204f;
        var room = TimelineShareMost * height - timelineRest;
        var fitting = (int)(room / RowHeightLeast);
        var rows = Math.Clamp(targets, 1, fitting);
        var rowHeightMost = Math.Clamp(MathF.Floor(RowHeightMost * height / 900), RowHeightLeast + 2, RowHeightMost);
        var rowHeight = Math.Clamp(MathF.Floor(room / rows), RowHeightLeast, rowHeightMost);
        var bottom = height - FootHeight;
        var top = MathF.Round(bottom - timelineRest - rows * rowHeight);
        return new PictureLayout
        {
            Header = new SKRect(0, 0, width, HeaderHeight),
            Plan = new SKRect(0, HeaderHeight, width - panelWidth, top),
            Panel = new SKRect(width - panelWidth, HeaderHeight, width, top),
            Timeline = new SKRect(0, top, width, bottom),
            Foot = new SKRect(0, bottom, width, height),
            RowHeight = rowHeight,
            ShownTargets = targets > fitting ? fitting - 1 : targets,
        };
    }
}
