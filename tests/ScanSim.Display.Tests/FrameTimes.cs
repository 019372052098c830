using System.Diagnostics;
using SkiaSharp;

namespace ScanSim.Display.Tests;

/// <summary>How long a frame takes, printed when SCANSIM_FRAMES=1: for whoever tunes the painter.</summary>
public sealed class FrameTimes(ITestOutputHelper output)
{
    [Theory]
    [InlineData(8, 300, true)]
    [InlineData(200, 300, true)]
    [InlineData(200, 300, false)]
    [InlineData(200, 3600, true)]
    public void Frame_times_are_printed_when_asked(int targets, double durationS, bool labels)
    {
        Assert.SkipWhen(Environment.GetEnvironmentVariable("SCANSIM_FRAMES") != "1", "SCANSIM_FRAMES is not 1");
        var scene = SceneMaking.Scene(targets, durationS);
        var painter = new Painter(scene);
        using var surface = SKSurface.Create(new SKImageInfo(1280, 800));
        var view = new ViewOptions { AfterglowScans = 20, ShowLabels = labels };
        var times = new List<double>();
        for (var frame = 0; frame < 60; frame++)
        {
            var start = Stopwatch.GetTimestamp();
            painter.Paint(surface.Canvas, new PictureSize(1280, 800), view, 100 + frame / 60.0);
            times.Add(Stopwatch.GetElapsedTime(start).TotalMilliseconds);
        }

        times.Sort();
        output.WriteLine($"{targets} targets, {durationS} s, {(labels ? "with" : "without")} labels: p50 {times[30]:0.0} ms, p95 {times[57]:0.0} ms");
        Assert.True(times[0] > 0);
    }
}
