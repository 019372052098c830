using System.Diagnostics;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>When frames are painted and when not.</summary>
[Collection(WindowCollection.Name)]
public sealed class WindowLoopTests(VirtualDisplay display)
{
    [Fact]
    public void At_rest_nothing_is_painted()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        Thread.Sleep(500);
        var frames = window.Screen.Frames;
        Thread.Sleep(1000);
        Assert.Equal(frames, window.Screen.Frames);
    }

    [Fact]
    public void What_another_window_covered_is_painted_again()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        window.AwaitColours((5, 5, RecordingScreen.TopLeft));
        display.Do("windowunmap", window.Id);
        window.AwaitColours((5, 5, SKColors.Black));
        display.Do("windowmap", window.Id);
        window.AwaitColours((5, 5, RecordingScreen.TopLeft), (999, 699, RecordingScreen.BottomRight));
    }

    [Fact]
    public void Running_time_is_painted_60_times_a_second_and_measured()
    {
        display.Require();
        var measurement = new FrameMeasurement(2, () => Environment.CpuUsage.TotalTime.TotalSeconds);
        var watch = Stopwatch.StartNew();
        using var window = new OpenedWindow(display, measurement: measurement, runs: true);
        window.AwaitEnd();
        Assert.True(measurement.IsComplete);

        // At most one frame more than two seconds hold; fewer where other programs take the processor, but never a crawl.
        Assert.InRange(measurement.RatePerS, 20, 60.6);
        Assert.InRange(measurement.Frames, 40, 122);
        Assert.InRange(measurement.WorkS(0.5), 1e-6, measurement.WorkS(0.99));
        Assert.InRange(watch.Elapsed.TotalSeconds, 3, 20);
        Assert.True(measurement.ProcessorRatio > 0);
    }
}
