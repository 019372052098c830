using System.Collections.Immutable;

namespace ScanSim.Display.Replay;

/// <summary>What two recordings saw of one target, pass by pass.</summary>
public static class Comparison
{
    /// <summary>
    /// One mark for each pass of the antenna that turns more slowly (the left one's if both turn alike): there each pass has one of the
    /// other's beside it, while the other way round some would be used twice. A pass without one within half the slower period stands alone.
    /// </summary>
    /// <param name="left">The target in the left recording; null if it has no such target.</param>
    /// <param name="leftPeriodS">From scan to scan.</param>
    /// <param name="right">The target in the right recording.</param>
    /// <param name="rightPeriodS">From scan to scan.</param>
    public static ImmutableArray<ComparedMark> Of(SceneTarget? left, double leftPeriodS, SceneTarget? right, double rightPeriodS)
    {
        var leftLooks = left?.Looks ?? [];
        var rightLooks = right?.Looks ?? [];
        var isLeftBase = left is not null && (right is null || leftPeriodS >= rightPeriodS);
        var (slow, fast) = isLeftBase ? (leftLooks, rightLooks) : (rightLooks, leftLooks);
        var reachS = Math.Max(leftPeriodS, rightPeriodS) / 2;
        var marks = ImmutableArray.CreateBuilder<ComparedMark>(slow.Length);
        foreach (var look in slow)
        {
            var other = Nearest(fast, look.TimeS, reachS);
            marks.Add(new ComparedMark(look.TimeS, look.Scan, isLeftBase ? Of(look.Outcome, other) : Of(other, look.Outcome)));
        }

        return marks.DrainToImmutable();
    }

    private static ComparedOutcome Of(LookOutcome left, LookOutcome right) => (left, right) switch
    {
        (LookOutcome.Detected, LookOutcome.Detected) => ComparedOutcome.Both,
        (LookOutcome.Detected, _) => ComparedOutcome.OnlyLeft,
        (_, LookOutcome.Detected) => ComparedOutcome.OnlyRight,
        (LookOutcome.NoLook, LookOutcome.NoLook) => ComparedOutcome.NoLook,
        _ => ComparedOutcome.Neither,
    };

    private static LookOutcome Nearest(ImmutableArray<LookMark> looks, double timeS, double reachS)
    {
        var after = ReplaySteps.FirstFrom(looks, timeS);
        var best = LookOutcome.NoLook;
        var bestS = reachS;
        for (var i = Math.Max(0, after - 1); i <= after && i < looks.Length; i++)
        {
            var distanceS = Math.Abs(looks[i].TimeS - timeS);
            if (distanceS <= bestS)
            {
                (best, bestS) = (looks[i].Outcome, distanceS);
            }
        }

        return best;
    }
}
