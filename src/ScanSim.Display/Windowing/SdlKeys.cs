namespace ScanSim.Display.Windowing;

/// <summary>SDL's key codes (SDL_keycode.h, SDL_scancode.h) and modifiers in our terms.</summary>
internal static class SdlKeys
{
    public const ushort Shift = 0x0003;
    public const ushort LeftControl = 0x0040;
    public const ushort RightControl = 0x0080;
    public const ushort LeftAlt = 0x0100;
    public const ushort RightAlt = 0x0200;
    public const ushort Command = 0x0C00;
    public const ushort NumLock = 0x1000;

    /// <summary>Codes of keys without a character are scan codes with this bit set.</summary>
    private const int Scan = 1 << 30;

    private const int KeypadEnter = Scan | 88;
    private const int Keypad1 = Scan | 89;
    private const int Keypad0 = Scan | 98;
    private const int KeypadPoint = Scan | 99;

    /// <summary>None for keys that we do not know; <see cref="WindowKey.Character"/> for those that type one.</summary>
    public static WindowKey Of(int code, bool numLock) => code switch
    {
        27 => WindowKey.Escape,
        13 or KeypadEnter => WindowKey.Enter,
        32 => WindowKey.Space,
        9 => WindowKey.Tab,
        8 => WindowKey.Backspace,
        127 => WindowKey.Delete,
        Scan | 80 => WindowKey.Left,
        Scan | 79 => WindowKey.Right,
        Scan | 82 => WindowKey.Up,
        Scan | 81 => WindowKey.Down,
        Scan | 74 => WindowKey.Home,
        Scan | 77 => WindowKey.End,
        Scan | 75 => WindowKey.PageUp,
        Scan | 78 => WindowKey.PageDown,
        Scan | 58 => WindowKey.F1,
        >= Keypad1 and <= KeypadPoint when !numLock => OfKeypad(code),
        > 32 and < Scan => WindowKey.Character,
        _ => WindowKey.None,
    };

    /// <summary>Keys that act again and again while they are held; the others act once.</summary>
    public static bool Repeats(WindowKey key) => key is WindowKey.Left or WindowKey.Right or WindowKey.Up or WindowKey.Down
        or WindowKey.PageUp or WindowKey.PageDown or WindowKey.Backspace or WindowKey.Delete;

    private static WindowKey OfKeypad(int code) => code switch
    {
        Keypad1 => WindowKey.End,
        Keypad1 + 1 => WindowKey.Down,
        Keypad1 + 2 => WindowKey.PageDown,
        Keypad1 + 3 => WindowKey.Left,
        Keypad1 + 5 => WindowKey.Right,
        Keypad1 + 6 => WindowKey.Home,
        Keypad1 + 7 => WindowKey.Up,
        Keypad1 + 8 => WindowKey.PageUp,
        KeypadPoint => WindowKey.Delete,
        _ => WindowKey.None,
    };
}
