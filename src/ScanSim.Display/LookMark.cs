namespace ScanSim.Display;

/// <summary>One target in one scan: a mark of the timeline.</summary>
/// <remarks>SnrDb is NaN where no look was recorded. default(LookMark) is a detection at time 0.</remarks>
public readonly record struct LookMark(double TimeS, int Scan, float SnrDb, LookOutcome Outcome);
