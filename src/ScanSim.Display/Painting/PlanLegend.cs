using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>What the plan's shapes mean.</summary>
internal sealed class PlanLegend(Sheet sheet, Scene scene, ViewOptions view, float left)
{
    private const float LineHeight = 16;
    private float y;

    /// <summary>Paints from a height downwards and returns the height reached.</summary>
    public float Paint(float top)
    {
        y = top;
        Entry(view.AfterglowScans == 1 ? "Plot of this scan" : $"Plots, last {view.AfterglowScans} scans", c =>
        {
            for (var i = 3; i >= 0; i--)
            {
                var alpha = (byte)(255 * Afterglow.Opacity(i * view.AfterglowScans / 4, view.AfterglowScans));
                sheet.Disc(new SKPoint(c.X + 11 - 7.5f * i, c.Y), Glyphs.PlotRadius, sheet.Colours.Plot.WithAlpha(alpha));
            }
        });
        if (view.ShowFalsePlots)
        {
            Entry("False plot", c => Outline(path => Glyphs.FalsePlot(path, c), sheet.Colours.FalsePlot));
        }

        if (view.ShowTruth)
        {
            Entry("Target (truth), trail", c =>
            {
                sheet.Line(new SKPoint(c.X - 14, c.Y), new SKPoint(c.X - 1, c.Y), 1, sheet.Colours.Trail);
                Outline(path => Glyphs.Truth(path, c, 1, 0, true), sheet.Colours.Truth);
            });
            Entry("Target out of view", c => Outline(path => Glyphs.Truth(path, c, 0, 0, false), sheet.Colours.Quiet));
        }

        Entry("Beam, true width", c => Wedge(c, sheet.Colours.Ink.WithAlpha(0x38), sheet.Colours.Ink.WithAlpha(0x70), 3));
        if (scene.Beam.Limits is not null)
        {
            Entry("Swept sector", c => Wedge(c, SKColors.Transparent, sheet.Colours.Trail, 6));
        }

        if (!scene.Blanked.IsEmpty)
        {
            Entry("Transmitter off", c => Wedge(c, sheet.Colours.Trail.WithAlpha(0x30), sheet.Colours.Trail.WithAlpha(0x90), 6));
        }

        return y;
    }

    private void Entry(string text, Action<SKPoint> paint)
    {
        y += LineHeight + 1;
        paint(new SKPoint(left + 14, y - 4));
        sheet.Text(text, left + 40, y, TextStyle.Body, sheet.Colours.Ink);
    }

    private void Outline(Action<SKPath> draw, SKColor colour)
    {
        using var path = new SKPath();
        draw(path);
        sheet.Outline(path, 1.4f, colour);
    }

    private void Wedge(SKPoint centre, SKColor fill, SKColor edge, float half)
    {
        using var path = new SKPath();
        path.MoveTo(centre.X - 14, centre.Y);
        path.LineTo(centre.X + 14, centre.Y - half);
        path.LineTo(centre.X + 14, centre.Y + half);
        path.Close();
        sheet.Fill(path, fill);
        sheet.Outline(path, 0.8f, edge);
    }
}
