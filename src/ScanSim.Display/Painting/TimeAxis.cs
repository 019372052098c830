using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Ticks at round clock times (UTC) under the timeline.</summary>
internal sealed class TimeAxis(Sheet sheet, Scene scene, SKRect rows)
{
    private const float LeastTickPx = 84;

    /// <summary>Tick times in seconds since the start.</summary>
    public static IEnumerable<double> TicksS(DateTimeOffset startUtc, double durationS, double stepS) => TicksS(startUtc, 0, durationS, stepS);

    /// <summary>The same for a part of the time.</summary>
    public static IEnumerable<double> TicksS(DateTimeOffset startUtc, double fromS, double toS, double stepS)
    {
        var startOfDayS = startUtc.ToUniversalTime().TimeOfDay.TotalSeconds;
        for (var n = Math.Ceiling((startOfDayS + fromS) / stepS); n * stepS - startOfDayS <= toS; n++)
        {
            yield return n * stepS - startOfDayS;
        }
    }

    public void Paint() => Paint(0, scene.DurationS);

    /// <summary>Ticks of the part of the time that the rows show.</summary>
    public void Paint(double fromS, double toS)
    {
        var stepS = NiceStep.TimeAtLeast((toS - fromS) * LeastTickPx / rows.Width);
        foreach (var tickS in TicksS(scene.StartUtc, fromS, toS, stepS))
        {
            var x = rows.Left + (float)((tickS - fromS) / (toS - fromS)) * rows.Width;
            sheet.Line(new SKPoint(x, rows.Top), new SKPoint(x, rows.Bottom + 4), 1, sheet.Colours.Grid);
            sheet.Text(Label(tickS, stepS), x, rows.Bottom + 16, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Center);
        }

        sheet.Text("UTC", rows.Left - 30, rows.Bottom + 16, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
    }

    private string Label(double tickS, double stepS)
    {
        // Half a millisecond keeps 11:59:59.9999999 from being cut to 11:59.
        var time = scene.StartUtc.ToUniversalTime().AddSeconds(tickS).AddMilliseconds(0.5);
        var isMidnight = time is { Hour: 0, Minute: 0, Second: 0 };
        return isMidnight ? time.ToString("yyyy-MM-dd") : time.ToString(stepS < 60 ? "HH:mm:ss" : "HH:mm");
    }
}
