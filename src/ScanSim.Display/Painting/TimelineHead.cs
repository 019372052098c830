using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>The timeline's title and legend, in as many lines as the width needs. Only outcomes that occur are explained.</summary>
internal sealed class TimelineHead
{
    private const float LineHeight = 18;
    private const float SwatchWidth = 22;
    private const string Title = "Scan timeline";
    private readonly Sheet sheet;
    private readonly List<(LookOutcome Outcome, SKPoint Place)> entries = [];

    public TimelineHead(Sheet sheet, Scene scene, float width)
    {
        this.sheet = sheet;
        var start = 16 + sheet.Width(Title, TextStyle.Strong) + 26;
        var (x, y) = (start, 20f);
        foreach (var outcome in Occurring(scene))
        {
            var needed = SwatchWidth + sheet.Width(OutcomeText.Of(outcome), TextStyle.Body) + 20;
            if (x + needed > width - TimelineView.ShareWidth && x > start)
            {
                (x, y) = (start, y + LineHeight);
            }

            entries.Add((outcome, new SKPoint(x, y)));
            x += needed;
        }

        Height = y + 14;
    }

    public float Height { get; }

    /// <summary>Paints title and legend.</summary>
    /// <param name="top">Of the timeline.</param>
    /// <param name="columns">Whether the rows show shares in columns, or a mark for each scan.</param>
    public void Paint(float top, bool columns)
    {
        sheet.Text(Title, 16, top + 20, TextStyle.Strong, sheet.Colours.Ink);
        foreach (var (outcome, place) in entries)
        {
            var y = top + place.Y;
            if (columns)
            {
                OutcomeTexture.Fill(sheet, outcome, new SKRect(place.X, y - 9, place.X + 16, y + 1));
            }
            else
            {
                Glyphs.Outcome(sheet, outcome, new SKPoint(place.X + 9, y - 4), 4.5f);
            }

            sheet.Text(OutcomeText.Of(outcome), place.X + SwatchWidth, y, TextStyle.Body, sheet.Colours.Quiet);
        }
    }

    public static IEnumerable<LookOutcome> Occurring(Scene scene)
    {
        var found = new HashSet<LookOutcome>();
        foreach (var target in scene.Targets)
        {
            foreach (var look in target.Looks)
            {
                found.Add(look.Outcome);
            }
        }

        return found.Order();
    }
}
