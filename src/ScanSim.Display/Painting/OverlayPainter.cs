using System.Collections.Immutable;
using ScanSim.Display.Overlays;
using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Coastlines, zones and places under the plan: areas faintly filled, lines quiet, so that echoes stand out.</summary>
internal static class OverlayPainter
{
    public static void Paint(Sheet sheet, PlanProjection plan, ImmutableArray<Overlay> overlays, ImmutableArray<OverlayName> names)
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
        foreach (var point in overlays.SelectMany(overlay => overlay.Points))
        {
            PaintPoint(sheet, plan.ToPlan(point.Place.EastM, point.Place.NorthM));
        }

        foreach (var name in names)
        {
            sheet.Text(name.Text, name.Box.Left + 2, name.Box.Bottom - 3, TextStyle.Small, sheet.Colours.GridText);
        }
    }

    /// <summary>Places for the names that find one clear of what is taken and of each other: right, left, above or below; the rest is left out.</summary>
    public static ImmutableArray<OverlayName> Names(Sheet sheet, PlanProjection plan, ImmutableArray<Overlay> overlays, IEnumerable<SKRect> taken)
    {
        var points = overlays.SelectMany(overlay => overlay.Points).Select(point => (point.Name, plan.ToPlan(point.Place.EastM, point.Place.NorthM)));

        // A line's name stands at a vertex in its middle: its ends are often where the map was cut.
        var lines = overlays.SelectMany(overlay => overlay.Lines)
            .Select(line => (line.Name, plan.ToPlan(line.Vertices[line.Vertices.Length / 2].EastM, line.Vertices[line.Vertices.Length / 2].NorthM)));
        var obstacles = taken.ToList();
        var names = ImmutableArray.CreateBuilder<OverlayName>();
        foreach (var (text, place) in points.Concat(lines).Where(named => named.Name.Length > 0))
        {
            var width = sheet.Width(text, TextStyle.Small) + 4;
            foreach (var (left, top) in (ReadOnlySpan<(float, float)>)[(5, -7), (-5 - width, -7), (-width / 2, -20), (-width / 2, 6)])
            {
                var box = SKRect.Create(place.X + left, place.Y + top, width, 14);
                if (plan.Area.Contains(box) && !obstacles.Exists(other => other.IntersectsWith(box)))
                {
                    obstacles.Add(box);
                    names.Add(new OverlayName(text, box));
                    break;
                }
            }
        }

        return names.ToImmutable();
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
}
