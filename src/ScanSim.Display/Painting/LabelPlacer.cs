using System.Collections.Immutable;
using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Finds places for labels beside their points, one after the other in the order given, so that none covers another.</summary>
/// <remarks>
/// Each label tries places around its point, near ones first; a farther one gets a leader line. Never: outside the frame, over another
/// label, its leader, another target's symbol or an obstacle. Dear but allowed: over plots, a leader over symbols. A label without a place is left out and counted.
/// </remarks>
internal sealed class LabelPlacer
{
    private const float SymbolPx = 7;
    private const double CostPerMark = 0.7;
    private const double CostPerStep = 1.0;
    private static readonly float[] DistancesPx = [9, 20, 34, 50, 68, 90, 120];

    private readonly SKRect frame;
    private readonly SKRect[] obstacles;
    private readonly MarkCounts marks;
    private readonly MarkCounts symbols;
    private readonly List<PlacedLabel> placed = [];
    private readonly List<SKRect> placedBounds = [];
    private readonly IReadOnlyList<LabelRequest> requests;

    private LabelPlacer(IReadOnlyList<LabelRequest> requests, SKRect frame, IReadOnlyList<SKRect> obstacles, IEnumerable<SKPoint> marks)
    {
        this.requests = requests;
        this.frame = frame;
        this.obstacles = [.. obstacles];
        this.marks = new MarkCounts(frame, marks);
        symbols = new MarkCounts(frame, requests.Select(r => r.Anchor));
    }

    public static LabelLayout Place(
        IReadOnlyList<LabelRequest> requests, SKRect frame, IReadOnlyList<SKRect> obstacles, IEnumerable<SKPoint> marks)
    {
        var placer = new LabelPlacer(requests, frame, obstacles, marks);
        for (var i = 0; i < requests.Count; i++)
        {
            placer.PlaceOne(i);
        }

        return new LabelLayout([.. placer.placed], requests.Count - placer.placed.Count);
    }

    private void PlaceOne(int index)
    {
        var request = requests[index];
        PlacedLabel? best = null;
        var bestCost = double.PositiveInfinity;
        for (var step = 0; step < DistancesPx.Length && step * CostPerStep < bestCost; step++)
        {
            var directions = step == 0 ? 8 : 16;
            for (var k = 0; k < directions; k++)
            {
                // East first, then alternating below and above it, west last.
                var turn = (k + 1) / 2 * (k % 2 == 0 ? -1 : 1);
                var candidate = Candidate(request, DistancesPx[step], turn * Math.Tau / directions, step > 0);
                var cost = step * CostPerStep + CostPerMark * (marks.In(candidate.Box) + SymbolsUnderLeader(candidate)) + k * 0.01;
                if (cost < bestCost && IsFree(candidate, index))
                {
                    (best, bestCost) = (candidate, cost);
                }
            }
        }

        if (best is { } found)
        {
            placed.Add(found);
            placedBounds.Add(SKRect.Inflate(BoundsOf(found), 2, 2));
        }
    }

    private static PlacedLabel Candidate(in LabelRequest request, float distance, double angle, bool hasLeader)
    {
        var (sin, cos) = Math.SinCos(angle);
        var end = new SKPoint(request.Anchor.X + (float)(distance * cos), request.Anchor.Y + (float)(distance * sin));
        // The box touches the leader's end with the side that faces the point.
        var left = end.X - request.Size.Width * (float)(1 - cos) / 2;
        var top = end.Y - request.Size.Height * (float)(1 - sin) / 2;
        return new PlacedLabel(request, SKRect.Create(left, top, request.Size.Width, request.Size.Height), end, hasLeader);
    }

    private int SymbolsUnderLeader(in PlacedLabel label)
    {
        var (from, to) = (label.Request.Anchor, label.LeaderEnd);
        var length = SKPoint.Distance(from, to);
        var count = 0;
        for (var at = 3 * SymbolPx; at < length; at += SymbolPx)
        {
            var share = at / length;
            count += symbols.In(Around(new SKPoint(from.X + share * (to.X - from.X), from.Y + share * (to.Y - from.Y)), SymbolPx / 2));
        }

        return count;
    }

