namespace ScanSim.Display.Replay;

/// <summary>What passing time does to the state.</summary>
internal static class ReplayClock
{
    /// <summary>A longer pause (the window was covered, the machine was busy) does not make the replay jump.</summary>
    private const double LongestFrameS = 0.25;

    public static ReplayState After(ReplayState state, ReplayWorld world, double elapsedS)
    {
        if (!state.IsPlaying)
        {
            return state;
        }

        var timeS = state.TimeS + Math.Min(elapsedS, LongestFrameS) * state.SpeedRatio;
        if (state is { LoopFromS: { } fromS, LoopToS: { } toS } && state.TimeS <= toS && timeS > toS)
        {
            return state.GoTo(world, fromS + (timeS - toS) % (toS - fromS));
        }

        return timeS < world.DurationS ? state.GoTo(world, timeS) : state.GoTo(world, world.DurationS) with { IsPlaying = false };
    }
}
