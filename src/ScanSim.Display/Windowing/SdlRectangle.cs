using System.Runtime.InteropServices;

namespace ScanSim.Display.Windowing;

/// <summary>SDL_Rect.</summary>
[StructLayout(LayoutKind.Sequential)]
internal struct SdlRectangle
{
    public int X;
    public int Y;
    public int Width;
    public int Height;
}
