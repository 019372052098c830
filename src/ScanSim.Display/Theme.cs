namespace ScanSim.Display;

/// <summary>Dark for screens, paper for white paper.</summary>
public enum Theme
{
    Dark = 0,
    Paper = 1,
}
