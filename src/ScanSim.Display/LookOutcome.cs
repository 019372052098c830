namespace ScanSim.Display;

/// <summary>What became of one target in one scan, as the timeline tells it apart.</summary>
public enum LookOutcome
{
    Detected = 0,

    /// <summary>Too weak even at the beam's peak.</summary>
    MissedRange = 1,

    /// <summary>Too far off the beam, in azimuth or in elevation.</summary>
    MissedBeam = 2,

    /// <summary>Pd was at least one half; the draw went against it.</summary>
    MissedChance = 3,

    /// <summary>Eclipsed by the transmitter, or cancelled by another target in the same cell.</summary>
    MissedMasked = 4,

    /// <summary>In view and without a plot, in a recording that kept no looks and so no reasons.</summary>
    MissedUnrecorded = 5,

    /// <summary>The radar could not look: below the horizon, beyond the instrumented range, blanked, outside the sector, or no dwell met it.</summary>
    NoLook = 6,
}
