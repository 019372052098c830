using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>From metres east and north of the site to layout units of the plan and back; north or another bearing is up.</summary>
internal sealed class PlanProjection
{
    /// <summary>Kept free between the range shown and the plan's nearer edges, for the bearing labels.</summary>
    public const float MarginPx = 30;

    private readonly double sinUp;
    private readonly double cosUp;

    public PlanProjection(SKRect area, double centreEastM, double centreNorthM, double rangeM, double upRad = 0)
    {
        UpRad = upRad;
        (sinUp, cosUp) = Math.SinCos(upRad);
        Area = area;
        CentreEastM = centreEastM;
        CentreNorthM = centreNorthM;
        MetresPerPx = rangeM / (Math.Min(area.Width, area.Height) / 2 - MarginPx);
    }

    public SKRect Area { get; }

    public double CentreEastM { get; }

    public double CentreNorthM { get; }

    public double MetresPerPx { get; }

    /// <summary>The bearing that points up.</summary>
    public double UpRad { get; }

    /// <summary>The site.</summary>
    public SKPoint Origin => ToPlan(0, 0);

    public SKPoint ToPlan(double eastM, double northM)
    {
        var (right, up) = Turn(eastM - CentreEastM, northM - CentreNorthM);
        return new((float)(Area.MidX + right / MetresPerPx), (float)(Area.MidY - up / MetresPerPx));
    }

    /// <summary>What lies under a point of the plan.</summary>
    public (double EastM, double NorthM) FromPlan(SKPoint point)
    {
        var (rightM, upM) = ((point.X - Area.MidX) * MetresPerPx, (Area.MidY - point.Y) * MetresPerPx);
        return (CentreEastM + rightM * cosUp + upM * sinUp, CentreNorthM - rightM * sinUp + upM * cosUp);
    }

    /// <summary>A direction east and north as one to the right and up.</summary>
    public (double Right, double Up) Turn(double east, double north) => (east * cosUp - north * sinUp, east * sinUp + north * cosUp);

    /// <summary>A point at a range and a bearing (clockwise from north) from the site.</summary>
    public SKPoint Polar(double rangeM, double bearingRad)
    {
        var (sin, cos) = Math.SinCos(bearingRad);
        return ToPlan(rangeM * sin, rangeM * cos);
    }

    /// <summary>Symbols shrink on a small plan, so that traffic does not become one blot.</summary>
    public float SymbolScale => Math.Clamp(Math.Min(Area.Width, Area.Height) / 480, 0.72f, 1);

    public float ToPx(double lengthM) => (float)(lengthM / MetresPerPx);

    /// <summary>Least and greatest distance of the visible area from the site, in metres.</summary>
    public (double Least, double Greatest) VisibleRangesM()
    {
        var origin = Origin;
        var dx = Math.Max(0, Math.Max(Area.Left - origin.X, origin.X - Area.Right));
        var dy = Math.Max(0, Math.Max(Area.Top - origin.Y, origin.Y - Area.Bottom));
        var farX = Math.Max(Math.Abs(Area.Left - origin.X), Math.Abs(Area.Right - origin.X));
        var farY = Math.Max(Math.Abs(Area.Top - origin.Y), Math.Abs(Area.Bottom - origin.Y));
        return (Math.Sqrt(dx * dx + dy * dy) * MetresPerPx, Math.Sqrt(farX * farX + farY * farY) * MetresPerPx);
    }
}
