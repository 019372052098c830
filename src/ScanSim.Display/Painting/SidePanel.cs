using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Time, scan and beam in figures, and what the plan's shapes mean.</summary>
internal sealed class SidePanel(Sheet sheet, Scene scene, ViewOptions view, double timeS, SKRect area)
{
    private const float LineHeight = 16;
    private readonly float left = area.Left + 16;
    private readonly float right = area.Right - 14;
    private float y = area.Top;

    public void Paint()
    {
        sheet.Rect(area, sheet.Colours.Panel);
        PaintTime();
        PaintFigures();
        PaintLegend();
    }

    private void PaintTime()
    {
        var now = scene.StartUtc.ToUniversalTime().AddSeconds(timeS);
        y += 30;
        var after = sheet.Text(now.ToString("HH:mm:ss"), left, y, TextStyle.Clock, sheet.Colours.Ink);
        sheet.Text("UTC", after + 6, y, TextStyle.Body, sheet.Colours.Quiet);
        y += 9;
        Figure("Date", now.ToString("yyyy-MM-dd"));
    }

    private void PaintFigures()
    {
        var degrees = 180 / Math.PI;
        Figure("Since start", $"{timeS:0.0} s");
        var index = ScanIndex();
        Figure("Scan", index < 0 ? "none" : $"{scene.Scans[index].Scan} ({index + 1} of {scene.Scans.Length})");
        Figure("Beam, width", $"{scene.Beam.AzimuthRad(timeS) * degrees:000.0}°, {scene.BeamwidthRad * degrees:0.0#}°");
        Figure("Scan period", $"{scene.Beam.PeriodS:0.0##} s");
        Figure("Instrumented to", RangeText.Of(scene.InstrumentedRangeM, view.Unit));
        Figure("Targets in view", TargetsInView());
        Figure("Last full scan", index < 1 ? "none" : $"{Plots(scene.Scans[index - 1].Plots)}, {scene.Scans[index - 1].FalsePlots} false");
        y += 8;
        sheet.Line(new SKPoint(left, y), new SKPoint(right, y), 1, sheet.Colours.Rule);
        y += 4;
    }

    private string TargetsInView()
    {
        var now = scene.Targets.Select(t => TruthAtTime.At(t.Truth, timeS, scene.Beam.PeriodS)).OfType<TruthMark>().ToList();
        return $"{now.Count(t => t.View == TargetView.InView)} of {now.Count}";
    }

    private static string Plots(int count) => count == 1 ? "1 plot" : $"{count} plots";

    private void Figure(string name, string value)
    {
        y += LineHeight;
        sheet.Text(name, left, y, TextStyle.Body, sheet.Colours.Quiet);
        sheet.Text(value, right, y, TextStyle.Body, sheet.Colours.Ink, SKTextAlign.Right);
    }

    private void PaintLegend()
    {
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

    private int ScanIndex()
    {
        var low = 0;
        var high = scene.Scans.Length;
        while (low < high)
        {
            var middle = (low + high) >> 1;
            if (scene.Scans[middle].StartS <= timeS)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        return low - 1;
    }
}
