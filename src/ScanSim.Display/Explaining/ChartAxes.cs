using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Explaining;

/// <summary>Time across (UTC), SNR per pulse upwards, with grid lines and labels.</summary>
internal sealed class ChartAxes(Sheet sheet, ChartData data, DateTimeOffset startUtc, SKRect plot, SKRect strip)
{
    private const float LeastTickX = 84;
    private const float LeastTickY = 34;

    public SKPoint At(double timeS, double db)
    {
        var x = plot.Left + (timeS - data.FromS) / Math.Max(data.ToS - data.FromS, 1e-9) * plot.Width;
        var level = double.IsNegativeInfinity(db) ? data.LowestDb : db;
        var y = plot.Bottom - (level - data.LowestDb) / (data.HighestDb - data.LowestDb) * plot.Height;
        return new SKPoint((float)x, (float)y);
    }

    public void Paint()
    {
        PaintLevels();
        PaintTimes();
    }

    private void PaintLevels()
    {
        var step = NiceStep.AtLeast((data.HighestDb - data.LowestDb) * LeastTickY / plot.Height);
        for (var n = Math.Ceiling(data.LowestDb / step); n * step <= data.HighestDb; n++)
        {
            var y = At(data.FromS, n * step).Y;
            sheet.Line(new SKPoint(plot.Left, y), new SKPoint(plot.Right, y), 1, sheet.Colours.Grid);
            sheet.Text($"{n * step + 0.0:0.##}", plot.Left - 8, y + 4, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
        }

        sheet.Canvas.Save();
        sheet.Canvas.RotateDegrees(-90, 24, plot.MidY);
        sheet.Text("SNR per pulse, dB", 24, plot.MidY, TextStyle.Body, sheet.Colours.Ink, SKTextAlign.Center);
        sheet.Canvas.Restore();
    }

    private void PaintTimes()
    {
        var leastS = (data.ToS - data.FromS) * LeastTickX / plot.Width;
        var stepS = leastS < 0.5 ? NiceStep.AtLeast(leastS) : NiceStep.TimeAtLeast(leastS);
        foreach (var tickS in TimeAxis.TicksS(startUtc.AddSeconds(data.FromS), data.ToS - data.FromS, stepS))
        {
            var x = At(data.FromS + tickS, 0).X;
            sheet.Line(new SKPoint(x, plot.Top), new SKPoint(x, strip.Bottom + 4), 1, sheet.Colours.Grid);
            sheet.Text(Label(data.FromS + tickS, stepS), x, strip.Bottom + 18, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Center);
        }

        sheet.Text("time, UTC", plot.MidX, strip.Bottom + 38, TextStyle.Body, sheet.Colours.Ink, SKTextAlign.Center);
    }

    private string Label(double timeS, double stepS)
    {
        if (stepS < 1)
        {
            return startUtc.ToUniversalTime().AddSeconds(timeS).AddMicroseconds(0.5).ToString("HH:mm:ss.fff");
        }

        // Half a millisecond keeps 11:59:59.9999999 from being cut to 11:59.
        var time = startUtc.ToUniversalTime().AddSeconds(timeS).AddMilliseconds(0.5);
        return time.ToString(stepS < 60 ? "HH:mm:ss" : "HH:mm");
    }
}
