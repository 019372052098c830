using System.Collections.Immutable;
using ScanSim.Display.Overlays;
using ScanSim.Display.Painting;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>One plan of the window. Ground, grid and trails are kept as pixels; beam, hits, plots, targets and labels are painted each frame.</summary>
internal sealed class ReplayPlan : IDisposable
{
    /// <summary>Trails are painted anew this often a scan; between, each grows by a straight stroke.</summary>
    private const double TrailStepsPerScan = 8;

    private readonly Layer ground = new();
    private readonly LabelKeeper labels = new();
    private (PlanFurniture Furniture, PlanGrid Grid, ImmutableArray<OverlayName> Names)? kept;
    private object? keptFor;

    public int Renewals => ground.Renewals;

    public int Layouts => labels.Layouts;

    public void Paint(Frame frame, Sheet sheet, ReplayState state, ReplayWorld world, int index, SKRect area)
    {
        var recording = world.Recordings[index];
        var scene = recording.Scene;
        var projection = ReplayMoves.Projection(state, world, area);
        var view = ViewOf(state, world);
        var trailS = state is { ShowTrails: true, ShowTruth: true } ? TrailTimeS(scene, state.TimeS) : double.NaN;
        var (furniture, grid, names) = GridOf(sheet, state, world, scene, projection);
        var key = (state.CentreEastM, state.CentreNorthM, state.RangeM, state.UpRad, state.Unit, state.Theme, state.ShowOverlays, trailS);
        ground.Show(frame, area, key, canvas => PaintGround(frame.SheetOn(canvas, sheet.Colours), area, projection, furniture, grid, scene, view, trailS, state.ShowOverlays ? world.Overlays : [], names));

        sheet.Canvas.Save();
        sheet.Canvas.ClipRect(area);
        var marks = new PlanMarks(sheet, projection, scene with { Plots = world.Stretches[index].Plots }, view, state.TimeS);
        var targets = state.ShowTruth ? marks.TargetsNow() : [];
        marks.PaintBeam();
        if (state.ShowHits)
        {
            PaintHits(sheet, projection, scene, world.Stretches[index], state);
        }

        marks.PaintTargets(targets);
        var plots = marks.PaintPlots();
        PaintSelection(sheet, targets, state);
        if (state.ShowLabels)
        {
            labels.Paint(sheet, area, targets, grid, furniture, plots, projection, [.. names.Select(name => name.Box), .. CaptionBox(sheet, world, recording, area)]);
        }

        PaintCaption(sheet, world, recording, state.TimeS, area);
        sheet.Canvas.Restore();
    }

    public void Dispose() => ground.Dispose();

    /// <summary>Rings and bearings with their labels. They stay where they are while the view does, though targets pass under the labels.</summary>
    private (PlanFurniture Furniture, PlanGrid Grid, ImmutableArray<OverlayName> Names) GridOf(Sheet sheet, ReplayState state, ReplayWorld world, Scene scene, PlanProjection projection)
    {
        var key = (projection.Area, state.CentreEastM, state.CentreNorthM, state.RangeM, state.UpRad, state.Unit, state.ShowTruth, state.ShowOverlays);
        if (kept is not { } grids || !key.Equals(keptFor))
        {
            // The site's name stands in the title: beside the site there is the most traffic.
            var furniture = new PlanFurniture(sheet, projection, "", state.Unit, []);
            var targets = state.ShowTruth ? new PlanMarks(sheet, projection, scene, new ViewOptions(), state.TimeS).TargetsNow() : [];
            var grid = new PlanGrid(
                sheet, projection, scene.InstrumentedRangeM, world.RangeM(state), state.Unit, furniture.Boxes, [.. targets.Select(target => target.Position)]);
            var names = OverlayPainter.Names(sheet, projection, state.ShowOverlays ? world.Overlays : [], PlanView.Taken(targets, grid, furniture, projection.Area));
            grids = (furniture, grid, names);
            (kept, keptFor) = (grids, key);
        }

        return grids;
    }

    private static ViewOptions ViewOf(ReplayState state, ReplayWorld world) => new()
    {
        CentreEastM = state.CentreEastM,
        CentreNorthM = state.CentreNorthM,
        RangeM = world.RangeM(state),
        Unit = state.Unit,
        Theme = state.Theme,
        AfterglowScans = state.AfterglowScans,
        ShowTruth = state.ShowTruth,
        ShowLabels = state.ShowLabels,
        ShowFalsePlots = state.ShowFalsePlots,
    };

    private static double TrailTimeS(Scene scene, double timeS)
    {
        var stepS = scene.Beam.PeriodS / TrailStepsPerScan;
        return Math.Floor(timeS / stepS) * stepS;
    }

