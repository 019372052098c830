using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Range rings and bearings, with steps that go with the zoom. Computed first: the labels of targets must avoid its labels.</summary>
internal sealed class PlanGrid
{
    private const float BearingLabelPx = 14;
    private const float LeastRingGapPx = 34;

    /// <summary>A target's ring, and a unit beside it.</summary>
    private const float SymbolPx = 6.5f;

    /// <summary>From this radius on there is room for a label every 10 degrees.</summary>
    private const float DenseRadiusPx = 420;

    /// <summary>Where ring labels stand, in degrees, in order of preference: between the 30 degree lines.</summary>
    private static readonly int[] RingLabelBearingsDeg = [45, 135, 225, 315, 75, 105, 255, 285, 15, 165, 195, 345];

    private Sheet sheet;
    private readonly PlanProjection plan;
    private readonly double instrumentedRangeM;
    private readonly IReadOnlyList<SKRect> taken;
    private readonly IReadOnlyList<SKPoint> symbols;
    private readonly List<GridLabel> labels = [];
    private readonly List<double> ringsM = [];

    public PlanGrid(
        Sheet sheet, PlanProjection plan, double instrumentedRangeM, double shownRangeM, RangeUnit unit, IReadOnlyList<SKRect> taken,
        IReadOnlyList<SKPoint> symbols)
    {
        this.taken = taken;
        this.symbols = symbols;
        this.sheet = sheet;
        this.plan = plan;
        this.instrumentedRangeM = instrumentedRangeM;
        LayRings(shownRangeM, unit);
        LayBearings();
    }

    public IReadOnlyList<GridLabel> Labels => labels;

    public IReadOnlyList<double> RingsM => ringsM;

    /// <summary>Step of the labelled bearings.</summary>
    public int BearingStepDeg => plan.ToPx(instrumentedRangeM) >= DenseRadiusPx ? 10 : 30;

    /// <summary>At most six rings in the range shown, with room between them for their labels.</summary>
    public static double RingStepM(double shownRangeM, double metresPerPx, RangeUnit unit)
    {
        var metres = RangeText.MetresPerUnit(unit);
        return NiceStep.AtLeast(Math.Max(shownRangeM / 6, LeastRingGapPx * metresPerPx) / metres) * metres;
    }

    /// <summary>The same grid on another sheet.</summary>
    public PlanGrid With(Sheet other)
    {
        var copy = (PlanGrid)MemberwiseClone();
        copy.sheet = other;
        return copy;
    }

    public void PaintLines()
    {
        var origin = plan.Origin;
        foreach (var rangeM in ringsM)
        {
            sheet.Ring(origin, plan.ToPx(rangeM), 1, sheet.Colours.Grid);
        }

        for (var bearingDeg = 0; bearingDeg < 360; bearingDeg += 10)
        {
            var bearingRad = bearingDeg * (Math.PI / 180);
            var radius = plan.ToPx(instrumentedRangeM);
            var innerM = bearingDeg % BearingStepDeg == 0 ? Math.Min(ringsM.Count > 0 ? ringsM[0] : 0, 0.1 * instrumentedRangeM) : instrumentedRangeM * (1 - 6 / radius);
            sheet.Line(plan.Polar(innerM, bearingRad), plan.Polar(instrumentedRangeM, bearingRad), 1, sheet.Colours.Grid);
        }

        sheet.Ring(origin, plan.ToPx(instrumentedRangeM), 1.5f, sheet.Colours.Trail);
    }

    public void PaintLabels()
    {
        foreach (var label in labels)
        {
            sheet.Rect(label.Box, sheet.Colours.Ground.WithAlpha(0xB8));
            sheet.Text(label.Text, label.Centre.X, label.Centre.Y + 4, TextStyle.Small, sheet.Colours.GridText, SKTextAlign.Center);
        }
    }

