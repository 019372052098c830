using System.Collections.Immutable;
using ScanSim.Display.Overlays;
using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Coastlines, zones and places under the plan: areas faintly filled, lines quiet, so that echoes stand out.</summary>
internal static class OverlayPainter
{
    public static void Paint(Sheet sheet, PlanProjection plan, ImmutableArray<Overlay> overlays)
    {
        using var open = new SKPath();
        using var closed = new SKPath { FillType = SKPathFillType.EvenOdd };
        foreach (var line in overlays.SelectMany(overlay => overlay.Lines))
        {
            Add(line.Closed ? closed : open, plan, line);
        }

        sheet.Fill(closed, sheet.Colours.Trail.WithAlpha(0x20));
        sheet.Outline(closed, 1.2f, sheet.Colours.Trail.WithAlpha(0xC0));
        sheet.Outline(open, 1.2f, sheet.Colours.Trail.WithAlpha(0xC0));
        var names = new List<SKRect>();
        foreach (var point in overlays.SelectMany(overlay => overlay.Points))
        {
            PaintPoint(sheet, plan.ToPlan(point.Place.EastM, point.Place.NorthM));
            PaintName(sheet, plan.Area, plan.ToPlan(point.Place.EastM, point.Place.NorthM), point.Name, names);
        }

        foreach (var line in overlays.SelectMany(overlay => overlay.Lines))
        {
            // At a vertex in the middle of the line: its ends are often where the map was cut.
            var at = line.Vertices[line.Vertices.Length / 2];
            PaintName(sheet, plan.Area, plan.ToPlan(at.EastM, at.NorthM), line.Name, names);
        }
    }

    private static void Add(SKPath path, PlanProjection plan, OverlayLine line)
    {
        path.MoveTo(plan.ToPlan(line.Vertices[0].EastM, line.Vertices[0].NorthM));
        foreach (var vertex in line.Vertices.AsSpan()[1..])
        {
            path.LineTo(plan.ToPlan(vertex.EastM, vertex.NorthM));
        }

        if (line.Closed)
        {
            path.Close();
        }
    }

    private static void PaintPoint(Sheet sheet, SKPoint place)
    {
        sheet.Line(new SKPoint(place.X - 3.5f, place.Y - 3.5f), new SKPoint(place.X + 3.5f, place.Y + 3.5f), 1.2f, sheet.Colours.Quiet);
        sheet.Line(new SKPoint(place.X - 3.5f, place.Y + 3.5f), new SKPoint(place.X + 3.5f, place.Y - 3.5f), 1.2f, sheet.Colours.Quiet);
    }

    /// <summary>Names that would touch one another or the edge are left out.</summary>
    private static void PaintName(Sheet sheet, SKRect area, SKPoint place, string name, List<SKRect> taken)
    {
        var box = SKRect.Create(place.X + 6, place.Y - 7, sheet.Width(name, TextStyle.Small), 14);
        if (name.Length == 0 || !area.Contains(box) || taken.Exists(other => other.IntersectsWith(box)))
        {
            return;
        }

        taken.Add(box);
        sheet.Text(name, box.Left, box.Bottom - 3, TextStyle.Small, sheet.Colours.GridText);
    }
}
