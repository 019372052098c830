using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Explaining;

/// <summary>What the areas, lines and marks of the chart of terms mean, set in lines from the left.</summary>
internal static class ChartLegend
{
    private const float RowHeight = 20;
    private const float KeyWidth = 22;
    private const float Gap = 18;
    private const float DashOn = 7;
    private const float DashOff = 4;

    public static void Paint(Sheet sheet, ChartData data, RangeUnit unit, SKRect area)
    {
        var place = new SKPoint(area.Left, area.Top + 12);
        foreach (var (text, key) in Entries(sheet, data, unit))
        {
            var width = KeyWidth + 6 + sheet.Width(text, TextStyle.Body);
            if (place.X + width > area.Right)
            {
                place = new SKPoint(area.Left, place.Y + RowHeight);
            }

            key(new SKRect(place.X, place.Y - 10, place.X + KeyWidth, place.Y + 2));
            sheet.Text(text, place.X + KeyWidth + 6, place.Y, TextStyle.Body, sheet.Colours.Ink);
            place.X += width + Gap;
        }
    }

    /// <summary>A dashed line to the right.</summary>
    public static void Dashes(Sheet sheet, SKPoint from, float right, SKColor colour)
    {
        using var path = new SKPath();
        for (var x = from.X; x < right; x += DashOn + DashOff)
        {
            path.MoveTo(x, from.Y);
            path.LineTo(Math.Min(x + DashOn, right), from.Y);
        }

        sheet.Outline(path, 1.6f, colour);
    }

    private static IEnumerable<(string Text, Action<SKRect> Key)> Entries(Sheet sheet, ChartData data, RangeUnit unit)
    {
        foreach (var term in Enum.GetValues<LookTerm>())
        {
            var text = term == LookTerm.Range ? $"lost to range beyond {RangeText.Of(data.TopRangeM, unit)} ({(data.TopIsNeed ? "Pd 0.5 in free space" : "the nearest look")})" : "to " + TermColours.Name(term);
            yield return (text, box => sheet.Rect(box, TermColours.Of(term)));
        }

        var colours = sheet.Colours;
        yield return ("what is left: SNR", box => sheet.Line(new SKPoint(box.Left, box.MidY), new SKPoint(box.Right, box.MidY), 1.2f, colours.Ink));
        yield return ("needed", box => Dashes(sheet, new SKPoint(box.Left, box.MidY), box.Right, colours.Ink));
        foreach (var group in data.Outcomes.GroupBy(o => o.Outcome).OrderBy(g => g.Key))
        {
            yield return ($"{OutcomeText.Of(group.Key)} ({group.Count()})", box => Glyphs.Outcome(sheet, group.Key, new SKPoint(box.MidX, box.MidY), 4.5f));
        }
    }
}
