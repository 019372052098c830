namespace ScanSim.Display.Windowing;

public enum WindowEventKind
{
    None = 0,
    Quit = 1,
    Resized = 2,
    KeyDown = 3,
    PointerMoved = 4,
    PointerDown = 5,
    PointerUp = 6,
    PointerLeft = 7,
    Wheel = 8,
}
