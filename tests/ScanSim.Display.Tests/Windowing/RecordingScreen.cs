using System.Collections.Concurrent;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>A screen that keeps what comes to it and paints a known pattern: a ground, and a square of 40 units in each corner in a colour of its own.</summary>
internal sealed class RecordingScreen : IScreen
{
    public static readonly SKColor Ground = new(10, 60, 120);
    public static readonly SKColor TopLeft = new(220, 30, 40);
    public static readonly SKColor TopRight = new(30, 200, 60);
    public static readonly SKColor BottomLeft = new(250, 240, 20);
    public static readonly SKColor BottomRight = new(240, 240, 250);

    private int frames;

    public ConcurrentQueue<WindowEvent> Events { get; } = new();

    /// <summary>Time changes what is shown.</summary>
    public required bool Runs { get; init; }

    public volatile bool Closing;
    public volatile string Heading = "first title";


    public int Frames => Volatile.Read(ref frames);

    public string Title => Heading;

    public bool WantsToClose => Closing;

    public bool Handle(in WindowEvent e)
    {
        Events.Enqueue(e);
        Closing |= e.Kind == WindowEventKind.Quit;
        return e.Kind is WindowEventKind.Resized or WindowEventKind.KeyDown;
    }

    public bool Advance(double elapsedS) => Runs;

    public void Paint(SKCanvas canvas, float width, float height, float scale)
    {
        canvas.Clear(Ground);
        canvas.Scale(scale);
        Square(canvas, 0, 0, TopLeft);
        Square(canvas, width - 40, 0, TopRight);
        Square(canvas, 0, height - 40, BottomLeft);
        Square(canvas, width - 40, height - 40, BottomRight);
        Interlocked.Increment(ref frames);
    }

    private static void Square(SKCanvas canvas, float x, float y, SKColor colour)
    {
        using var paint = new SKPaint { Color = colour };
        canvas.DrawRect(x, y, 40, 40, paint);
    }
}
