using System.Diagnostics;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>A window with a <see cref="RecordingScreen"/>, kept going on a thread of its own at the top left of the virtual display.</summary>
internal sealed class OpenedWindow : IDisposable
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    private readonly VirtualDisplay display;
    private readonly Thread thread;
    private readonly CancellationTokenSource cancellation = new();
    private Exception? fault;

    public OpenedWindow(VirtualDisplay display, float? scale = 1, bool tryTexture = false, int width = 1000, int height = 700, FrameMeasurement? measurement = null, bool runs = false)
    {
        this.display = display;
        Screen = new RecordingScreen { Runs = runs };
        thread = new Thread(() => Live(scale, tryTexture, width, height, measurement));
        thread.Start();
        Until(() => Screen.Frames > 0, "the first frame");
        Until(() => (Id = display.FindWindow()).Length > 0, "the window on the display");
        display.Do("windowmove", Id, "0", "0");
        display.Do("windowfocus", Id);
    }

    public RecordingScreen Screen { get; }

    public string Id { get; private set; } = "";

    public bool DrewOnSurface { get; private set; }

    public bool HasEnded => !thread.IsAlive;

    public WindowEvent AwaitEvent(Func<WindowEvent, bool> isIt, string what)
    {
        Until(() => Screen.Events.Any(isIt), what);
        return Screen.Events.First(isIt);
    }

    /// <summary>Waits until the photograph has these colours; X shows frames when it comes to it.</summary>
    public void AwaitColours(params (int X, int Y, SKColor Colour)[] expected)
    {
        var read = "";
        Until(
            () =>
            {
                using var photograph = display.Photograph();
                read = string.Join(", ", expected.Select(e => $"({e.X}, {e.Y}) {photograph.GetPixel(e.X, e.Y)} for {e.Colour}"));
                return expected.All(e => photograph.GetPixel(e.X, e.Y) == e.Colour);
            },
            "the pixels",
            () => read);
    }

    public void Until(Func<bool> holds, string what, Func<string>? state = null)
    {
        var waited = Stopwatch.StartNew();
        while (!holds())
        {
            Assert.True(fault is null, $"the window failed: {fault}");
            Assert.True(waited.Elapsed < Patience, $"waited in vain for {what}: {state?.Invoke() ?? string.Join("\n", Screen.Events)}");
            Thread.Sleep(10);
        }
    }

    public void Cancel() => cancellation.Cancel();

    public void AwaitEnd() => Until(() => HasEnded, "the end");

    public void Dispose()
    {
        Screen.Closing = true;
        Cancel();
        thread.Join();
        cancellation.Dispose();
    }

    private void Live(float? scale, bool tryTexture, int width, int height, FrameMeasurement? measurement)
    {
        try
        {
            using var window = SdlWindow.Open("first title", width, height, scale, tryTexture);
            new WindowLoop(window, Screen, () => Stopwatch.GetTimestamp() / (double)Stopwatch.Frequency).Run(measurement, cancellation.Token);
            DrewOnSurface = window.DrawsOnSurface;
        }
        catch (Exception e)
        {
            fault = e;
        }
    }
}
