namespace ScanSim.Display.Replay;

/// <summary>What the user asked for that is no change of the state; carried out once and cleared.</summary>
public enum ReplayWish
{
    None = 0,
    Close = 1,
    SavePng = 2,
    SaveSvg = 3,
    SavePdf = 4,
}
