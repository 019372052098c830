using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>A canvas with a theme and our letters: the few strokes all parts of the picture are made of. Lengths in layout units.</summary>
internal sealed class Sheet : IDisposable
{
    private readonly SKPaint fill = new() { IsAntialias = true, Style = SKPaintStyle.Fill };
    private readonly SKPaint stroke = new() { IsAntialias = true, Style = SKPaintStyle.Stroke };
    private readonly SKFont[] fonts;
    private readonly bool forSvg;

    public Sheet(SKCanvas canvas, Colours colours, bool forSvg, ICollection<DrawnText>? journal)
    {
        Canvas = canvas;
        Colours = colours;
        Journal = journal;
        this.forSvg = forSvg;
        fonts = [.. Enum.GetValues<TextStyle>().Select(NewFont)];
    }

    public SKCanvas Canvas { get; }

    public Colours Colours { get; }

    private ICollection<DrawnText>? Journal { get; }

    /// <summary>Never below 11: smaller is not read on a screen at arm's length.</summary>
    public static float SizeOf(TextStyle style) => style switch
    {
        TextStyle.Small => 11,
        TextStyle.Clock => 20,
        TextStyle.Title => 17,
        _ => 12,
    };

    public float Width(string text, TextStyle style) => fonts[(int)style].MeasureText(text);

    /// <summary>Sets text on a baseline; returns the x after it when set from the left.</summary>
    public float Text(string text, float x, float baseline, TextStyle style, SKColor colour, SKTextAlign align = SKTextAlign.Left)
    {
        var font = fonts[(int)style];
        var width = font.MeasureText(text);
        var left = align switch { SKTextAlign.Right => x - width, SKTextAlign.Center => x - width / 2, _ => x };
        fill.Color = colour;
        if (forSvg)
        {
            using var path = font.GetTextPath(text, new SKPoint(left, baseline));
            Canvas.DrawPath(path, fill);
        }
        else
        {
            Canvas.DrawText(text, left, baseline, SKTextAlign.Left, font, fill);
        }

        Journal?.Add(new DrawnText(text, font.Size, TextBox(left, baseline, width, font.Size)));
        return left + width;
    }

    /// <summary>The box that text covers: capitals and figures above the baseline, descenders below it.</summary>
    public static SKRect TextBox(float left, float baseline, float width, float size) =>
        new(left, baseline - 0.76f * size, left + width, baseline + 0.22f * size);

    /// <summary>Text cut to a width, with an ellipsis where something is missing.</summary>
    public string Fit(string text, TextStyle style, float width)
    {
        if (Width(text, style) <= width)
        {
            return text;
        }

        var length = text.Length - 1;
        while (length > 0 && Width(text[..length] + "…", style) > width)
        {
            length--;
        }

        return text[..length] + "…";
    }

    public void Line(SKPoint from, SKPoint to, float width, SKColor colour)
    {
        Stroke(width, colour);
        Canvas.DrawLine(from, to, stroke);
    }

    public void Rect(SKRect box, SKColor colour)
    {
        fill.Color = colour;
        Canvas.DrawRect(box, fill);
    }

    public void Frame(SKRect box, float width, SKColor colour)
    {
        Stroke(width, colour);
        Canvas.DrawRect(box, stroke);
    }

    public void Disc(SKPoint centre, float radius, SKColor colour)
    {
        fill.Color = colour;
        Canvas.DrawCircle(centre, radius, fill);
    }

    public void Ring(SKPoint centre, float radius, float width, SKColor colour)
    {
        Stroke(width, colour);
        Canvas.DrawCircle(centre, radius, stroke);
    }

    public void Fill(SKPath path, SKColor colour)
    {
        fill.Color = colour;
        Canvas.DrawPath(path, fill);
    }

    public void Outline(SKPath path, float width, SKColor colour)
    {
        Stroke(width, colour);
        Canvas.DrawPath(path, stroke);
    }

    /// <summary>Many discs of one colour, each blended by itself.</summary>
    public void Discs(SKPoint[] centres, float radius, SKColor colour)
    {
        if (forSvg)
        {
            // A point is a line of no length there, which some readers leave out in spite of its round ends.
            foreach (var centre in centres)
            {
                Disc(centre, radius, colour);
            }

            return;
        }

        Stroke(2 * radius, colour);
        stroke.StrokeCap = SKStrokeCap.Round;
        Canvas.DrawPoints(SKPointMode.Points, centres, stroke);
        stroke.StrokeCap = SKStrokeCap.Butt;
    }

    public void Dispose()
    {
        fill.Dispose();
        stroke.Dispose();
        foreach (var font in fonts)
        {
            font.Dispose();
        }
    }

    private static SKFont NewFont(TextStyle style)
    {
        var bold = style is TextStyle.Strong or TextStyle.Clock or TextStyle.Title;
        return new SKFont(bold ? Typefaces.Bold : Typefaces.Regular, SizeOf(style))
        {
            Hinting = SKFontHinting.None,
            Subpixel = true,
            Edging = SKFontEdging.Antialias,
        };
    }

    private void Stroke(float width, SKColor colour)
    {
        stroke.StrokeWidth = width;
        stroke.Color = colour;
    }
}
