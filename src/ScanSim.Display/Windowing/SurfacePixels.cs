using System.Runtime.InteropServices;
using SkiaSharp;

namespace ScanSim.Display.Windowing;

/// <summary>Skia draws straight into the window's own surface: the quickest way without a graphics processor.</summary>
internal sealed class SurfacePixels(nint window) : IWindowPixels
{
    public SKSizeI Size => Surface(out _) is { } surface ? new SKSizeI(surface.Width, surface.Height) : default;

    /// <summary>False where SDL cannot give a surface or Skia cannot draw into its format.</summary>
    public bool Works => Surface(out _) is { } surface && ColourType(surface) != SKColorType.Unknown;

    public bool Paint(Action<SKCanvas> draw)
    {
        if (Surface(out var handle) is not { } surface)
        {
            return false;
        }

        var mustLock = (surface.Flags & Sdl.SurfaceMustLock) != 0;
        if (mustLock && Sdl.LockSurface(handle) != 0)
        {
            return false;
        }

        var info = new SKImageInfo(surface.Width, surface.Height, ColourType(surface), SKAlphaType.Opaque);
        var drawn = Draw(info, surface.Pixels, surface.PitchBytes, draw);
        if (mustLock)
        {
            Sdl.UnlockSurface(handle);
        }

        return drawn && Sdl.UpdateWindowSurface(window) == 0;
    }

    public void Dispose()
    {
        // The surface belongs to the window and goes with it.
    }

    internal static bool Draw(in SKImageInfo info, nint pixels, int pitchBytes, Action<SKCanvas> draw)
    {
        using var target = pixels == 0 ? null : SKSurface.Create(info, pixels, pitchBytes);
        if (target is null)
        {
            return false;
        }

        draw(target.Canvas);
        target.Canvas.Flush();
        return true;
    }

    private static SKColorType ColourType(in SdlSurface surface) => PixelFormats.Of((uint)Marshal.ReadInt32(surface.Format));

    /// <summary>SDL makes a new surface when the window's size has changed: asked for every frame.</summary>
    private SdlSurface? Surface(out nint handle)
    {
        handle = Sdl.GetWindowSurface(window);
        return handle == 0 ? null : Marshal.PtrToStructure<SdlSurface>(handle);
    }
}
