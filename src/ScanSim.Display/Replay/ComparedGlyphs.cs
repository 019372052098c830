using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Shapes, textures and words of the comparison: left and right halves of a disc, so that nothing rests on colour alone.</summary>
internal static class ComparedGlyphs
{
    public static SKColor ColourOf(Colours colours, ComparedOutcome outcome) => outcome switch
    {
        ComparedOutcome.Both => colours.Outcomes[(int)LookOutcome.Detected],
        ComparedOutcome.OnlyLeft => colours.Outcomes[(int)LookOutcome.MissedRange],
        ComparedOutcome.OnlyRight => colours.Outcomes[(int)LookOutcome.MissedChance],
        ComparedOutcome.Neither => colours.Outcomes[(int)LookOutcome.MissedBeam],
        _ => colours.Outcomes[(int)LookOutcome.NoLook],
    };

    public static string TextOf(ComparedOutcome outcome) => outcome switch
    {
        ComparedOutcome.Both => "both saw it",
        ComparedOutcome.OnlyLeft => "only left",
        ComparedOutcome.OnlyRight => "only right",
        ComparedOutcome.Neither => "neither",
        _ => "out of view of both",
    };

    public static void Draw(Sheet sheet, ComparedOutcome outcome, SKPoint[] centres, float r)
    {
        var colour = ColourOf(sheet.Colours, outcome);
        if (outcome == ComparedOutcome.Both)
        {
            sheet.Discs(centres, r, colour);
            return;
        }

        using var path = new SKPath();
        foreach (var centre in centres)
        {
            Add(path, outcome, centre, r);
        }

        if (outcome is ComparedOutcome.OnlyLeft or ComparedOutcome.OnlyRight)
        {
            sheet.Fill(path, colour);
        }
        else
        {
            sheet.Outline(path, 1.3f, colour);
        }
    }

    /// <summary>Both: full height; only left: the column's left half; only right: its right half; neither: level lines.</summary>
    public static void Fill(Sheet sheet, ComparedOutcome outcome, SKRect box)
    {
        if (outcome == ComparedOutcome.Both)
        {
            sheet.Rect(box, ColourOf(sheet.Colours, outcome));
            return;
        }

        using var path = new SKPath();
        switch (outcome)
        {
            case ComparedOutcome.OnlyLeft or ComparedOutcome.OnlyRight:
                var from = outcome == ComparedOutcome.OnlyLeft ? 0 : 2;
                for (var x = box.Left + from; x < box.Right; x += OutcomeTexture.ColumnWidth)
                {
                    path.AddRect(new SKRect(x, box.Top, Math.Min(x + 2, box.Right), box.Bottom));
                }

                break;
            case ComparedOutcome.Neither:
                for (var y = box.Top; y < box.Bottom; y += 3)
                {
                    path.AddRect(new SKRect(box.Left, y, box.Right, Math.Min(y + 1.2f, box.Bottom)));
                }

                break;
            default:
                path.AddRect(new SKRect(box.Left, box.MidY - 0.75f, box.Right, box.MidY + 0.75f));
                break;
        }

        sheet.Fill(path, ColourOf(sheet.Colours, outcome));
    }

    private static void Add(SKPath path, ComparedOutcome outcome, SKPoint centre, float r)
    {
        var box = new SKRect(centre.X - r, centre.Y - r, centre.X + r, centre.Y + r);
        switch (outcome)
        {
            case ComparedOutcome.OnlyLeft:
                path.AddArc(box, 90, 180);
                path.Close();
                break;
            case ComparedOutcome.OnlyRight:
                path.AddArc(box, 270, 180);
                path.Close();
                break;
            case ComparedOutcome.Neither:
                path.AddCircle(centre.X, centre.Y, 0.85f * r);
                break;
            default:
                path.MoveTo(box.Left, centre.Y);
                path.LineTo(box.Right, centre.Y);
                break;
        }
    }
}
