using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>What lies under or near a point.</summary>
internal static class ReplayPick
{
    /// <summary>Farther than this from the pointer nothing is meant.</summary>
    public const float ReachPx = 14;

    /// <summary>Id of the target whose true place or newest plot is nearest to a point of a plan; null: none is near.</summary>
    public static string? Target(ReplayState state, ReplayWorld world, int recording, SKRect plan, SKPoint at)
    {
        var projection = ReplayMoves.Projection(state, world, plan);
        var scene = world.Recordings[recording].Scene;
        string? best = null;
        var bestPx = ReachPx;
        if (state.ShowTruth)
        {
            foreach (var target in scene.Targets)
            {
                if (TruthAtTime.At(target.Truth, state.TimeS, scene.Beam.PeriodS) is { } now)
                {
                    Consider(target.Id, projection.ToPlan(now.EastM, now.NorthM));
                }
            }
        }

        if (Plot(state, world, recording, plan, at) is { } plot && plot.Target.Length > 0)
        {
            Consider(plot.Target.Split('+')[0], projection.ToPlan(plot.EastM, plot.NorthM));
        }

        return best;

        void Consider(string id, SKPoint place)
        {
            var distancePx = SKPoint.Distance(place, at);
            if (distancePx < bestPx)
            {
                (best, bestPx) = (id, distancePx);
            }
        }
    }

    /// <summary>The plot on a plan that is nearest to a point; the newest of those at one place.</summary>
    public static PlotMark? Plot(ReplayState state, ReplayWorld world, int recording, SKRect plan, SKPoint at)
    {
        var projection = ReplayMoves.Projection(state, world, plan);
        PlotMark? best = null;
        var bestPx = ReachPx;
        foreach (ref readonly var plot in Shown(state, world, recording))
        {
            if (plot.Target.Length == 0 && !state.ShowFalsePlots)
            {
                continue;
            }

            var distancePx = SKPoint.Distance(projection.ToPlan(plot.EastM, plot.NorthM), at);
            if (distancePx <= bestPx)
            {
                (best, bestPx) = (plot, distancePx);
            }
        }

        return best;
    }

    /// <summary>Plots within the afterglow, in order of time.</summary>
    public static ReadOnlySpan<PlotMark> Shown(ReplayState state, ReplayWorld world, int recording)
    {
        var plots = world.Stretches[recording].Plots;
        var spanS = state.AfterglowScans * world.Recordings[recording].Scene.Beam.PeriodS;
        return plots.AsSpan()[PlanMarks.FirstAfter(plots, state.TimeS - spanS)..PlanMarks.FirstAfter(plots, state.TimeS)];
    }

    /// <summary>Where the selected target really is, in the first recording that has it then.</summary>
    public static TruthMark? SelectedPlace(ReplayState state, ReplayWorld world)
    {
        foreach (var recording in world.Recordings)
        {
            if (state.Selected is not null && recording.IndexOf(state.Selected) is var index and >= 0
                && TruthAtTime.At(recording.Scene.Targets[index].Truth, state.TimeS, recording.Scene.Beam.PeriodS) is { } now)
            {
                return now;
            }
        }

        return null;
    }
}
