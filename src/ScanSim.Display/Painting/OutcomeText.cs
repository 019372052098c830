namespace ScanSim.Display.Painting;

/// <summary>The outcomes in words, for the legend.</summary>
internal static class OutcomeText
{
    public static string Of(LookOutcome outcome) => outcome switch
    {
        LookOutcome.Detected => "detected",
        LookOutcome.MissedRange => "missed: too weak",
        LookOutcome.MissedBeam => "missed: off the beam",
        LookOutcome.MissedChance => "missed by chance",
        LookOutcome.MissedMasked => "missed: masked",
        LookOutcome.MissedUnrecorded => "no plot",
        _ => "out of view",
    };
}
