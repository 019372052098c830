using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Changes of the state that keys and pointer share: where and when one looks. Each keeps what it makes within its limits.</summary>
internal static class ReplayMoves
{
    private const double ClosestRangeM = 50;
    private const double FarthestWhole = 4;
    private const double ShortestTimelineS = 2;

    public static ReplayState GoTo(this ReplayState state, ReplayWorld world, double timeS)
    {
        var clamped = Math.Clamp(timeS, 0, world.DurationS);
        return (state with { TimeS = clamped }).Follow(world, clamped);
    }

    /// <summary>A step: stops playing first.</summary>
    public static ReplayState StepTo(this ReplayState state, ReplayWorld world, double? timeS, string nothing) =>
        timeS is { } found ? (state with { IsPlaying = false }).GoTo(world, found) : state with { Message = nothing };

    /// <summary>Turns the timeline's page when the time shown has left it.</summary>
    private static ReplayState Follow(this ReplayState state, ReplayWorld world, double timeS)
    {
        var spanS = state.TimelineToS - state.TimelineFromS;
        return timeS >= state.TimelineFromS && timeS <= state.TimelineToS
            ? state
            : state.ShowTimeline(world, timeS - 0.1 * spanS, timeS + 0.9 * spanS);
    }

    /// <summary>Shows a stretch of the timeline, moved or shortened where it would reach beyond the recording.</summary>
    public static ReplayState ShowTimeline(this ReplayState state, ReplayWorld world, double fromS, double toS)
    {
        var spanS = Math.Clamp(toS - fromS, Math.Min(ShortestTimelineS, world.DurationS), world.DurationS);
        var from = Math.Clamp(fromS, 0, world.DurationS - spanS);
        return state with { TimelineFromS = from, TimelineToS = from + spanS };
    }

    /// <summary>Zooms the timeline; the time at the pointer stays where it is.</summary>
    public static ReplayState ZoomTimeline(this ReplayState state, ReplayWorld world, double aboutS, double ratio)
    {
        var spanS = state.TimelineToS - state.TimelineFromS;
        var newSpanS = Math.Clamp(spanS * ratio, Math.Min(ShortestTimelineS, world.DurationS), world.DurationS);
        var fromS = aboutS - (aboutS - state.TimelineFromS) * newSpanS / spanS;
        return state.ShowTimeline(world, fromS, fromS + newSpanS);
    }

    /// <summary>Zooms the plans; what lies under the point of the plan stays there.</summary>
    public static ReplayState ZoomPlan(this ReplayState state, ReplayWorld world, SKRect plan, SKPoint about, double ratio)
    {
        var before = Projection(state, world, plan).FromPlan(about);
        var rangeM = Math.Clamp(world.RangeM(state) * ratio, ClosestRangeM, FarthestWhole * world.WholeRangeM);
        var zoomed = state with { RangeM = rangeM };
        var after = Projection(zoomed, world, plan).FromPlan(about);
        return zoomed.CentreOn(world, state.CentreEastM + before.EastM - after.EastM, state.CentreNorthM + before.NorthM - after.NorthM);
    }

    public static ReplayState PanPlan(this ReplayState state, ReplayWorld world, SKRect plan, float dx, float dy)
    {
        var projection = Projection(state, world, plan);
        var (eastM, northM) = projection.FromPlan(new SKPoint(plan.MidX - dx, plan.MidY - dy));
        return state.CentreOn(world, eastM, northM);
    }

    /// <summary>Moves the plans' middle, but never farther away than all that can be seen.</summary>
    public static ReplayState CentreOn(this ReplayState state, ReplayWorld world, double eastM, double northM)
    {
        var distanceM = Math.Sqrt(eastM * eastM + northM * northM);
        var share = Math.Min(1, 1.5 * world.WholeRangeM / Math.Max(distanceM, 1));
        return state with { CentreEastM = share * eastM, CentreNorthM = share * northM };
    }

    public static ReplayState Faster(this ReplayState state, double ratio) =>
        state with { SpeedRatio = Math.Clamp(state.SpeedRatio * ratio, ReplayState.SlowestRatio, ReplayState.FastestRatio) };

    public static ReplayState ScrollRows(this ReplayState state, ReplayWorld world, int rows)
    {
        var fitting = ReplayLayout.Of(state.Width, state.Height, world).RowsFitting;
        return state with { FirstRow = Math.Clamp(state.FirstRow + rows, 0, Math.Max(0, world.Rows.Length - fitting)) };
    }

    /// <summary>Selects a target (null: none) and scrolls its row into sight.</summary>
    public static ReplayState Select(this ReplayState state, ReplayWorld world, string? id)
    {
        var selected = state with { Selected = id };
        var index = world.Rows.Select(row => row.Id).ToList().IndexOf(id ?? "");
        if (index < 0)
        {
            return selected;
        }

        var fitting = ReplayLayout.Of(state.Width, state.Height, world).RowsFitting;
        var first = Math.Clamp(state.FirstRow, index - fitting + 1, index);
        return (selected with { FirstRow = first }).ScrollRows(world, 0);
    }

    public static ReplayState SelectNext(this ReplayState state, ReplayWorld world, int direction)
    {
        if (world.Rows.IsEmpty)
        {
            return state;
        }

        var index = world.Rows.Select(row => row.Id).ToList().IndexOf(state.Selected ?? "");
        var next = index < 0 ? (direction > 0 ? 0 : world.Rows.Length - 1) : (index + direction + world.Rows.Length) % world.Rows.Length;
        return state.Select(world, world.Rows[next].Id);
    }

    /// <summary>Marks the loop's start, then its end, then drops it.</summary>
    public static ReplayState MarkLoop(this ReplayState state) => state switch
    {
        { LoopFromS: null } => state with { LoopFromS = state.TimeS, Message = "Loop starts here; the same key marks its end." },
        { LoopToS: not null } => state with { LoopFromS = null, LoopToS = null, Message = "Loop dropped." },
        _ when Math.Abs(state.TimeS - state.LoopFromS.Value) < 0.05 => state with { LoopFromS = null, Message = "Loop dropped." },
        _ => state with
        {
            LoopFromS = Math.Min(state.LoopFromS.Value, state.TimeS),
            LoopToS = Math.Max(state.LoopFromS.Value, state.TimeS),
            Message = "Loop set; the same key drops it.",
        },
    };

    public static PlanProjection Projection(ReplayState state, ReplayWorld world, SKRect plan) =>
        new(plan, state.CentreEastM, state.CentreNorthM, world.RangeM(state), state.UpRad);
}
