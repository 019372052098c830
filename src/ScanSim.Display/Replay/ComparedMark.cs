namespace ScanSim.Display.Replay;

/// <summary>One pass of the slower turning antenna over one target, compared with the other's pass nearest in time.</summary>
public readonly record struct ComparedMark(double TimeS, int Scan, ComparedOutcome Outcome);
