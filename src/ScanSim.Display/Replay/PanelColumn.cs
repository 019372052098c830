using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Sets lines of the panel one below the other.</summary>
internal sealed class PanelColumn(Sheet sheet, SKRect area)
{
    private const float LineHeight = 15;

    public float Left { get; } = area.Left + 14;

    public float Right { get; } = area.Right - 12;

    /// <summary>Reached so far.</summary>
    public float Y { get; set; } = area.Top + 6;

    /// <summary>Height that is left.</summary>
    public float Spare => area.Bottom - 4 - Y;

    public bool HasRoom(float height) => Y + height <= area.Bottom - 4;

    public void Heading(string text, string beside = "")
    {
        Y += LineHeight + 2;
        var right = sheet.Text(sheet.Fit(text, TextStyle.Strong, Right - Left), Left, Y, TextStyle.Strong, sheet.Colours.Ink);
        if (beside.Length > 0)
        {
            sheet.Text(sheet.Fit(beside, TextStyle.Small, Right - right - 8), Right, Y, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        }
    }

    public void Figure(string name, string value)
    {
        Y += LineHeight;
        sheet.Text(name, Left, Y, TextStyle.Small, sheet.Colours.Quiet);
        sheet.Text(sheet.Fit(value, TextStyle.Small, Right - Left - 76), Right, Y, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
    }

    /// <summary>Two figures on one line.</summary>
    public void Figures(string leftName, string leftValue, string rightName, string rightValue)
    {
        Y += LineHeight;
        var middle = (Left + Right) / 2;
        sheet.Text(leftName, Left, Y, TextStyle.Small, sheet.Colours.Quiet);
        sheet.Text(leftValue, middle - 8, Y, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
        sheet.Text(rightName, middle + 8, Y, TextStyle.Small, sheet.Colours.Quiet);
        sheet.Text(rightValue, Right, Y, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
    }

    /// <summary>Text broken at blanks; what has no room in the lines allowed ends in an ellipsis.</summary>
    public void Paragraph(string text, int mostLines, SKColor colour)
    {
        var words = new Queue<string>(text.Split(' ', StringSplitOptions.RemoveEmptyEntries));
        for (var line = 1; words.Count > 0 && line <= mostLines; line++)
        {
            var set = words.Dequeue();
            while (words.Count > 0 && (line == mostLines || sheet.Width(set + " " + words.Peek(), TextStyle.Small) <= Right - Left))
            {
                set += " " + words.Dequeue();
            }

            Y += LineHeight - 1;
            sheet.Text(sheet.Fit(set, TextStyle.Small, Right - Left), Left, Y, TextStyle.Small, colour);
        }
    }

    public void Rule()
    {
        Y += 6;
        sheet.Line(new SKPoint(Left, Y), new SKPoint(Right, Y), 1, sheet.Colours.Rule);
        Y += 1;
    }

    /// <summary>The next box of a height over the whole width.</summary>
    public SKRect Box(float height)
    {
        var box = new SKRect(Left, Y + 3, Right, Y + 3 + height);
        Y = box.Bottom;
        return box;
    }
}
