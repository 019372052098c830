using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>The plan: seen from above, north up, in slant range as the radar measures it.</summary>
internal static class PlanView
{
    /// <summary>The projection that a view asks for in an area.</summary>
    public static PlanProjection Projection(Scene scene, ViewOptions view, SKRect area) =>
        new(area, view.CentreEastM, view.CentreNorthM, view.RangeM ?? scene.InstrumentedRangeM);

    public static void Paint(Sheet sheet, Scene scene, ViewOptions view, double timeS, SKRect area)
    {
        var plan = Projection(scene, view, area);
        sheet.Canvas.Save();
        sheet.Canvas.ClipRect(area);
        var marks = new PlanMarks(sheet, plan, scene, view, timeS);
        var targets = view.ShowTruth ? marks.TargetsNow() : [];
        var furniture = new PlanFurniture(sheet, plan, scene.SiteName, view.Unit, targets);
        var grid = new PlanGrid(sheet, plan, scene.InstrumentedRangeM, view.RangeM ?? scene.InstrumentedRangeM, view.Unit, [.. furniture.Boxes, CountBox(area)], [.. targets.Select(t => t.Position)]);
        var names = OverlayPainter.Names(sheet, plan, view.Overlays, Taken(targets, grid, furniture, area));
        OverlayPainter.Paint(sheet, plan, view.Overlays, names);
        marks.PaintBlanked();
        grid.PaintLines();
        if (view.ShowTruth)
        {
            marks.PaintTrails();
        }

        grid.PaintLabels();
        marks.PaintBeam();
        marks.PaintTargets(targets);
        var plots = marks.PaintPlots();
        if (view.ShowLabels)
        {
            PaintLabels(sheet, area, LabelsOf(sheet, area, targets, grid, furniture, plots, names.Select(name => name.Box)));
        }

        furniture.Paint();
        sheet.Canvas.Restore();
    }

    public static LabelLayout LabelsOf(
        Sheet sheet, SKRect area, IReadOnlyList<TargetNow> targets, PlanGrid grid, PlanFurniture furniture, IEnumerable<SKPoint> plots, IEnumerable<SKRect> taken)
    {
        var requests = targets
            .Select(t => new LabelRequest(t.Target.Id, t.Position, new SKSize(sheet.Width(t.Target.Id, TextStyle.Small) + 4, 14), !t.IsInView))
            .ToList();
        List<SKRect> obstacles = [.. furniture.Boxes, .. grid.Labels.Select(l => l.Box), .. taken, CountBox(area)];
        var courses = targets.SelectMany(t => CourseMarks(t));
        return LabelPlacer.Place(requests, SKRect.Inflate(area, -4, -4), obstacles, plots.Concat(courses));
    }

    /// <summary>What names of an overlay keep clear of: all that is set before them, and the targets' symbols.</summary>
    public static IEnumerable<SKRect> Taken(IEnumerable<TargetNow> targets, PlanGrid grid, PlanFurniture furniture, SKRect area) =>
    [
        .. furniture.Boxes,
        .. grid.Labels.Select(l => l.Box),
        .. targets.Select(t => SKRect.Create(t.Position.X - Glyphs.TruthRadius - 2, t.Position.Y - Glyphs.TruthRadius - 2, 2 * Glyphs.TruthRadius + 4, 2 * Glyphs.TruthRadius + 4)),
        CountBox(area),
    ];

    /// <summary>Two marks along the course stroke: a label prefers the other sides.</summary>
    private static IEnumerable<SKPoint> CourseMarks(TargetNow target)
    {
        var speed = MathF.Sqrt(target.RightMps * target.RightMps + target.UpMps * target.UpMps);
        if (target.IsInView && speed > 0)
        {
            var (ux, uy) = (target.RightMps / speed, -target.UpMps / speed);
            yield return new SKPoint(target.Position.X + 9 * ux, target.Position.Y + 9 * uy);
            yield return new SKPoint(target.Position.X + 12 * ux, target.Position.Y + 12 * uy);
        }
    }

    private static SKRect CountBox(SKRect area) => new(area.Right - 190, area.Bottom - 28, area.Right, area.Bottom);

    public static void PaintLabels(Sheet sheet, SKRect area, LabelLayout layout)
    {
        foreach (var label in layout.Placed)
        {
            if (label.HasLeader)
            {
                var (from, to) = (label.Request.Anchor, label.LeaderEnd);
                var share = (Glyphs.TruthRadius + 1) / SKPoint.Distance(from, to);
                var start = new SKPoint(from.X + share * (to.X - from.X), from.Y + share * (to.Y - from.Y));
                sheet.Line(start, to, 1, sheet.Colours.Quiet.WithAlpha(0xA0));
            }

            sheet.Rect(label.Box, sheet.Colours.Ground.WithAlpha(0xB0));
            var colour = label.Request.IsQuiet ? sheet.Colours.Quiet : sheet.Colours.Ink;
            sheet.Text(label.Request.Text, label.Box.Left + 2, label.Box.Bottom - 3, TextStyle.Small, colour);
        }

        if (layout.Omitted > 0)
        {
            var text = layout.Omitted == 1 ? "1 label has no room" : $"{layout.Omitted} labels have no room";
            sheet.Text(text, area.Right - 12, area.Bottom - 12, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        }
    }
}
