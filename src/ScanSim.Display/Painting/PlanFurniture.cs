using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Scale bar, north arrow, site mark and name.</summary>
internal sealed class PlanFurniture
{
    private Sheet sheet;
    private readonly PlanProjection plan;
    private readonly string siteName;
    private readonly float barPx;
    private readonly string barText;
    private readonly SKRect barBox;
    private readonly SKRect arrowBox;
    private readonly SKRect siteBox;

    public PlanFurniture(Sheet sheet, PlanProjection plan, string siteName, RangeUnit unit, IReadOnlyList<TargetNow> targets)
    {
        this.sheet = sheet;
        this.plan = plan;
        this.siteName = sheet.Fit(siteName, TextStyle.Strong, 200);
        var metres = RangeText.MetresPerUnit(unit);
        var barM = NiceStep.AtLeast(60 * plan.MetresPerPx / metres) * metres;
        barPx = plan.ToPx(barM);
        barText = RangeText.OfStep(barM, unit);
        barBox = SKRect.Create(plan.Area.Left + 16, plan.Area.Bottom - 38, Math.Max(barPx, sheet.Width(barText, TextStyle.Small)) + 4, 26);
        arrowBox = SKRect.Create(plan.Area.Left + 14, plan.Area.Top + 12, 20, 46);
        arrowBox = plan.UpRad == 0 ? arrowBox : SKRect.Create(arrowBox.Left, arrowBox.Top, 46, 46);
        siteBox = SiteBox(new SKSize(sheet.Width(this.siteName, TextStyle.Strong) + 4, 15), targets);
    }

    /// <summary>What labels must not cover.</summary>
    public IReadOnlyList<SKRect> Boxes => [barBox, arrowBox, siteBox, SiteMark];

    private SKRect SiteMark => new(plan.Origin.X - 7, plan.Origin.Y - 7, plan.Origin.X + 7, plan.Origin.Y + 7);

    /// <summary>The same on another sheet.</summary>
    public PlanFurniture With(Sheet other)
    {
        var copy = (PlanFurniture)MemberwiseClone();
        copy.sheet = other;
        return copy;
    }

    public void Paint()
    {
        PaintScaleBar();
        PaintNorthArrow();
        var origin = plan.Origin;
        var ink = sheet.Colours.Ink;
        sheet.Line(new SKPoint(origin.X - 6, origin.Y), new SKPoint(origin.X + 6, origin.Y), 1.5f, ink);
        sheet.Line(new SKPoint(origin.X, origin.Y - 6), new SKPoint(origin.X, origin.Y + 6), 1.5f, ink);
        if (plan.Area.Contains(siteBox))
        {
            sheet.Rect(siteBox, sheet.Colours.Ground.WithAlpha(0xB0));
            sheet.Text(siteName, siteBox.Left + 2, siteBox.Bottom - 3.5f, TextStyle.Strong, ink);
        }
    }

    /// <summary>Beside the mark, in the corner with the fewest targets; below to the right if there is nothing to choose.</summary>
    private SKRect SiteBox(SKSize size, IReadOnlyList<TargetNow> targets)
    {
        var origin = plan.Origin;
        var (right, left) = (origin.X + 8, origin.X - 8 - size.Width);
        var (below, above) = (origin.Y + 6, origin.Y - 6 - size.Height);
        SKPoint[] corners = [new(right, below), new(left, below), new(right, above), new(left, above)];
        return corners.Select(corner => SKRect.Create(corner, size)).MinBy(box => targets.Count(t => SKRect.Inflate(box, 7, 7).Contains(t.Position)));
    }

    private void PaintScaleBar()
    {
        var quiet = sheet.Colours.Quiet;
        var (left, y) = (barBox.Left, barBox.Bottom - 2);
        sheet.Line(new SKPoint(left, y), new SKPoint(left + barPx, y), 1.5f, quiet);
        sheet.Line(new SKPoint(left, y - 5), new SKPoint(left, y + 0.75f), 1.5f, quiet);
        sheet.Line(new SKPoint(left + barPx, y - 5), new SKPoint(left + barPx, y + 0.75f), 1.5f, quiet);
        sheet.Text(barText, left, y - 9, TextStyle.Small, quiet);
    }

    private void PaintNorthArrow()
    {
        var quiet = sheet.Colours.Quiet;
        var (x, top) = (arrowBox.MidX, arrowBox.Top);
        sheet.Canvas.Save();
        sheet.Canvas.RotateDegrees((float)(-plan.UpRad * (180 / Math.PI)), arrowBox.MidX, arrowBox.MidY);
        using var head = new SKPath();
        head.MoveTo(x, top);
        head.LineTo(x + 5, top + 13);
        head.LineTo(x, top + 10);
        head.LineTo(x - 5, top + 13);
        head.Close();
        sheet.Fill(head, quiet);
        sheet.Line(new SKPoint(x, top + 9), new SKPoint(x, top + 26), 1.5f, quiet);
        sheet.Text("N", x, top + 41, TextStyle.Strong, quiet, SKTextAlign.Center);
        sheet.Canvas.Restore();
    }
}
