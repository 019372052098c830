namespace ScanSim.Display.Replay;

/// <summary>Which of two recordings saw a target in passes that belong together.</summary>
public enum ComparedOutcome
{
    Both = 0,
    OnlyLeft = 1,
    OnlyRight = 2,

    /// <summary>At least one could look, none saw it.</summary>
    Neither = 3,

    /// <summary>Neither could look at it.</summary>
    NoLook = 4,
}
