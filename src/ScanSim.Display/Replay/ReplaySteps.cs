using System.Collections.Immutable;

namespace ScanSim.Display.Replay;

/// <summary>From one moment worth seeing to the next.</summary>
internal static class ReplaySteps
{
    /// <summary>Start of the next scan (or the one before) of the first recording.</summary>
    public static double Scan(ReplayWorld world, double timeS, int direction)
    {
        var scans = timeS / world.First.Scene.Beam.PeriodS;
        // Times that were reached by such a step lie on a start, but for rounding.
        var index = direction > 0 ? Math.Floor(scans + 1e-6) + 1 : Math.Ceiling(scans - 1e-6) - 1;
        return index * world.First.Scene.Beam.PeriodS;
    }

    /// <summary>Time of the next look (or the one before) at the selected target, at any target if none is selected; null: there is none.</summary>
    public static double? Look(ReplayWorld world, ReplayState state, int direction) =>
        Nearest(world, state, direction, static (looks, i) => looks[i].Outcome != LookOutcome.NoLook);

    /// <summary>Time of the next miss (or the one before) of the selected target.</summary>
    public static double? Miss(ReplayWorld world, ReplayState state, int direction) =>
        state.Selected is null ? null : Nearest(world, state, direction, static (looks, i) => IsMiss(looks[i].Outcome));

    /// <summary>The next time (or the one before) at which the selected target comes to be seen: detected, and not in its look before.</summary>
    public static double? FirstDetection(ReplayWorld world, ReplayState state, int direction) =>
        state.Selected is null ? null : Nearest(world, state, direction, static (looks, i) =>
            looks[i].Outcome == LookOutcome.Detected && (i == 0 || looks[i - 1].Outcome != LookOutcome.Detected));

    public static bool IsMiss(LookOutcome outcome) => outcome is not (LookOutcome.Detected or LookOutcome.NoLook);

    /// <summary>Index of the first look at or after a time.</summary>
    public static int FirstFrom(ImmutableArray<LookMark> looks, double timeS)
    {
        var (low, high) = (0, looks.Length);
        while (low < high)
        {
            var middle = (low + high) >> 1;
            (low, high) = looks[middle].TimeS < timeS ? (middle + 1, high) : (low, middle);
        }

        return low;
    }

    private static double? Nearest(ReplayWorld world, ReplayState state, int direction, Func<ImmutableArray<LookMark>, int, bool> isWanted)
    {
        double? best = null;
        foreach (var recording in world.Recordings)
        {
            foreach (var target in recording.Scene.Targets)
            {
                if (state.Selected is not null && !string.Equals(target.Id, state.Selected, StringComparison.Ordinal))
                {
                    continue;
                }

                if (NearestOf(target.Looks, state.TimeS, direction, isWanted) is { } found
                    && (best is not { } known || Math.Abs(found - state.TimeS) < Math.Abs(known - state.TimeS)))
                {
                    best = found;
                }
            }
        }

        return best;
    }

    private static double? NearestOf(ImmutableArray<LookMark> looks, double timeS, int direction, Func<ImmutableArray<LookMark>, int, bool> isWanted)
    {
        // A microsecond: the time shown may be a look's own.
        var start = direction > 0 ? FirstFrom(looks, timeS + 1e-6) : FirstFrom(looks, timeS - 1e-6) - 1;
        for (var i = start; i >= 0 && i < looks.Length; i += direction)
        {
            if (isWanted(looks, i))
            {
                return looks[i].TimeS;
            }
        }

        return null;
    }
}
