namespace ScanSim.Display.Windowing;

/// <summary>Something the user did to the window. Positions and sizes are in layout units (pixels over <see cref="Scale"/>), origin at top left.</summary>
/// <remarks>Only the members that go with <see cref="Kind"/> are set. default(WindowEvent) is no event.</remarks>
public readonly record struct WindowEvent
{
    public required WindowEventKind Kind { get; init; }

    /// <summary>Pointer events and wheel: where. Resized: the new width and height.</summary>
    public float X { get; init; }

    public float Y { get; init; }

    /// <summary>Pixels per layout unit (high-DPI screens: above 1).</summary>
    public float Scale { get; init; }

    public WindowKey Key { get; init; }

    /// <summary>What the key types with the present layout of the keyboard and shift, or '\0': '?' is known by this.</summary>
    public char Character { get; init; }

    public PointerButton Button { get; init; }

    /// <summary>1 for a click, 2 for the second press of a double click.</summary>
    public int Clicks { get; init; }

    /// <summary>Notches; positive away from the user.</summary>
    public float Wheel { get; init; }

    public bool Shift { get; init; }

    public bool Control { get; init; }

    public bool Alt { get; init; }
}
