namespace ScanSim.Recordings;

/// <summary>What a missed look was lost to. In files: lower case with blanks ("azimuth beam"); empty when detected.</summary>
public enum LossReason
{
    /// <summary>The look was detected.</summary>
    None = 0,

    /// <summary>Too weak even with the dwell centred on the target and without eclipsing.</summary>
    Range = 1,

    /// <summary>Strong enough, but too far off the beam's azimuth.</summary>
    AzimuthBeam = 2,

    /// <summary>Strong enough, but too far off the beam's elevation.</summary>
    ElevationBeam = 3,

    /// <summary>The echo came while the transmitter was on.</summary>
    Eclipsing = 4,

    /// <summary>Pd was at least one half, and the drawn fluctuation or noise kept it below the threshold.</summary>
    Fluctuation = 5,

    /// <summary>Pd was at least one half, and another target in the same cell cancelled it.</summary>
    SharedCell = 6,
}
