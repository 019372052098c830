using ScanSim.Display.Explaining;
using ScanSim.Display.Painting;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Scan and beam in figures; below, the selected target, or what the plan's shapes mean while none is selected.</summary>
internal static class ReplayPanel
{
    private const double Degree = Math.PI / 180;

    /// <summary>SI Brochure: 1 knot = 1852 m an hour.</summary>
    private const double KnotMps = 1852.0 / 3600;

    public static void Paint(Sheet sheet, ReplayState state, ReplayWorld world, SelectedLooks looks, SKRect area)
    {
        sheet.Rect(area, sheet.Colours.Panel);
        sheet.Canvas.Save();
        sheet.Canvas.ClipRect(area);
        var column = new PanelColumn(sheet, area);
        if (!world.IsComparison)
        {
            PaintScan(column, state, world.First.Scene);
            column.Rule();
        }

        if (state.Selected is null)
        {
            PaintLegend(sheet, column, state, world);
        }
        else
        {
            PaintTarget(sheet, column, state, world, looks, state.Selected);
        }

        sheet.Canvas.Restore();
    }

    private static void PaintScan(PanelColumn column, ReplayState state, Scene scene)
    {
        var index = SidePanel.ScanIndexAt(scene, state.TimeS);
        column.Figures("scan", index < 0 ? "none" : $"{scene.Scans[index].Scan} / {scene.Scans.Length}", "beam", $"{scene.Beam.AzimuthRad(state.TimeS) / Degree:000.0}°");
        column.Figures("period", $"{scene.Beam.PeriodS:0.0##} s", "width", $"{scene.BeamwidthRad / Degree:0.0#}°");
        column.Figures("since start", $"{state.TimeS:0.0} s", "in view", InView(scene, state.TimeS));
        column.Figure("last full scan", index < 1 ? "none" : $"{scene.Scans[index - 1].Plots} plots, {scene.Scans[index - 1].FalsePlots} false");
    }

    private static string InView(Scene scene, double timeS)
    {
        var (there, inView) = (0, 0);
        foreach (var target in scene.Targets)
        {
            if (TruthAtTime.At(target.Truth, timeS, scene.Beam.PeriodS) is { } now)
            {
                there++;
                inView += now.View == TargetView.InView ? 1 : 0;
            }
        }

        return $"{inView} of {there}";
    }

    private static void PaintLegend(Sheet sheet, PanelColumn column, ReplayState state, ReplayWorld world)
    {
        column.Paragraph("Click a target to see why it was seen or missed.", 2, sheet.Colours.Ink);
        column.Y += 2;
        var view = new ViewOptions { AfterglowScans = state.AfterglowScans, ShowFalsePlots = state.ShowFalsePlots, ShowTruth = state.ShowTruth };
        column.Y = new PlanLegend(sheet, world.First.Scene, view, column.Left).Paint(column.Y);
        if (state.ShowHits)
        {
            column.Y += 17;
            sheet.Disc(new SKPoint(column.Left + 14, column.Y - 4), 1.6f, sheet.Colours.Ink);
            sheet.Text("Hit, just now", column.Left + 40, column.Y, TextStyle.Body, sheet.Colours.Ink);
        }
    }

    private static void PaintTarget(Sheet sheet, PanelColumn column, ReplayState state, ReplayWorld world, SelectedLooks looks, string id)
    {
        var first = true;
        for (var i = 0; i < world.Recordings.Length; i++)
        {
            var recording = world.Recordings[i];
            if (recording.IndexOf(id) is not (var index and >= 0))
            {
                column.Heading(world.NameOf(recording));
                column.Paragraph($"It has no target {id}.", 1, sheet.Colours.Quiet);
                continue;
            }

            var target = recording.Scene.Targets[index];
            if (first)
            {
                column.Heading(id, target.Class);
                PaintPlace(column, state, recording.Scene, target);
                first = false;
            }

            if (world.IsComparison)
            {
                column.Rule();
                column.Heading(world.NameOf(recording), "seen in " + Seen(target));
            }

            new TargetLookPanel(sheet, column, state, recording, target, string.Equals(looks.Id, id, StringComparison.Ordinal) ? looks : SelectedLooks.Nothing, i, world.IsComparison).Paint();
        }
    }

    private static string Seen(SceneTarget target) => target.ScansInView == 0 ? "no scan" : $"{target.ScansWithPlot} of {target.ScansInView}";

    private static void PaintPlace(PanelColumn column, ReplayState state, Scene scene, SceneTarget target)
    {
        if (TruthAtTime.At(target.Truth, state.TimeS, scene.Beam.PeriodS) is not { } now)
        {
            column.Figure("place", "not there at this time");
            return;
        }

        var rangeM = Math.Sqrt((double)now.EastM * now.EastM + (double)now.NorthM * now.NorthM);
        var speedMps = Math.Sqrt((double)now.EastMps * now.EastMps + (double)now.NorthMps * now.NorthMps);
        column.Figures("range", RangeText.Precise(rangeM, state.Unit), "bearing", $"{Bearing(now.EastM, now.NorthM):000.0}°");
        column.Figures("height", $"{now.HeightM:0} m", "speed", $"{speedMps / KnotMps:0.0} kn");
        column.Figures("course", speedMps < 0.05 ? "–" : $"{Bearing(now.EastMps, now.NorthMps):000}°", "seen in", Seen(target));
    }

    private static double Bearing(double east, double north) => (Math.Atan2(east, north) / Degree + 360) % 360;
}
