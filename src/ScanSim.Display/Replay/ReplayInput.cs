using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>What the user does to the window, as a change of the state. A pure function: tests need no window.</summary>
internal static class ReplayInput
{
    private const double WheelStep = 1.2;

    /// <summary>The pointer may tremble this far during a click.</summary>
    private const float ClickPx = 3;

    public static ReplayState After(ReplayState state, ReplayWorld world, in WindowEvent e)
    {
        switch (e.Kind)
        {
            case WindowEventKind.Quit:
                return state with { Wish = ReplayWish.Close };
            case WindowEventKind.Resized:
                return (state with { Width = e.X, Height = e.Y }).ScrollRows(world, 0);
            case WindowEventKind.KeyDown:
                return ReplayKeys.Of(e)?.Act(state with { Message = "" }, world) ?? state;
            case WindowEventKind.PointerLeft:
                return state with { PointerX = null, PointerY = null };
            case WindowEventKind.PointerMoved:
                return Moved(state, world, e) with { PointerX = e.X, PointerY = e.Y };
            case WindowEventKind.PointerDown:
                return Down(state, world, e) with { PointerX = e.X, PointerY = e.Y };
            case WindowEventKind.PointerUp:
                return Up(state, world, e) with { Drag = DragKind.None, HasDragged = false };
            case WindowEventKind.Wheel:
                return Wheel(state, world, e);
            default:
                return state;
        }
    }

    /// <summary>The time under a point of the timeline.</summary>
    public static double TimeAt(ReplayState state, SKRect rows, float x) =>
        state.TimelineFromS + (x - rows.Left) / rows.Width * (state.TimelineToS - state.TimelineFromS);

    private static ReplayState Down(ReplayState state, ReplayWorld world, in WindowEvent e)
    {
        var layout = ReplayLayout.Of(state.Width, state.Height, world);
        if (state.IsHelpShown)
        {
            return state with { IsHelpShown = false };
        }

        if (PlanAt(layout, e.X, e.Y) >= 0)
        {
            return e.Button is PointerButton.Left or PointerButton.Middle ? state with { Drag = DragKind.Plan, HasDragged = false, PressX = e.X, PressY = e.Y } : state;
        }

        if (!layout.Timeline.Contains(e.X, e.Y))
        {
            return state;
        }

        if (e.Button == PointerButton.Right)
        {
            return state with { Drag = DragKind.Timeline };
        }

        if (e.Y < layout.Strip.Top)
        {
            return TimelineHeadBox.Order(layout).Contains(e.X, e.Y) ? state with { Order = (RowOrder)(((int)state.Order + 1) % 4), FirstRow = 0 } : state;
        }

        if (e.X >= layout.Rows.Left && e.X <= layout.Rows.Right)
        {
            return state.GoTo(world, TimeAt(state, layout.Rows, e.X)) with { Drag = DragKind.Time };
        }

        return RowAt(state, world, layout, e.Y) is { } row ? state.Select(world, row.Id) : state;
    }

    private static ReplayState Moved(ReplayState state, ReplayWorld world, in WindowEvent e)
    {
        if (state.Drag == DragKind.None || state is not { PointerX: { } fromX, PointerY: { } fromY })
        {
            return state;
        }

        var layout = ReplayLayout.Of(state.Width, state.Height, world);
        switch (state.Drag)
        {
            case DragKind.Time:
                return state.GoTo(world, TimeAt(state, layout.Rows, Math.Clamp(e.X, layout.Rows.Left, layout.Rows.Right)));
            case DragKind.Timeline:
                var byS = TimeAt(state, layout.Rows, fromX) - TimeAt(state, layout.Rows, e.X);
                return state.ShowTimeline(world, state.TimelineFromS + byS, state.TimelineToS + byS);
            default:
                return DragPlan(state, world, layout.Plans[0], state.HasDragged ? new SKPoint(fromX, fromY) : new SKPoint(state.PressX, state.PressY), new SKPoint(e.X, e.Y));
        }
    }

    private static ReplayState DragPlan(ReplayState state, ReplayWorld world, SKRect plan, SKPoint from, SKPoint to) =>
        state.HasDragged || SKPoint.Distance(from, to) > ClickPx
            ? state.PanPlan(world, plan, to.X - from.X, to.Y - from.Y) with { HasDragged = true }
            : state;

    private static ReplayState Up(ReplayState state, ReplayWorld world, in WindowEvent e)
    {
        if (state.Drag != DragKind.Plan || state.HasDragged || e.Button != PointerButton.Left)
        {
            return state;
        }

        var layout = ReplayLayout.Of(state.Width, state.Height, world);
        var index = PlanAt(layout, e.X, e.Y);
        return index < 0 ? state : state.Select(world, ReplayPick.Target(state, world, index, layout.Plans[index], new SKPoint(e.X, e.Y)));
    }

    private static ReplayState Wheel(ReplayState state, ReplayWorld world, in WindowEvent e)
    {
        var layout = ReplayLayout.Of(state.Width, state.Height, world);
        var ratio = Math.Pow(WheelStep, -e.Wheel);
        if (PlanAt(layout, e.X, e.Y) is var plan and >= 0)
        {
            return state.ZoomPlan(world, layout.Plans[plan], new SKPoint(e.X, e.Y), ratio);
        }

        if (!layout.Timeline.Contains(e.X, e.Y))
        {
            return state;
        }

        return e.Shift || e.X < layout.Rows.Left || e.X > layout.Rows.Right
            ? state.ScrollRows(world, -(int)MathF.Round(3 * e.Wheel, MidpointRounding.AwayFromZero))
            : state.ZoomTimeline(world, TimeAt(state, layout.Rows, e.X), ratio);
    }

    private static ReplayRow? RowAt(ReplayState state, ReplayWorld world, ReplayLayout layout, float y)
    {
        var index = (int)MathF.Floor((y - layout.Rows.Top) / ReplayLayout.RowHeight);
        return y >= layout.Rows.Top && index < layout.RowsFitting && state.FirstRow + index < world.Rows.Length ? world.Rows[state.FirstRow + index] : null;
    }

    public static int PlanAt(ReplayLayout layout, float x, float y)
    {
        for (var i = 0; i < layout.Plans.Length; i++)
        {
            if (layout.Plans[i].Contains(x, y))
            {
                return i;
            }
        }

        return -1;
    }
}
