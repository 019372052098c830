using System.Text;

namespace ScanSim.Display.Windowing;

/// <summary>Makes our events of SDL's. Modifiers and the pointer's place are followed in the order of events, as SDL's own state runs ahead of them.</summary>
internal sealed class EventTranslation(bool preciseWheel, bool isMac)
{
    private ushort modifiers;
    private float pointerX;
    private float pointerY;
    private bool ignoresText;
    private bool repeated;

    /// <summary>Layout units per unit of the pointer's coordinates.</summary>
    public float UnitsPerCoordinate { get; set; } = 1;

    public float Scale { get; set; } = 1;

    private bool ShiftHeld => (modifiers & SdlKeys.Shift) != 0;

    private bool ControlHeld => (modifiers & (SdlKeys.LeftControl | SdlKeys.RightControl | (isMac ? SdlKeys.Command : 0))) != 0;

    private bool AltHeld => (modifiers & (SdlKeys.LeftAlt | SdlKeys.RightAlt)) != 0;

    /// <summary>Held keys that make a command of a letter. The right Alt key types (AltGr, with Windows a Control beside it); so do Mac's Option keys.</summary>
    private bool Commands => (modifiers & SdlKeys.RightAlt) == 0 && (ControlHeld || (AltHeld && !isMac));

    public void ForgetModifiers(ushort present) => modifiers = present;

    /// <summary>False for what is no event of ours, among them all window events.</summary>
    public bool Translate(in SdlEvent sdl, out WindowEvent e)
    {
        e = sdl.Type switch
        {
            SdlEvent.Quit => Event(WindowEventKind.Quit),
            SdlEvent.KeyDown => Key(sdl),
            SdlEvent.KeyUp => KeyReleased(sdl),
            SdlEvent.TextInput => Typed(sdl.Text),
            SdlEvent.MouseMotion => Pointer(sdl, WindowEventKind.PointerMoved),
            SdlEvent.MouseButtonDown => Pointer(sdl, WindowEventKind.PointerDown),
            SdlEvent.MouseButtonUp => Pointer(sdl, WindowEventKind.PointerUp),
            SdlEvent.MouseWheel => Wheel(sdl),
            _ => default,
        };
        return e.Kind != WindowEventKind.None;
    }

    /// <summary>An event at the pointer's last place, with the modifiers held now.</summary>
    public WindowEvent Event(WindowEventKind kind) => new()
    {
        Kind = kind,
        X = pointerX,
        Y = pointerY,
        Scale = Scale,
        Shift = ShiftHeld,
        Control = ControlHeld,
        Alt = AltHeld,
    };

    private WindowEvent Key(in SdlEvent sdl)
    {
        modifiers = sdl.Modifiers;
        repeated = sdl.KeyRepeat != 0;
        var key = SdlKeys.Of(sdl.KeyCode, (modifiers & SdlKeys.NumLock) != 0);

        // A character comes as text, which follows: only the system knows what shift makes of a key. With Control or Alt there is no text, or it is not meant.
        ignoresText = key switch { WindowKey.None => false, WindowKey.Character => Commands, _ => true };
        if (!ignoresText || (repeated && !SdlKeys.Repeats(key)))
        {
            return default;
        }

        return Event(WindowEventKind.KeyDown) with { Key = key, Character = key == WindowKey.Character && sdl.KeyCode <= char.MaxValue ? (char)sdl.KeyCode : '\0' };
    }

    private WindowEvent KeyReleased(in SdlEvent sdl)
    {
        modifiers = sdl.Modifiers;
        return default;
    }

    private WindowEvent Typed(uint text)
    {
        Span<byte> bytes = [(byte)text, (byte)(text >> 8), (byte)(text >> 16), (byte)(text >> 24)];
        if (ignoresText || Rune.DecodeFromUtf8(bytes, out var rune, out _) != System.Buffers.OperationStatus.Done || !rune.IsBmp || rune.Value <= ' ')
        {
            return default;
        }

        var character = (char)rune.Value;

        // Letters switch things, and must not flicker while held; signs step.
        return repeated && char.IsLetter(character)
            ? default
            : Event(WindowEventKind.KeyDown) with { Key = WindowKey.Character, Character = character, Control = false, Alt = false };
    }

    private WindowEvent Pointer(in SdlEvent sdl, WindowEventKind kind)
    {
        pointerX = sdl.X * UnitsPerCoordinate;
        pointerY = sdl.Y * UnitsPerCoordinate;
        if (kind == WindowEventKind.PointerMoved)
        {
            return Event(kind);
        }

        // SDL numbers left, middle, right as we do; further buttons do nothing.
        return sdl.Button is >= 1 and <= 3 ? Event(kind) with { Button = (PointerButton)sdl.Button, Clicks = 2 - sdl.Clicks % 2 } : default;
    }

    private WindowEvent Wheel(in SdlEvent sdl)
    {
        var notches = preciseWheel ? sdl.PreciseWheelY : sdl.WheelY;
        return notches == 0 ? default : Event(WindowEventKind.Wheel) with { Wheel = notches };
    }
}
