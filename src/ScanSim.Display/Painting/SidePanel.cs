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
        y = new PlanLegend(sheet, scene, view, left).Paint(y);
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

    private int ScanIndex() => ScanIndexAt(scene, timeS);

    /// <summary>Index of the scan that a time lies in; −1 before the first.</summary>
    public static int ScanIndexAt(Scene scene, double timeS)
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
