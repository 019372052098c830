namespace ScanSim.Display.Explaining;

/// <summary>What became of a target in one look or one pass of the beam.</summary>
public enum PassOutcome
{
    /// <summary>A look that gave a hit; of a pass: one that gave a plot.</summary>
    Seen = 0,

    /// <summary>Too weak even at the beam's peak and without eclipsing.</summary>
    Range = 1,

    AzimuthBeam = 2,

    ElevationBeam = 3,

    Eclipsing = 4,

    /// <summary>The signal gave at least even odds; the draw went against it.</summary>
    Chance = 5,

    /// <summary>The signal gave at least even odds; it was missed in one cell with another target, which may have cancelled it.</summary>
    SharedCell = 6,

    /// <summary>A pass with a hit and without a plot.</summary>
    HitWithoutPlot = 7,

    /// <summary>In view, but the signal, summed over the pulses, was more than 20 dB below the noise of one pulse.</summary>
    TooWeakForLook = 8,

    /// <summary>In view and strong enough at the peak of the beam, but no dwell met it there.</summary>
    NoDwell = 9,

    BelowHorizon = 10,

    BeyondInstrumentedRange = 11,

    Blanked = 12,

    OutsideSector = 13,
}
