using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>The shapes of the picture, the same in plan, timeline and legends.</summary>
internal static class Glyphs
{
    public const float PlotRadius = 3.2f;
    public const float FalsePlotRadius = 4.2f;
    public const float TruthRadius = 5.5f;

    public static void FalsePlot(SKPath into, SKPoint centre, float scale = 1)
    {
        var r = FalsePlotRadius * scale;
        into.MoveTo(centre.X, centre.Y - r);
        into.LineTo(centre.X + r, centre.Y);
        into.LineTo(centre.X, centre.Y + r);
        into.LineTo(centre.X - r, centre.Y);
        into.Close();
    }

    /// <summary>A ring with a stroke along the course (right, up); four arcs and no stroke when the radar cannot look at the target.</summary>
    public static void Truth(SKPath into, SKPoint centre, float rightMps, float upMps, bool inView, float scale = 1)
    {
        var r = TruthRadius * scale;
        if (!inView)
        {
            var box = new SKRect(centre.X - r, centre.Y - r, centre.X + r, centre.Y + r);
            for (var start = 22f; start < 360; start += 90)
            {
                into.AddArc(box, start, 46);
            }

            return;
        }

        into.AddCircle(centre.X, centre.Y, r);
        var speed = MathF.Sqrt(rightMps * rightMps + upMps * upMps);
        if (speed > 0)
        {
            var (ux, uy) = (rightMps / speed, -upMps / speed);
            into.MoveTo(centre.X + ux * r, centre.Y + uy * r);
            into.LineTo(centre.X + ux * (r + 7 * scale), centre.Y + uy * (r + 7 * scale));
        }
    }

    /// <summary>The mark of one scan's outcome, within <paramref name="r"/> of its centre.</summary>
    public static void Outcome(Sheet sheet, LookOutcome outcome, SKPoint centre, float r) => Outcomes(sheet, outcome, [centre], r);

    /// <summary>The same mark at many places, drawn in one go.</summary>
    public static void Outcomes(Sheet sheet, LookOutcome outcome, SKPoint[] centres, float r, byte alpha = 255)
    {
        var colour = sheet.Colours.Outcomes[(int)outcome].WithAlpha(alpha);
        if (outcome == LookOutcome.Detected)
        {
            sheet.Discs(centres, r, colour);
            return;
        }

        using var path = new SKPath();
        foreach (var centre in centres)
        {
            Add(path, outcome, centre, r);
        }

        if (outcome == LookOutcome.MissedMasked)
        {
            sheet.Fill(path, colour);
        }
        else
        {
            sheet.Outline(path, r < 3.5f ? 1.2f : 1.5f, colour);
        }
    }

    private static void Add(SKPath path, LookOutcome outcome, SKPoint centre, float r)
    {
        switch (outcome)
        {
            case LookOutcome.MissedMasked:
                Triangle(path, centre, r, -1);
                break;
            case LookOutcome.MissedRange:
                Triangle(path, centre, r, 1);
                break;
            case LookOutcome.MissedBeam:
                path.AddRect(new SKRect(centre.X - 0.8f * r, centre.Y - 0.8f * r, centre.X + 0.8f * r, centre.Y + 0.8f * r));
                break;
            case LookOutcome.MissedChance:
                Cross(path, centre, 0.85f * r);
                break;
            case LookOutcome.MissedUnrecorded:
                path.AddCircle(centre.X, centre.Y, 0.9f * r);
                break;
            default:
                path.MoveTo(centre.X - r, centre.Y);
                path.LineTo(centre.X + r, centre.Y);
                break;
        }
    }

    private static void Triangle(SKPath path, SKPoint centre, float r, int down)
    {
        path.MoveTo(centre.X - r, centre.Y - down * 0.75f * r);
        path.LineTo(centre.X + r, centre.Y - down * 0.75f * r);
        path.LineTo(centre.X, centre.Y + down * 0.95f * r);
        path.Close();
    }

    private static void Cross(SKPath path, SKPoint centre, float r)
    {
        path.MoveTo(centre.X - r, centre.Y - r);
        path.LineTo(centre.X + r, centre.Y + r);
        path.MoveTo(centre.X - r, centre.Y + r);
        path.LineTo(centre.X + r, centre.Y - r);
    }
}
