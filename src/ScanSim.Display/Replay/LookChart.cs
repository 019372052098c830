using System.Collections.Immutable;
using ScanSim.Display.Painting;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Small charts of the selected target's looks around the time shown: SNR with the SNR needed, and Pd.</summary>
internal sealed class LookChart(Sheet sheet, Scene scene, double timeS, SKRect box)
{
    private const double ScansBefore = 40;
    private const double ScansAfter = 20;
    private const float ScaleWidth = 26;
    private readonly double fromS = timeS - ScansBefore * scene.Beam.PeriodS;
    private readonly double toS = timeS + ScansAfter * scene.Beam.PeriodS;
    private readonly SKRect plot = new(box.Left + ScaleWidth, box.Top + 2, box.Right, box.Bottom - 2);

    /// <summary>A mark for each look, shaped by outcome.</summary>
    public void PaintSnr(ImmutableArray<LookMark> looks, double? neededDb)
    {
        var shown = new List<LookMark>();
        for (var i = ReplaySteps.FirstFrom(looks, fromS); i < looks.Length && looks[i].TimeS <= toS; i++)
        {
            if (float.IsFinite(looks[i].SnrDb))
            {
                shown.Add(looks[i]);
            }
        }

        var (low, high) = Limits(shown, neededDb);
        PaintFrame($"{high:0}", $"{low:0}");
        if (neededDb is { } needed)
        {
            var y = Y(needed, low, high);
            sheet.Line(new SKPoint(plot.Left, y), new SKPoint(plot.Right, y), 1, sheet.Colours.Ink.WithAlpha(0xB0));
        }

        foreach (var marks in shown.GroupBy(look => look.Outcome))
        {
            Glyphs.Outcomes(sheet, marks.Key, [.. marks.Select(look => new SKPoint(X(look.TimeS), Y(look.SnrDb, low, high)))], 2.4f);
        }
    }

    /// <summary>Bars from 0 to 1.</summary>
    public void PaintPd(ImmutableArray<LookRow> looks)
    {
        PaintFrame("1", "0");
        var width = Math.Max(1, (float)(plot.Width / (ScansBefore + ScansAfter)) - 1);
        for (var i = SelectedLooks.LastUpTo(looks, fromS) + 1; i < looks.Length && looks[i].TimeS <= toS; i++)
        {
            var x = X(looks[i].TimeS);
            sheet.Rect(new SKRect(Math.Max(plot.Left, x - width / 2), Y(looks[i].Pd, 0, 1), Math.Min(plot.Right, x + width / 2), plot.Bottom), sheet.Colours.Plot);
        }
    }

    private void PaintFrame(string high, string low)
    {
        sheet.Rect(plot, sheet.Colours.Ground);
        sheet.Text(high, plot.Left - 5, plot.Top + 9, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        sheet.Text(low, plot.Left - 5, plot.Bottom, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        var now = X(timeS);
        sheet.Line(new SKPoint(now, plot.Top), new SKPoint(now, plot.Bottom), 1, sheet.Colours.Trail);
    }

    private static (double LowDb, double HighDb) Limits(List<LookMark> looks, double? neededDb)
    {
        var values = looks.Select(look => (double)look.SnrDb).Concat(neededDb is { } needed ? [needed] : []).ToList();
        if (values.Count == 0)
        {
            return (0, 10);
        }

        var low = Math.Floor((values.Min() - 1) / 5) * 5;
        return (low, Math.Max(low + 5, Math.Ceiling((values.Max() + 1) / 5) * 5));
    }

    private float X(double atS) => plot.Left + (float)((atS - fromS) / (toS - fromS)) * plot.Width;

    private float Y(double value, double low, double high) => plot.Bottom - 2 - (float)((value - low) / (high - low)) * (plot.Height - 4);
}
