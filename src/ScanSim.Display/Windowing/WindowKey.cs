namespace ScanSim.Display.Windowing;

/// <summary>Keys that a program acts on; letters and digits come as <see cref="Character"/> with <see cref="WindowEvent.Character"/> set.</summary>
public enum WindowKey
{
    None = 0,
    Character = 1,
    Escape = 2,
    Enter = 3,
    Space = 4,
    Tab = 5,
    Left = 6,
    Right = 7,
    Up = 8,
    Down = 9,
    Home = 10,
    End = 11,
    PageUp = 12,
    PageDown = 13,
    Delete = 14,
    Backspace = 15,
    F1 = 16,
}
