namespace ScanSim.Display.Replay;

/// <summary>What the pressed button moves.</summary>
public enum DragKind
{
    None = 0,

    /// <summary>Pressed on a plan; a click until the pointer has moved.</summary>
    Plan = 1,

    /// <summary>The time shown.</summary>
    Time = 2,

    /// <summary>The stretch of time that the timeline shows.</summary>
    Timeline = 3,
}
