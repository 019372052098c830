namespace ScanSim.Display.Replay;

/// <summary>Under which heading the help page lists a key.</summary>
public enum KeyGroup
{
    Time = 0,
    Target = 1,
    Plan = 2,
    Timeline = 3,
    Window = 4,
}
