using System.Collections.Immutable;

namespace ScanSim.Display.Explaining;

/// <summary>What the chart of terms shows: the best look of each pass, or every look when the story is of a scan or two.</summary>
internal sealed record ChartData
{
    private const int FewPasses = 2;

    /// <summary>Losses are drawn down to this far below need; what is weaker still lies on the lower edge.</summary>
    private const double DeepestDb = 45;

    private const double MarginDb = 3;

    public required ImmutableArray<ChartPoint> Points { get; init; }

    /// <summary>Of each pass or look, those without a look too.</summary>
    public required ImmutableArray<(double TimeS, LookOutcome Outcome)> Outcomes { get; init; }

    public required double FromS { get; init; }

    public required double ToS { get; init; }

    /// <summary>Half the time from one point to the next: how far a point stands for its surroundings.</summary>
    public required double HalfStepS { get; init; }

    /// <summary>Losses count from here: the free-space SNR of the nearest look, or the SNR needed if that is more.</summary>
    public required double TopDb { get; init; }

    /// <summary>The range that belongs to <see cref="TopDb"/>.</summary>
    public required double TopRangeM { get; init; }

    /// <summary>Whether the range is that where Pd is one half in free space, not that of the nearest look.</summary>
    public required bool TopIsNeed { get; init; }

    /// <summary>Whether points are single looks, not passes.</summary>
    public required bool EachLook { get; init; }

    public required double LowestDb { get; init; }

    public required double HighestDb { get; init; }

    /// <summary>Null when the story has no look to draw.</summary>
    public static ChartData? Of(TargetStory story)
    {
        var eachLook = story.Passes.Length <= FewPasses && story.Passes.Any(p => p.Looks.Length > 1);
        ImmutableArray<ChartPoint> points = eachLook
            ? [.. story.Passes.SelectMany(p => p.Looks).Select(l => new ChartPoint(l.Row.TimeS, l, OutcomeOf(l.Outcome)))]
            : [.. story.Passes.Where(p => p.Best is not null).Select(p => new ChartPoint(p.TimeS, p.Best!, OutcomeOf(p.Outcome)))];
        if (points.IsEmpty)
        {
            return null;
        }

        ImmutableArray<(double, LookOutcome)> outcomes = eachLook
            ? [.. points.Select(p => (p.TimeS, p.Outcome))]
            : [.. story.Passes.Select(p => (p.TimeS, OutcomeOf(p.Outcome)))];
        var halfStepS = 0.5 * StepS(outcomes.Select(o => o.Item1), story.ToS - story.FromS);
        var nearest = points.MaxBy(p => p.Look.FreeSpaceSnrDb).Look;
        var isNeed = nearest.NeededDb > nearest.FreeSpaceSnrDb;
        return new ChartData
        {
            Points = points,
            Outcomes = outcomes,
            FromS = eachLook ? points[0].TimeS - 2 * halfStepS : story.FromS,
            ToS = eachLook ? points[^1].TimeS + 2 * halfStepS : story.ToS,
            HalfStepS = halfStepS,
            TopDb = isNeed ? nearest.NeededDb : nearest.FreeSpaceSnrDb,
            TopRangeM = isNeed ? nearest.EvenOddsRangeM : nearest.Row.RangeM,
            TopIsNeed = isNeed,
            EachLook = eachLook,
            LowestDb = points.Min(p => Math.Max(Math.Min(p.Look.Row.SnrDb, p.Look.NeededDb), p.Look.NeededDb - DeepestDb)) - MarginDb,
            HighestDb = Math.Max(nearest.FreeSpaceSnrDb, points.Max(p => p.Look.NeededForWantedDb)) + MarginDb,
        };
    }

    public static LookOutcome OutcomeOf(PassOutcome outcome) => outcome switch
    {
        PassOutcome.Seen => LookOutcome.Detected,
        PassOutcome.Range => LookOutcome.MissedRange,
        PassOutcome.AzimuthBeam or PassOutcome.ElevationBeam => LookOutcome.MissedBeam,
        PassOutcome.Chance => LookOutcome.MissedChance,
        PassOutcome.Eclipsing or PassOutcome.SharedCell => LookOutcome.MissedMasked,
        PassOutcome.HitWithoutPlot => LookOutcome.MissedUnrecorded,
        _ => LookOutcome.NoLook,
    };

    /// <summary>Points that may be joined: neighbours no further apart than a pass and a half.</summary>
    public IEnumerable<ImmutableArray<ChartPoint>> Runs()
    {
        var first = 0;
        for (var i = 1; i <= Points.Length; i++)
        {
            if (i == Points.Length || Points[i].TimeS - Points[i - 1].TimeS > 3 * HalfStepS)
            {
                yield return Points[first..i];
                first = i;
            }
        }
    }

    /// <summary>The middle one of the steps: a sweep to and fro has short and long ones in turn.</summary>
    private static double StepS(IEnumerable<double> timesS, double wholeS)
    {
        var ordered = timesS.Order().ToList();
        var steps = ordered.Zip(ordered.Skip(1), (a, b) => b - a).Where(s => s > 0).Order().ToList();
        return steps.Count == 0 ? wholeS : steps[steps.Count / 2];
    }
}
