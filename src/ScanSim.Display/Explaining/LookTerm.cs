namespace ScanSim.Display.Explaining;

/// <summary>What can cost a look signal, against the radar's free-space expectation at the peak of its beam.</summary>
public enum LookTerm
{
    /// <summary>Spreading, against the range to which the target is seen with even odds in free space; a gain when it is nearer.</summary>
    Range = 0,

    AzimuthBeam = 1,

    ElevationBeam = 2,

    Eclipsing = 3,
}