    private static void PaintGround(Sheet sheet, SKRect area, PlanProjection projection, PlanFurniture furniture, PlanGrid grid, Scene scene, ViewOptions view, double trailS, ImmutableArray<Overlay> overlays, ImmutableArray<OverlayName> names)
    {
        using (sheet)
        {
            sheet.Rect(area, sheet.Colours.Ground);
            OverlayPainter.Paint(sheet, projection, overlays, names);
            var marks = new PlanMarks(sheet, projection, scene, view, trailS);
            marks.PaintBlanked();
            grid.With(sheet).PaintLines();
            if (!double.IsNaN(trailS))
            {
                marks.PaintTrails();
            }

            grid.With(sheet).PaintLabels();
            furniture.With(sheet).Paint();
        }
    }

    /// <summary>Hits of the last quarter of a scan: bright as the beam meets them, gone before it comes back.</summary>
    private static void PaintHits(Sheet sheet, PlanProjection plan, Scene scene, ReplayStretch stretch, ReplayState state)
    {
        var spanS = scene.Beam.PeriodS / 4;
        var first = FirstHitAfter(stretch.Hits, state.TimeS - spanS);
        var last = FirstHitAfter(stretch.Hits, state.TimeS);
        const int steps = 4;
        for (var step = 0; step < steps; step++)
        {
            var points = new List<SKPoint>();
            for (var i = first; i < last; i++)
            {
                var hit = stretch.Hits[i];
                if ((int)((state.TimeS - hit.TimeS) / spanS * steps) == step && (state.ShowFalsePlots || hit.Kind == EchoKind.Target))
                {
                    points.Add(plan.ToPlan(hit.EastM, hit.NorthM));
                }
            }

            if (points.Count > 0)
            {
                sheet.Discs([.. points], 1.4f, sheet.Colours.Ink.WithAlpha((byte)(255 * (steps - step) / steps)));
            }
        }
    }

    private static int FirstHitAfter(ImmutableArray<HitMark> hits, double timeS)
    {
        var (low, high) = (0, hits.Length);
        while (low < high)
        {
            var middle = (low + high) >> 1;
            (low, high) = hits[middle].TimeS <= timeS ? (middle + 1, high) : (low, middle);
        }

        return low;
    }

    /// <summary>Four corners around the selected target.</summary>
    private static void PaintSelection(Sheet sheet, IReadOnlyList<TargetNow> targets, ReplayState state)
    {
        foreach (var target in targets)
        {
            if (!string.Equals(target.Target.Id, state.Selected, StringComparison.Ordinal))
            {
                continue;
            }

            using var path = new SKPath();
            foreach (var (x, y) in ((float X, float Y)[])[(-1, -1), (1, -1), (1, 1), (-1, 1)])
            {
                var corner = new SKPoint(target.Position.X + 12 * x, target.Position.Y + 12 * y);
                path.MoveTo(corner.X - 5 * x, corner.Y);
                path.LineTo(corner);
                path.LineTo(corner.X, corner.Y - 5 * y);
            }

            sheet.Outline(path, 1.8f, sheet.Colours.Ink);
        }
    }

    /// <summary>With two recordings side by side: which one this is.</summary>
    /// <summary>Room for the caption of a comparison with the longest scan number, which labels keep clear of.</summary>
    private static IEnumerable<SKRect> CaptionBox(Sheet sheet, ReplayWorld world, ReplayRecording recording, SKRect area)
    {
        if (world.IsComparison)
        {
            var width = Math.Min(area.Width - 110, sheet.Width(CaptionOf(world, recording, ", scan 000000"), TextStyle.Strong));
            yield return new SKRect(area.Right - width - 20, area.Top + 8, area.Right - 8, area.Top + 28);
        }
    }

    private static string CaptionOf(ReplayWorld world, ReplayRecording recording, string scan) =>
        $"{world.NameOf(recording)}, {recording.Scene.Beam.PeriodS:0.0##} s a scan{scan}";

    private static void PaintCaption(Sheet sheet, ReplayWorld world, ReplayRecording recording, double timeS, SKRect area)
    {
        if (!world.IsComparison)
        {
            return;
        }

        var index = SidePanel.ScanIndexAt(recording.Scene, timeS);
        var scan = index < 0 ? "" : $", scan {recording.Scene.Scans[index].Scan}";
        var text = sheet.Fit(CaptionOf(world, recording, scan), TextStyle.Strong, area.Width - 110);
        var width = sheet.Width(text, TextStyle.Strong);
        sheet.Rect(new SKRect(area.Right - width - 20, area.Top + 8, area.Right - 8, area.Top + 28), sheet.Colours.Panel.WithAlpha(0xE0));
        sheet.Text(text, area.Right - 14, area.Top + 22, TextStyle.Strong, sheet.Colours.Ink, SKTextAlign.Right);
        sheet.Line(new SKPoint(area.Right - 0.5f, area.Top), new SKPoint(area.Right - 0.5f, area.Bottom), 1, sheet.Colours.Rule);
    }
}