    private bool IsFree(in PlacedLabel candidate, int index)
    {
        var box = candidate.Box;
        if (!frame.Contains(box) || CoversObstacle(box))
        {
            return false;
        }

        // The counts are by cells: where they find nothing but the label's own point, nothing is near.
        if (symbols.In(SKRect.Inflate(box, SymbolPx, SymbolPx)) > 0 && CoversSymbol(box, index))
        {
            return false;
        }

        var bounds = BoundsOf(candidate);
        for (var i = 0; i < placed.Count; i++)
        {
            // Most are far away: one comparison instead of seven.
            if (!Overlap(placedBounds[i], bounds))
            {
                continue;
            }

            var other = placed[i];
            if (Overlap(SKRect.Inflate(other.Box, 2, 1), box) || Crosses(candidate, other.Box) || Crosses(other, box) || LeadersCross(candidate, other))
            {
                return false;
            }
        }

        foreach (var obstacle in obstacles)
        {
            // From a point under an obstacle every leader starts across it.
            if (!obstacle.Contains(candidate.Request.Anchor) && Crosses(candidate, obstacle))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>Box and leader together.</summary>
    private static SKRect BoundsOf(in PlacedLabel label)
    {
        var (box, anchor) = (label.Box, label.Request.Anchor);
        return label.HasLeader
            ? new SKRect(Math.Min(box.Left, anchor.X), Math.Min(box.Top, anchor.Y), Math.Max(box.Right, anchor.X), Math.Max(box.Bottom, anchor.Y))
            : box;
    }

    private bool CoversObstacle(SKRect box)
    {
        foreach (var obstacle in obstacles)
        {
            if (Overlap(obstacle, box))
            {
                return true;
            }
        }

        return false;
    }

    private bool CoversSymbol(SKRect box, int index)
    {
        for (var i = 0; i < requests.Count; i++)
        {
            if (i != index && Overlap(Around(requests[i].Anchor, SymbolPx), box))
            {
                return true;
            }
        }

        return false;
    }

    private static SKRect Around(SKPoint point, float half) => new(point.X - half, point.Y - half, point.X + half, point.Y + half);

    private static bool Overlap(SKRect a, SKRect b) => a.Left < b.Right && b.Left < a.Right && a.Top < b.Bottom && b.Top < a.Bottom;

    private static bool Crosses(in PlacedLabel label, SKRect box) => label.HasLeader && Crosses(label.Request.Anchor, label.LeaderEnd, box);

    private static bool LeadersCross(in PlacedLabel a, in PlacedLabel b) =>
        a.HasLeader && b.HasLeader && SegmentsCross(a.Request.Anchor, a.LeaderEnd, b.Request.Anchor, b.LeaderEnd);

    /// <summary>Whether a segment meets a box: an end inside it, or the segment over one of its diagonals.</summary>
    private static bool Crosses(SKPoint from, SKPoint to, SKRect box) =>
        box.Contains(from) || box.Contains(to)
        || SegmentsCross(from, to, new SKPoint(box.Left, box.Top), new SKPoint(box.Right, box.Bottom))
        || SegmentsCross(from, to, new SKPoint(box.Right, box.Top), new SKPoint(box.Left, box.Bottom));

    private static bool SegmentsCross(SKPoint a, SKPoint b, SKPoint c, SKPoint d) =>
        Side(a, b, c) * Side(a, b, d) < 0 && Side(c, d, a) * Side(c, d, b) < 0;

    private static float Side(SKPoint a, SKPoint b, SKPoint p) => MathF.Sign((b.X - a.X) * (p.Y - a.Y) - (b.Y - a.Y) * (p.X - a.X));
}
