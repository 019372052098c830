namespace ScanSim.Display.Windowing;

public enum PointerButton
{
    None = 0,
    Left = 1,
    Middle = 2,
    Right = 3,
}
