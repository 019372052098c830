namespace ScanSim.Display.Explaining;

/// <summary>One look of the chart of terms.</summary>
internal readonly record struct ChartPoint(double TimeS, LookExplanation Look, LookOutcome Outcome);
