namespace ScanSim.Display.Replay;

/// <summary>What rows are sorted by.</summary>
/// <param name="FirstDetectionS">Infinite when it was never detected.</param>
/// <param name="WorstGapScans">Longest run of scans in view without a detection; scans out of view end a run.</param>
internal readonly record struct TargetFacts(double FirstDetectionS, int WorstGapScans)
{
    public static TargetFacts Of(SceneTarget target)
    {
        var first = double.PositiveInfinity;
        var (run, worst) = (0, 0);
        foreach (var look in target.Looks)
        {
            run = look.Outcome is LookOutcome.Detected or LookOutcome.NoLook ? 0 : run + 1;
            worst = Math.Max(worst, run);
            if (look.Outcome == LookOutcome.Detected && double.IsPositiveInfinity(first))
            {
                first = look.TimeS;
            }
        }

        return new TargetFacts(first, worst);
    }
}
