using System.Runtime.InteropServices;

namespace ScanSim.Display.Windowing;

/// <summary>SDL_version.</summary>
[StructLayout(LayoutKind.Sequential)]
internal struct SdlVersion
{
    public byte Major;
    public byte Minor;
    public byte Patch;

    /// <summary>Since 2.0.18 a wheel event has fractions of a notch.</summary>
    public readonly bool HasPreciseWheel => Minor > 0 || Patch >= 18;
}
