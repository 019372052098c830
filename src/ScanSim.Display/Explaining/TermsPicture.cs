using System.Text;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Explaining;

/// <summary>The terms of a target's looks over time, as an SVG file. The same story gives the same bytes on the same system.</summary>
public static class TermsPicture
{
    private static readonly PictureSize Size = new(1200, 720);

    /// <summary>Writes beside the file and renames.</summary>
    /// <exception cref="PictureException">There is nothing to draw, or the file cannot be written.</exception>
    public static void Save(TargetStory story, string scenarioName, DateTimeOffset startUtc, RangeUnit unit, string path)
    {
        if (!string.Equals(Path.GetExtension(path), ".svg", StringComparison.OrdinalIgnoreCase))
        {
            throw new PictureException($"Picture '{path}' does not go: it must end in .svg.");
        }

        var data = ChartData.Of(story) ?? throw new PictureException(
            $"There is no look at '{story.Target.Id}' from {story.FromS:0.0} s to {story.ToS:0.0} s, so there are no terms to draw: choose another span of time.");
        var title = $"{scenarioName}: why {story.Target.Id} was seen or missed";
        var svg = Draw(sheet => new TermsChart(sheet, story, data, startUtc, unit).Paint(title, Size));
        FileBeside.Write(path, "Picture", unfinished => File.WriteAllText(unfinished, SvgEnvelope.Finish(svg, title, Size)));
    }

    private static string Draw(Action<Sheet> paint)
    {
        using var drawn = new MemoryStream();
        using (var canvas = SKSvgCanvas.Create(SKRect.Create(Size.WidthPx, Size.HeightPx), drawn))
        using (var sheet = new Sheet(canvas, Colours.Paper, forSvg: true, journal: null))
        {
            paint(sheet);
        }

        return Encoding.UTF8.GetString(drawn.ToArray());
    }
}
