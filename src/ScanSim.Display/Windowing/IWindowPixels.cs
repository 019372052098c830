using SkiaSharp;

namespace ScanSim.Display.Windowing;

/// <summary>The pixels behind a window, a frame at a time.</summary>
internal interface IWindowPixels : IDisposable
{
    /// <summary>Width and height in pixels as they are now; zero while the window has none.</summary>
    SKSizeI Size { get; }

    /// <summary>Lets <paramref name="draw"/> fill the pixels and shows them; false when SDL refuses.</summary>
    bool Paint(Action<SKCanvas> draw);
}
