using System.Diagnostics;
using ScanSim.Display.Replay;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Replay;

/// <summary>How long opening and frames take, printed when SCANSIM_FRAMES=1, for the recordings that SCANSIM_RECORDINGS lists.</summary>
public sealed class ReplayTimes(ITestOutputHelper output)
{
    [Fact]
    public void Opening_and_frame_times_are_printed_when_asked()
    {
        var recordings = Environment.GetEnvironmentVariable("SCANSIM_RECORDINGS");
        Assert.SkipWhen(Environment.GetEnvironmentVariable("SCANSIM_FRAMES") != "1" || string.IsNullOrEmpty(recordings), "SCANSIM_FRAMES is not 1 or SCANSIM_RECORDINGS is empty");
        foreach (var folder in recordings!.Split(':'))
        {
            var start = Stopwatch.GetTimestamp();
            var cpu = Process.GetCurrentProcess().TotalProcessorTime;
            var recording = ReplayRecording.Open(folder);
            var openedMs = Stopwatch.GetElapsedTime(start).TotalMilliseconds;
            output.WriteLine($"{recording.Name}: opened in {openedMs:0} ms ({(Process.GetCurrentProcess().TotalProcessorTime - cpu).TotalMilliseconds:0} ms of processor), {Process.GetCurrentProcess().WorkingSet64 >> 20} MB of memory in use, {GC.GetTotalAllocatedBytes() >> 20} MB allocated, {GC.GetTotalMemory(false) >> 20} MB on the heap");
            foreach (var (speed, isSelected, isShort) in ((double, bool, bool)[])[(1, false, false), (1, true, true), (16, true, false), (64, false, true)])
            {
                Print(recording, speed, isSelected, isShort);
            }

            output.WriteLine($"{Process.GetCurrentProcess().PeakWorkingSet64 >> 20} MB at the most, {GC.GetTotalAllocatedBytes() >> 20} MB allocated, {GC.GetTotalMemory(true) >> 20} MB are needed");
        }
    }

    private void Print(ReplayRecording recording, double speedRatio, bool isSelected, bool isShort)
    {
        using var screen = new ReplayScreen([recording], new ReplaySettings { StartS = 0.3 * recording.Scene.DurationS, AfterglowScans = 20, SpeedRatio = speedRatio });
        screen.Handle(new WindowEvent { Kind = WindowEventKind.Resized, X = 1280, Y = 800, Scale = 1 });
        if (isSelected)
        {
            screen.Handle(ReplayMaking.Key(WindowKey.Tab));
        }

        for (var i = 0; isShort && i < 4; i++)
        {
            screen.Handle(ReplayMaking.Typed('x'));
        }

        screen.WaitForRows();
        using var surface = SKSurface.Create(new SKImageInfo(1280, 800, SKImageInfo.PlatformColorType, SKAlphaType.Premul));
        var times = new List<double>();
        var cpu = Process.GetCurrentProcess().TotalProcessorTime;
        var allocated = GC.GetTotalAllocatedBytes();
        for (var frame = 0; frame < 220; frame++)
        {
            var start = Stopwatch.GetTimestamp();
            screen.Advance(1.0 / 60);
            screen.Paint(surface.Canvas, 1280, 800, 1);
            times.Add(Stopwatch.GetElapsedTime(start).TotalMilliseconds);
        }

        var cpuMs = (Process.GetCurrentProcess().TotalProcessorTime - cpu).TotalMilliseconds / times.Count;
        allocated = GC.GetTotalAllocatedBytes() - allocated;
        var settled = times.Skip(20).Order().ToList();
        output.WriteLine($"  speed {speedRatio}, {(isSelected ? "one selected" : "none selected")}, timeline {(isShort ? "zoomed" : "whole")}: p50 {settled[100]:0.0} ms, p99 {settled[197]:0.0} ms, {cpuMs:0.0} ms of processor a frame; {allocated / 220 >> 10} KB allocated a frame; {string.Join(", ", screen.Painter.Counts())}");
        Assert.True(times[0] > 0);
    }
}
