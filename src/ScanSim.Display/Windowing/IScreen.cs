using SkiaSharp;

namespace ScanSim.Display.Windowing;

/// <summary>What a window shows: takes events, knows how time changes it, and paints itself.</summary>
public interface IScreen
{
    /// <summary>The window's title; read after every frame.</summary>
    string Title { get; }

    /// <summary>The window closes before the next frame. A <see cref="WindowEventKind.Quit"/> event alone closes nothing.</summary>
    bool WantsToClose { get; }

    /// <summary>True when what is shown has changed and must be painted. The first event of all is <see cref="WindowEventKind.Resized"/>.</summary>
    bool Handle(in WindowEvent e);

    /// <summary>True while time changes what is shown: then there is a frame 60 times a second, otherwise only after events.</summary>
    /// <param name="elapsedS">Since the last call; called once a frame, before the events of that frame. Never negative.</param>
    bool Advance(double elapsedS);

    /// <summary>Paints all of the window.</summary>
    /// <param name="canvas">In pixels, not yet scaled, its content undefined.</param>
    /// <param name="width">In layout units, as events are: pixels over <paramref name="scale"/>. At least 800.</param>
    /// <param name="height">In layout units. At least 600.</param>
    /// <param name="scale">Pixels per layout unit, from 1 to 8.</param>
    void Paint(SKCanvas canvas, float width, float height, float scale);
}
