namespace ScanSim.Recordings;

/// <summary>What a hit or plot came from. In files: the lower-case name.</summary>
public enum EchoKind
{
    /// <summary>At least one target's echo is in it.</summary>
    Target = 0,

    /// <summary>Receiver noise alone: a false alarm.</summary>
    Noise = 1,
}
