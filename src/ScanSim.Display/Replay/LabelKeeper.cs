using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Keeps the places of labels while their targets move little: they are laid out anew only when one has moved by more than a pixel or two.</summary>
internal sealed class LabelKeeper
{
    /// <summary>Labels are laid out with two units between them, so moved by less than one each they still do not touch.</summary>
    private const float MostMovedPx = 0.9f;

    private LabelLayout? layout;
    private object? laidOutFor;
    private readonly Dictionary<string, SKPoint> anchors = new(StringComparer.Ordinal);

    /// <summary>How often labels were laid out.</summary>
    public int Layouts { get; private set; }

    public void Paint(
        Sheet sheet, SKRect area, IReadOnlyList<TargetNow> targets, PlanGrid grid, PlanFurniture furniture, List<SKPoint> plots, PlanProjection plan, IReadOnlyList<SKRect> taken)
    {
        var key = (area, plan.CentreEastM, plan.CentreNorthM, plan.MetresPerPx, plan.UpRad, targets.Count, grid.Labels.Count, taken.Count);
        if (layout is null || !key.Equals(laidOutFor) || HasMoved(targets))
        {
            layout = PlanView.LabelsOf(sheet, area, targets, grid, furniture, plots, taken);
            laidOutFor = key;
            Layouts++;
            anchors.Clear();
            foreach (var target in targets)
            {
                anchors[target.Target.Id] = target.Position;
            }
        }

        PlanView.PaintLabels(sheet, area, Moved(layout, targets));
    }

    private bool HasMoved(IReadOnlyList<TargetNow> targets)
    {
        foreach (var target in targets)
        {
            if (!anchors.TryGetValue(target.Target.Id, out var anchor) || SKPoint.Distance(anchor, target.Position) > MostMovedPx)
            {
                return true;
            }
        }

        return false;
    }

    private static LabelLayout Moved(LabelLayout layout, IReadOnlyList<TargetNow> targets)
    {
        var now = targets.ToDictionary(target => target.Target.Id, StringComparer.Ordinal);
        return layout with
        {
            Placed = [.. layout.Placed.Select(label =>
            {
                var target = now[label.Request.Text];
                var (dx, dy) = (target.Position.X - label.Request.Anchor.X, target.Position.Y - label.Request.Anchor.Y);
                return label with
                {
                    Request = label.Request with { Anchor = target.Position, IsQuiet = !target.IsInView },
                    Box = SKRect.Create(label.Box.Left + dx, label.Box.Top + dy, label.Box.Width, label.Box.Height),
                    LeaderEnd = new SKPoint(label.LeaderEnd.X + dx, label.LeaderEnd.Y + dy),
                };
            })],
        };
    }
}
