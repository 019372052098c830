using System.Collections.Immutable;
using ScanSim.Display.Windowing;

namespace ScanSim.Display.Replay;

/// <summary>The one table of keys: it is what the replay obeys, and what its help page and the manual list.</summary>
public static class ReplayKeys
{
    private const double Degree = Math.PI / 180;
    private const double ZoomStep = 1.25;

    public static readonly ImmutableArray<ReplayKey> All =
    [
        Named(KeyGroup.Time, WindowKey.Space, "Space", "play or pause", (s, w) =>
            s.IsPlaying ? s with { IsPlaying = false } : (s.TimeS >= w.DurationS ? s.GoTo(w, 0) : s) with { IsPlaying = true }),
        Typed(KeyGroup.Time, '+', "twice as fast, up to 64", (s, _) => s.Faster(2)),
        Typed(KeyGroup.Time, '-', "half as fast, down to 1/4", (s, _) => s.Faster(0.5)),
        Typed(KeyGroup.Time, ']', "twice as fast", (s, _) => s.Faster(2)),
        Typed(KeyGroup.Time, '[', "half as fast", (s, _) => s.Faster(0.5)),
        Named(KeyGroup.Time, WindowKey.Right, "Right", "next look at the selected target, or at any", (s, w) => s.StepTo(w, ReplaySteps.Look(w, s, 1), "There is no later look.")),
        Named(KeyGroup.Time, WindowKey.Left, "Left", "the look before", (s, w) => s.StepTo(w, ReplaySteps.Look(w, s, -1), "There is no earlier look.")),
        Shifted(KeyGroup.Time, WindowKey.Right, "Right", "next scan", (s, w) => s.StepTo(w, ReplaySteps.Scan(w, s.TimeS, 1), "")),
        Shifted(KeyGroup.Time, WindowKey.Left, "Left", "the scan before", (s, w) => s.StepTo(w, ReplaySteps.Scan(w, s.TimeS, -1), "")),
        Named(KeyGroup.Time, WindowKey.Home, "Home", "to the start", (s, w) => s.GoTo(w, 0)),
        Named(KeyGroup.Time, WindowKey.End, "End", "to the end", (s, w) => s.StepTo(w, w.DurationS, "")),
        Typed(KeyGroup.Time, 'l', "loop: mark its start, its end, drop it", (s, _) => s.MarkLoop()),

        Named(KeyGroup.Target, WindowKey.Tab, "Tab", "select the next target", (s, w) => s.SelectNext(w, 1)),
        Shifted(KeyGroup.Target, WindowKey.Tab, "Tab", "select the one before", (s, w) => s.SelectNext(w, -1)),
        Named(KeyGroup.Target, WindowKey.Backspace, "Backspace", "select none", (s, w) => s.Select(w, null)),
        Typed(KeyGroup.Target, 'n', "its next miss", (s, w) => s.StepTo(w, ReplaySteps.Miss(w, s, 1), Missing(s, "later miss"))),
        Typed(KeyGroup.Target, 'N', "the miss before", (s, w) => s.StepTo(w, ReplaySteps.Miss(w, s, -1), Missing(s, "earlier miss"))),
        Typed(KeyGroup.Target, 'd', "next first detection: seen again after a miss", (s, w) => s.StepTo(w, ReplaySteps.FirstDetection(w, s, 1), Missing(s, "later first detection"))),
        Typed(KeyGroup.Target, 'D', "the first detection before", (s, w) => s.StepTo(w, ReplaySteps.FirstDetection(w, s, -1), Missing(s, "earlier first detection"))),
        Typed(KeyGroup.Target, 'g', "centre the plan on it", (s, w) =>
            ReplayPick.SelectedPlace(s, w) is { } place ? s.CentreOn(w, place.EastM, place.NorthM) : s with { Message = "No selected target is there at this time." }),

        Named(KeyGroup.Plan, WindowKey.Up, "Up", "zoom in", (s, w) => ZoomAboutMiddle(s, w, 1 / ZoomStep)),
        Named(KeyGroup.Plan, WindowKey.Down, "Down", "zoom out", (s, w) => ZoomAboutMiddle(s, w, ZoomStep)),
        Typed(KeyGroup.Plan, 'z', "the whole instrumented range", (s, _) => s with { RangeM = null, CentreEastM = 0, CentreNorthM = 0 }),
        Typed(KeyGroup.Plan, ',', "turn the plan 10° one way", (s, _) => s with { UpRad = Bearing(s.UpRad - 10 * Degree) }),
        Typed(KeyGroup.Plan, '.', "turn the plan 10° the other way", (s, _) => s with { UpRad = Bearing(s.UpRad + 10 * Degree) }),
        Typed(KeyGroup.Plan, 'b', "the selected target's bearing up", (s, w) =>
            ReplayPick.SelectedPlace(s, w) is { } place ? s with { UpRad = Bearing(Math.Atan2(place.EastM, place.NorthM)) } : s with { Message = "No selected target is there at this time." }),
        Typed(KeyGroup.Plan, 'B', "north up", (s, _) => s with { UpRad = 0 }),
        Typed(KeyGroup.Plan, 'u', "kilometres or nautical miles", (s, _) => s with { Unit = s.Unit == RangeUnit.Kilometre ? RangeUnit.NauticalMile : RangeUnit.Kilometre }),
        Typed(KeyGroup.Plan, 't', "targets (truth) on or off", (s, _) => s with { ShowTruth = !s.ShowTruth }),
        Typed(KeyGroup.Plan, 'r', "trails on or off", (s, _) => s with { ShowTrails = !s.ShowTrails }),
        Typed(KeyGroup.Plan, 'i', "labels on or off", (s, _) => s with { ShowLabels = !s.ShowLabels }),
        Typed(KeyGroup.Plan, 'h', "hits on or off", (s, _) => s with { ShowHits = !s.ShowHits }),
        Typed(KeyGroup.Plan, 'f', "false plots on or off", (s, _) => s with { ShowFalsePlots = !s.ShowFalsePlots }),
        Typed(KeyGroup.Plan, 'o', "overlays on or off", (s, _) => s with { ShowOverlays = !s.ShowOverlays }),
        Typed(KeyGroup.Plan, 'a', "longer afterglow: 4, 8, 20, 1 scans", (s, _) => s with { AfterglowScans = s.AfterglowScans switch { 1 => 4, 4 => 8, 8 => 20, _ => 1 } }),

        Typed(KeyGroup.Timeline, 's', "sort rows: scenario, id, first detection, worst gap", (s, _) => s with { Order = (RowOrder)(((int)s.Order + 1) % 4), FirstRow = 0 }),
        Named(KeyGroup.Timeline, WindowKey.PageDown, "Page down", "later rows", (s, w) => s.ScrollRows(w, 8)),
        Named(KeyGroup.Timeline, WindowKey.PageUp, "Page up", "earlier rows", (s, w) => s.ScrollRows(w, -8)),
        Typed(KeyGroup.Timeline, 'x', "zoom in on the time shown", (s, w) => s.ZoomTimeline(w, s.TimeS, 1 / (ZoomStep * ZoomStep))),
        Typed(KeyGroup.Timeline, 'X', "zoom out", (s, w) => s.ZoomTimeline(w, s.TimeS, ZoomStep * ZoomStep)),
        Typed(KeyGroup.Timeline, 'w', "the whole recording", (s, w) => s.ShowTimeline(w, 0, w.DurationS)),

        Typed(KeyGroup.Window, 'p', "save what is seen as PNG", (s, _) => s with { Wish = ReplayWish.SavePng }),
        Typed(KeyGroup.Window, 'v', "save it as SVG", (s, _) => s with { Wish = ReplayWish.SaveSvg }),
        Typed(KeyGroup.Window, 'e', "save it as PDF", (s, _) => s with { Wish = ReplayWish.SavePdf }),
        Typed(KeyGroup.Window, 'c', "dark or paper colours", (s, _) => s with { Theme = s.Theme == Theme.Dark ? Theme.Paper : Theme.Dark }),
        Typed(KeyGroup.Window, '?', "this page", (s, _) => s with { IsHelpShown = !s.IsHelpShown }),
        Named(KeyGroup.Window, WindowKey.F1, "F1", "this page", (s, _) => s with { IsHelpShown = !s.IsHelpShown }),
        Named(KeyGroup.Window, WindowKey.Escape, "Escape", "leave this page, or close", (s, _) => s.IsHelpShown ? s with { IsHelpShown = false } : s with { Wish = ReplayWish.Close }),
        Typed(KeyGroup.Window, 'q', "close", (s, _) => s with { Wish = ReplayWish.Close }),
    ];

