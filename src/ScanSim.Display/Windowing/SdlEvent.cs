using System.Runtime.InteropServices;

namespace ScanSim.Display.Windowing;

/// <summary>SDL_Event: a union of 56 bytes; here the fields that are read, each for the types named. The rest is room to spare.</summary>
[StructLayout(LayoutKind.Explicit, Size = 128)]
internal struct SdlEvent
{
    public const uint Quit = 0x100;
    public const uint Window = 0x200;
    public const uint KeyDown = 0x300;
    public const uint KeyUp = 0x301;
    public const uint TextInput = 0x303;
    public const uint MouseMotion = 0x400;
    public const uint MouseButtonDown = 0x401;
    public const uint MouseButtonUp = 0x402;
    public const uint MouseWheel = 0x403;

    public const byte WindowShown = 1;
    public const byte WindowHidden = 2;
    public const byte WindowExposed = 3;
    public const byte WindowSizeChanged = 6;
    public const byte WindowMinimized = 7;
    public const byte WindowMaximized = 8;
    public const byte WindowRestored = 9;
    public const byte WindowLeave = 11;
    public const byte WindowFocusGained = 12;
    public const byte WindowDisplayChanged = 18;

    [FieldOffset(0)] public uint Type;

    /// <summary>Window events: what happened.</summary>
    [FieldOffset(12)] public byte WindowChange;

    /// <summary>Text input: the first four bytes of its UTF-8, lowest byte first.</summary>
    [FieldOffset(12)] public uint Text;

    /// <summary>Mouse: which one; all ones for touches that come as mouse events.</summary>
    [FieldOffset(12)] public uint Mouse;

    [FieldOffset(13)] public byte KeyRepeat;

    /// <summary>Keys: what the key means in the present layout without shift.</summary>
    [FieldOffset(20)] public int KeyCode;

    /// <summary>Keys: modifiers after the event.</summary>
    [FieldOffset(24)] public ushort Modifiers;

    [FieldOffset(16)] public byte Button;
    [FieldOffset(18)] public byte Clicks;

    [FieldOffset(20)] public int X;
    [FieldOffset(24)] public int Y;

    /// <summary>Wheel: whole notches.</summary>
    [FieldOffset(20)] public int WheelY;

    /// <summary>Wheel: fractions too, since 2.0.18.</summary>
    [FieldOffset(32)] public float PreciseWheelY;
}
