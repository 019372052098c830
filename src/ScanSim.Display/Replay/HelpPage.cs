using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>All keys and what they do, made of the table that the replay obeys.</summary>
internal static class HelpPage
{
    private const float LineHeight = 15.5f;
    private const float HeadingHeight = 25;
    private const float KeyWidth = 92;
    private const float GestureWidth = 186;

    private static readonly KeyGroup[][] Columns = [[KeyGroup.Time, KeyGroup.Target], [KeyGroup.Plan], [KeyGroup.Timeline, KeyGroup.Window]];

    public static void Paint(Sheet sheet, float width, float height)
    {
        sheet.Rect(new SKRect(0, 0, width, height), sheet.Colours.Ground.WithAlpha(0xB0));
        var size = new SKSize(Math.Min(width - 24, 1120), Math.Min(height - 24, 566));
        var page = SKRect.Create((width - size.Width) / 2, (height - size.Height) / 2, size.Width, size.Height);
        sheet.Rect(page, sheet.Colours.Panel);
        sheet.Frame(page, 1, sheet.Colours.Trail);
        sheet.Text("Keys", page.Left + 20, page.Top + 28, TextStyle.Title, sheet.Colours.Ink);
        var columnWidth = (page.Width - 40) / Columns.Length;
        for (var column = 0; column < Columns.Length; column++)
        {
            var left = page.Left + 20 + column * columnWidth;
            var y = page.Top + 36;
            foreach (var group in Columns[column])
            {
                y = PaintGroup(sheet, group, left, y, columnWidth - 14);
            }
        }

        PaintPointer(sheet, page);
    }

    private static float PaintGroup(Sheet sheet, KeyGroup group, float left, float top, float width)
    {
        var y = top + HeadingHeight;
        sheet.Text(group.ToString(), left, y - 4, TextStyle.Strong, sheet.Colours.Ink);
        foreach (var key in ReplayKeys.All.Where(key => key.Group == group))
        {
            y += LineHeight;
            sheet.Text(key.Keys, left, y, TextStyle.Small, sheet.Colours.Ink);
            sheet.Text(sheet.Fit(key.Does, TextStyle.Small, width - KeyWidth), left + KeyWidth, y, TextStyle.Small, sheet.Colours.Quiet);
        }

        return y + 4;
    }

    private static void PaintPointer(Sheet sheet, SKRect page)
    {
        var rows = (ReplayKeys.Pointer.Length + 1) / 2;
        var top = page.Bottom - 18 - rows * LineHeight;
        sheet.Line(new SKPoint(page.Left + 20, top - 26), new SKPoint(page.Right - 20, top - 26), 1, sheet.Colours.Rule);
        sheet.Text("Pointer", page.Left + 20, top - 8, TextStyle.Strong, sheet.Colours.Ink);
        for (var i = 0; i < ReplayKeys.Pointer.Length; i++)
        {
            var left = page.Left + 20 + (i / rows) * (page.Width - 40) / 2;
            var y = top + 8 + i % rows * LineHeight;
            sheet.Text(ReplayKeys.Pointer[i].Gesture, left, y, TextStyle.Small, sheet.Colours.Ink);
            sheet.Text(ReplayKeys.Pointer[i].Does, left + GestureWidth, y, TextStyle.Small, sheet.Colours.Quiet);
        }
    }
}
