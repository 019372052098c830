using System.Collections.Immutable;
using ScanSim.Display.Painting;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Plots of targets upwards, false plots downwards, scan by scan; means over a few scans where scans are narrow. With two recordings: left above, right below.</summary>
internal sealed class ScanStrip(Sheet sheet, ReplayState state, ReplayWorld world, ReplayLayout layout)
{
    private const float LeastBarPx = 3;

    public void Paint()
    {
        var strip = SKRect.Inflate(layout.Strip, 0, -2);
        var height = strip.Height / world.Recordings.Length;
        for (var i = 0; i < world.Recordings.Length; i++)
        {
            PaintOne(world.Recordings[i].Scene, new SKRect(strip.Left, strip.Top + i * height, strip.Right, strip.Top + (i + 1) * height - (world.IsComparison ? 1 : 0)));
        }

        var label = world.IsComparison ? "plots, l. / r." : "plots / false";
        sheet.Text(label, layout.Strip.Left - 10, layout.Strip.MidY + 4, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
    }

    private void PaintOne(Scene scene, SKRect box)
    {
        var spanS = state.TimelineToS - state.TimelineFromS;
        var scansABar = Math.Max(1, (int)Math.Ceiling(LeastBarPx * spanS / (scene.Beam.PeriodS * box.Width)));
        var bars = Bars(scene, scansABar);
        if (bars.Count == 0)
        {
            return;
        }

        var most = Math.Max(1, bars.Max(bar => bar.True + bar.False));
        var falseMost = bars.Max(bar => bar.False);
        var baseline = box.Bottom - box.Height * (float)(falseMost / most);
        sheet.Line(new SKPoint(box.Left, baseline), new SKPoint(box.Right, baseline), 0.5f, sheet.Colours.Rule);
        var gap = layout.Strip.Width * scene.Beam.PeriodS * scansABar / spanS > 5 ? 1 : 0;
        foreach (var bar in bars)
        {
            var (left, right) = (X(bar.FromS, box), X(bar.ToS, box) - gap);
            sheet.Rect(new SKRect(left, baseline - box.Height * (float)(bar.True / most), right, baseline), sheet.Colours.Plot);
            sheet.Rect(new SKRect(left, baseline, right, baseline + box.Height * (float)(bar.False / most)), sheet.Colours.FalsePlot);
        }
    }

    private float X(double timeS, SKRect box) => Math.Clamp(MathF.Round(box.Left + (float)((timeS - state.TimelineFromS) / (state.TimelineToS - state.TimelineFromS)) * box.Width), box.Left, box.Right);

    private List<(double FromS, double ToS, double True, double False)> Bars(Scene scene, int scansABar)
    {
        var bars = new List<(double, double, double, double)>();
        var scans = scene.Scans;
        for (var i = FirstIn(scans); i < scans.Length && scans[i].StartS < state.TimelineToS;)
        {
            var (start, group) = (i, scans[i].Scan / scansABar);
            var (plots, falsePlots) = (0, 0);
            for (; i < scans.Length && scans[i].Scan / scansABar == group; i++)
            {
                plots += scans[i].Plots - scans[i].FalsePlots;
                falsePlots += scans[i].FalsePlots;
            }

            bars.Add((scans[start].StartS, scans[i - 1].EndS, (double)plots / (i - start), (double)falsePlots / (i - start)));
        }

        return bars;
    }

    private int FirstIn(ImmutableArray<ScanRow> scans)
    {
        var (low, high) = (0, scans.Length);
        while (low < high)
        {
            var middle = (low + high) >> 1;
            (low, high) = scans[middle].EndS <= state.TimelineFromS ? (middle + 1, high) : (low, middle);
        }

        return low;
    }
}
