namespace ScanSim.Recordings;

/// <summary>Whether the radar could look at a target at all, by geometry and timeline alone. In files: lower case with blanks ("below horizon").</summary>
public enum TargetView
{
    InView = 0,
    BelowHorizon = 1,
    BeyondInstrumentedRange = 2,
    Blanked = 3,
    OutsideSector = 4,
}
