using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>How a share of many scans' outcomes fills a column of the timeline: by texture besides colour.</summary>
internal static class OutcomeTexture
{
    /// <summary>Least width of a column, in layout units, in which the textures still differ.</summary>
    public const float ColumnWidth = 4;

    /// <summary>Fills a box (a whole number of columns wide or one column) with the outcome's texture.</summary>
    public static void Fill(Sheet sheet, LookOutcome outcome, SKRect box)
    {
        var colour = sheet.Colours.Outcomes[(int)outcome];
        if (outcome == LookOutcome.Detected)
        {
            sheet.Rect(box, colour);
            return;
        }

        using var path = new SKPath();
        if (outcome == LookOutcome.MissedBeam)
        {
            for (var y = box.Top; y < box.Bottom; y += 3)
            {
                path.AddRect(new SKRect(box.Left, y, box.Right, Math.Min(y + 1.5f, box.Bottom)));
            }
        }
        else
        {
            for (var x = box.Left; x < box.Right - 0.5f; x += ColumnWidth)
            {
                Column(path, outcome, new SKRect(x, box.Top, Math.Min(x + ColumnWidth, box.Right), box.Bottom));
            }
        }

        sheet.Fill(path, colour);
    }

    private static void Column(SKPath path, LookOutcome outcome, SKRect box)
    {
        switch (outcome)
        {
            case LookOutcome.MissedRange:
                path.AddRect(Bar(box, 1, 2.5f));
                break;
            case LookOutcome.MissedChance:
                Checks(path, box);
                break;
            case LookOutcome.MissedMasked:
                path.AddRect(Bar(box, 0, 3));
                break;
            case LookOutcome.MissedUnrecorded:
                path.AddRect(Bar(box, 0, 0.8f));
                path.AddRect(Bar(box, 2, 2.8f));
                break;
            default:
                path.AddRect(new SKRect(box.Left, box.MidY - 0.75f, box.Right, box.MidY + 0.75f));
                break;
        }
    }

    private static SKRect Bar(SKRect box, float from, float to) =>
        new(Math.Min(box.Left + from, box.Right), box.Top, Math.Min(box.Left + to, box.Right), box.Bottom);

    private static void Checks(SKPath path, SKRect box)
    {
        var isLeft = true;
        for (var y = box.Top; y < box.Bottom; y += 2)
        {
            var x = isLeft ? box.Left : box.Left + 2;
            path.AddRect(new SKRect(Math.Min(x, box.Right), y, Math.Min(x + 2, box.Right), Math.Min(y + 2, box.Bottom)));
            isLeft = !isLeft;
        }
    }
}