    /// <summary>What the pointer does, for the help page and the manual.</summary>
    public static readonly ImmutableArray<(string Gesture, string Does)> Pointer =
    [
        ("click on the plan", "select the nearest target"),
        ("drag the plan", "move it"),
        ("wheel on the plan", "zoom about the pointer"),
        ("pointer on a plot", "its values"),
        ("click or drag on the timeline", "go to that time"),
        ("click on a row's name", "select that target"),
        ("right drag on the timeline", "move it"),
        ("wheel on the timeline", "zoom in time"),
        ("Shift+wheel on the timeline", "scroll the rows"),
        ("click on the order's name", "sort the rows otherwise"),
    ];

    /// <summary>The key that an event presses; null if it means nothing here.</summary>
    internal static ReplayKey? Of(in WindowEvent e)
    {
        foreach (var key in All)
        {
            if (key.Is(e))
            {
                return key;
            }
        }

        return null;
    }

    private static ReplayKey Named(KeyGroup group, WindowKey key, string name, string does, Func<ReplayState, ReplayWorld, ReplayState> act) =>
        ReplayKey.Of(group, key, false, name, does, act);

    private static ReplayKey Shifted(KeyGroup group, WindowKey key, string name, string does, Func<ReplayState, ReplayWorld, ReplayState> act) =>
        ReplayKey.Of(group, key, true, name, does, act);

    private static ReplayKey Typed(KeyGroup group, char character, string does, Func<ReplayState, ReplayWorld, ReplayState> act) =>
        ReplayKey.Of(group, character, does, act);

    private static string Missing(ReplayState state, string what) =>
        state.Selected is null ? "Select a target first." : $"{state.Selected} has no {what}.";

    private static double Bearing(double angleRad) => (angleRad % Math.Tau + Math.Tau) % Math.Tau;

    private static ReplayState ZoomAboutMiddle(ReplayState state, ReplayWorld world, double ratio)
    {
        var plan = ReplayLayout.Of(state.Width, state.Height, world).Plans[0];
        return state.ZoomPlan(world, plan, new SkiaSharp.SKPoint(plan.MidX, plan.MidY), ratio);
    }
}
