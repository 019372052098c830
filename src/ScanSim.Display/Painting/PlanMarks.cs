using System.Collections.Immutable;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>What moves on the plan: beam, plots by age, targets where they really are and their trails.</summary>
internal sealed class PlanMarks(Sheet sheet, PlanProjection plan, Scene scene, ViewOptions view, double timeS)
{
    private readonly double periodS = scene.Beam.PeriodS;

    public IReadOnlyList<TargetNow> TargetsNow()
    {
        var found = new List<TargetNow>(scene.Targets.Length);
        foreach (var target in scene.Targets)
        {
            if (TruthAtTime.At(target.Truth, timeS, periodS) is { } now && plan.ToPlan(now.EastM, now.NorthM) is var place && plan.Area.Contains(place))
            {
                var (rightMps, upMps) = plan.Turn(now.EastMps, now.NorthMps);
                found.Add(new TargetNow(target, place, (float)rightMps, (float)upMps, now.View == TargetView.InView));
            }
        }

        return found;
    }

    public void PaintBeam()
    {
        var azimuthRad = scene.Beam.AzimuthRad(timeS);
        using var wedge = Pie(azimuthRad - scene.BeamwidthRad / 2, scene.BeamwidthRad);
        sheet.Fill(wedge, sheet.Colours.Ink.WithAlpha(0x38));
        sheet.Outline(wedge, 0.8f, sheet.Colours.Ink.WithAlpha(0x70));
    }

    public void PaintBlanked()
    {
        foreach (var sector in scene.Blanked)
        {
            using var pie = Pie(sector.FromRad, sector.WidthRad);
            sheet.Fill(pie, sheet.Colours.Trail.WithAlpha(0x30));
            sheet.Outline(pie, 1, sheet.Colours.Trail.WithAlpha(0x90));
        }

        if (scene.Beam.Limits is { } limits)
        {
            using var pie = Pie(limits.FromRad, limits.WidthRad);
            sheet.Outline(pie, 1.2f, sheet.Colours.Trail);
        }
    }

    public void PaintTrails()
    {
        using var path = new SKPath();
        foreach (var target in scene.Targets)
        {
            if (TruthAtTime.At(target.Truth, timeS, periodS) is not { } now)
            {
                continue;
            }

            path.MoveTo(plan.ToPlan(now.EastM, now.NorthM));
            for (var i = TruthAtTime.IndexAt(target.Truth, timeS); i >= 0 && target.Truth[i].TimeS >= timeS - view.TrailScans * periodS; i--)
            {
                path.LineTo(plan.ToPlan(target.Truth[i].EastM, target.Truth[i].NorthM));
            }
        }

        sheet.Outline(path, 1, sheet.Colours.Trail);
    }

    /// <summary>Oldest first, so that the newest lies on top; returns where the plots are, for the labels to avoid.</summary>
    public List<SKPoint> PaintPlots()
    {
        var all = new List<SKPoint>();
        using var diamonds = new SKPath();
        var recent = RecentPlots();
        for (var age = view.AfterglowScans - 1; age >= 0; age--)
        {
            var discs = new List<SKPoint>();
            diamonds.Reset();
            foreach (ref readonly var plot in recent)
            {
                if (Afterglow.AgeScans(timeS, plot.TimeS, periodS) != age || (plot.Kind == EchoKind.Noise && !view.ShowFalsePlots))
                {
                    continue;
                }

                var place = plan.ToPlan(plot.EastM, plot.NorthM);
                if (!plan.Area.Contains(place))
                {
                    continue;
                }

                all.Add(place);
                if (plot.Kind == EchoKind.Noise)
                {
                    Glyphs.FalsePlot(diamonds, place, plan.SymbolScale);
                }
                else
                {
                    discs.Add(place);
                }
            }

            var alpha = (byte)Math.Round(255 * Afterglow.Opacity(age, view.AfterglowScans));
            sheet.Outline(diamonds, 1.4f, sheet.Colours.FalsePlot.WithAlpha(alpha));
            if (discs.Count > 0)
            {
                sheet.Discs([.. discs], Glyphs.PlotRadius * plan.SymbolScale, sheet.Colours.Plot.WithAlpha(alpha));
            }
        }

        return all;
    }

    public void PaintTargets(IReadOnlyList<TargetNow> targets)
    {
        using var inView = new SKPath();
        using var outOfView = new SKPath();
        foreach (var target in targets)
        {
            Glyphs.Truth(target.IsInView ? inView : outOfView, target.Position, target.RightMps, target.UpMps, target.IsInView, plan.SymbolScale);
        }

        sheet.Outline(outOfView, 1.3f, sheet.Colours.Quiet);
        sheet.Outline(inView, 1.4f, sheet.Colours.Truth);
    }

    private ReadOnlySpan<PlotMark> RecentPlots()
    {
        var first = FirstAfter(scene.Plots, timeS - view.AfterglowScans * periodS);
        return scene.Plots.AsSpan()[first..FirstAfter(scene.Plots, timeS)];
    }

    public static int FirstAfter(ImmutableArray<PlotMark> plots, double timeS)
    {
        var low = 0;
        var high = plots.Length;
        while (low < high)
        {
            var middle = (low + high) >> 1;
            if (plots[middle].TimeS <= timeS)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        return low;
    }

    /// <summary>A slice of the instrumented range, clockwise from an azimuth.</summary>
    private SKPath Pie(double fromRad, double widthRad)
    {
        var origin = plan.Origin;
        var radius = plan.ToPx(scene.InstrumentedRangeM);
        var path = new SKPath();
        path.MoveTo(origin);
        path.ArcTo(
            new SKRect(origin.X - radius, origin.Y - radius, origin.X + radius, origin.Y + radius),
            (float)((fromRad - plan.UpRad) * (180 / Math.PI) - 90),
            (float)(widthRad * (180 / Math.PI)),
            false);
        path.Close();
        return path;
    }
}