    private void LayRings(double shownRangeM, RangeUnit unit)
    {
        var stepM = RingStepM(shownRangeM, plan.MetresPerPx, unit);
        var (leastM, greatestM) = plan.VisibleRangesM();
        for (var n = Math.Max(1, Math.Ceiling(leastM / stepM)); n * stepM < Math.Min(greatestM, instrumentedRangeM * (1 - 1e-9)); n++)
        {
            ringsM.Add(n * stepM);
        }

        // The bearing on which most rings can be labelled comes first, so that the labels stand in a line if they can.
        var bearingsRad = RingLabelBearingsDeg.Select(b => b * (Math.PI / 180)).OrderByDescending(LabelledRings).ToList();
        foreach (var rangeM in ringsM)
        {
            // Beside the targets if that can be; under one rather than nowhere.
            var text = RangeText.OfStep(rangeM, unit);
            foreach (var bearingRad in bearingsRad.OrderBy(b => IsUnderSymbol(BoxAt(text, plan.Polar(rangeM, b))) ? 1 : 0))
            {
                if (TryAdd(text, plan.Polar(rangeM, bearingRad)))
                {
                    break;
                }
            }
        }

        int LabelledRings(double bearingRad) => ringsM.Count(r => IsClear(BoxAt(RangeText.OfStep(r, unit), plan.Polar(r, bearingRad))));
    }

    private bool IsUnderSymbol(SKRect box)
    {
        var reach = SKRect.Inflate(box, SymbolPx, SymbolPx);
        return symbols.Any(symbol => reach.Contains(symbol));
    }

    private void LayBearings()
    {
        for (var bearingDeg = 0; bearingDeg < 360; bearingDeg += BearingStepDeg)
        {
            var bearingRad = bearingDeg * (Math.PI / 180);
            var text = bearingDeg.ToString("000");
            var outside = instrumentedRangeM + BearingLabelPx * plan.MetresPerPx;
            if (!TryAdd(text, plan.Polar(outside, bearingRad)) && LastVisiblePoint(bearingRad) is { } edge)
            {
                TryAdd(text, edge);
            }
        }
    }

    /// <summary>Where the bearing's line leaves the plan (less room for a label), if it passes through it within the instrumented range.</summary>
    private SKPoint? LastVisiblePoint(double bearingRad)
    {
        var inner = SKRect.Inflate(plan.Area, -18, -12);
        var origin = plan.Origin;
        var (sin, cos) = Math.SinCos(bearingRad - plan.UpRad);
        var leave = plan.ToPx(instrumentedRangeM) - 20.0;
        leave = Math.Min(leave, Along(sin, inner.Left - origin.X, inner.Right - origin.X));
        leave = Math.Min(leave, Along(-cos, inner.Top - origin.Y, inner.Bottom - origin.Y));
        var point = new SKPoint(origin.X + (float)(leave * sin), origin.Y - (float)(leave * cos));
        return leave > 0 && SKRect.Inflate(inner, 0.5f, 0.5f).Contains(point) ? point : null;
    }

    private static double Along(double direction, double low, double high) => direction switch
    {
        > 1e-9 => high / direction,
        < -1e-9 => low / direction,
        _ => double.PositiveInfinity,
    };

    private bool TryAdd(string text, SKPoint centre)
    {
        var box = BoxAt(text, centre);
        if (!IsClear(box))
        {
            return false;
        }

        labels.Add(new GridLabel(text, centre, box));
        return true;
    }

    private SKRect BoxAt(string text, SKPoint centre)
    {
        var half = sheet.Width(text, TextStyle.Small) / 2 + 3;
        return new SKRect(centre.X - half, centre.Y - 7, centre.X + half, centre.Y + 7);
    }

    private bool IsClear(SKRect box) =>
        plan.Area.Contains(box) && !taken.Any(t => t.IntersectsWith(box)) && !labels.Exists(l => l.Box.IntersectsWith(SKRect.Inflate(box, 4, 2)));
}
