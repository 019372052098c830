using System.Runtime.InteropServices;

namespace ScanSim.Display.Windowing;

/// <summary>The head of SDL_Surface; <see cref="Format"/> points to an SDL_PixelFormat, which begins with the format's number.</summary>
[StructLayout(LayoutKind.Sequential)]
internal struct SdlSurface
{
    public uint Flags;
    public nint Format;
    public int Width;
    public int Height;
    public int PitchBytes;
    public nint Pixels;
}
