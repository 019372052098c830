using ScanSim.Display.Painting;
using ScanSim.Scenarios;
using SkiaSharp;

namespace ScanSim.Display.Tests;

public sealed class PlanGeometryTests
{
    private const double Degree = Math.PI / 180;

    [Theory]
    [InlineData(90, 10_000)]
    [InlineData(0, 20_000)]
    [InlineData(225, 30_000)]
    [InlineData(301.5, 41_234)]
    public void A_plot_is_drawn_at_its_bearing_and_range(double bearingDeg, double rangeM)
    {
        using var picture = PaintedPicture.Of(OnePlot(bearingDeg, rangeM, "boat"), new ViewOptions { ShowTruth = false }, 2.5, PictureSize.Default);
        var (middle, pxPerM) = picture.Plan(SceneMaking.RangeM);
        var expected = new SKPoint(
            (float)(middle.X + rangeM * pxPerM * Math.Sin(bearingDeg * Degree)),
            (float)(middle.Y - rangeM * pxPerM * Math.Cos(bearingDeg * Degree)));
        var found = CentreOf(picture, Colours.Dark.Plot, expected);
        Assert.Equal(expected.X, found.X, 0.6f);
        Assert.Equal(expected.Y, found.Y, 0.6f);
    }

    [Fact]
    public void A_panned_and_zoomed_plan_moves_and_stretches_what_it_shows()
    {
        var view = new ViewOptions { ShowTruth = false, CentreEastM = 8_000, CentreNorthM = -1_000, RangeM = 5_000 };
        using var picture = PaintedPicture.Of(OnePlot(90, 10_000, "boat"), view, 2.5, PictureSize.Default);
        var (middle, pxPerM) = picture.Plan(5_000);
        var expected = new SKPoint((float)(middle.X + 2_000 * pxPerM), (float)(middle.Y - 1_000 * pxPerM));
        var found = CentreOf(picture, Colours.Dark.Plot, expected);
        Assert.Equal(expected.X, found.X, 0.6f);
        Assert.Equal(expected.Y, found.Y, 0.6f);
    }

    [Fact]
    public void Twice_the_scale_draws_twice_as_large()
    {
        var scene = OnePlot(90, 10_000, "boat");
        using var plain = PaintedPicture.Of(scene, new ViewOptions { ShowTruth = false }, 2.5, new PictureSize(1000, 700));
        using var doubled = PaintedPicture.Of(scene, new ViewOptions { ShowTruth = false }, 2.5, new PictureSize(2000, 1400, 2));
        var (middle, pxPerM) = plain.Plan(SceneMaking.RangeM);
        var expected = new SKPoint((float)(middle.X + 10_000 * pxPerM), middle.Y);
        var found = CentreOf(doubled, Colours.Dark.Plot, new SKPoint(2 * expected.X, 2 * expected.Y));
        Assert.Equal(2 * expected.X, found.X, 0.6f);
        Assert.Equal(2 * expected.Y, found.Y, 0.6f);
    }

    [Theory]
    [InlineData(RangeUnit.Kilometre, 10_000)]
    [InlineData(RangeUnit.NauticalMile, 5 * 1852)]
    public void A_range_ring_has_the_radius_its_label_says(RangeUnit unit, double firstRingM)
    {
        using var picture = PaintedPicture.Of(OnePlot(90, 10_000, "boat"), new ViewOptions { Unit = unit, ShowTruth = false }, 2.5, PictureSize.Default);
        var (middle, pxPerM) = picture.Plan(SceneMaking.RangeM);
        Assert.Contains(picture.Texts, t => t.Text == RangeText.OfStep(firstRingM, unit));
        foreach (var ringM in (double[])[firstRingM, 2 * firstRingM, 4 * firstRingM])
        {
            Assert.Equal(ringM * pxPerM, RadiusOfLineNear(picture, middle, 200 * Degree, ringM * pxPerM, 12), 0.6);
        }
    }

    [Fact]
    public void Bearing_labels_of_three_digits_stand_on_their_bearings()
    {
        using var picture = PaintedPicture.Of(OnePlot(90, 10_000, "boat"), new ViewOptions(), 2.5, PictureSize.Default);
        var (middle, _) = picture.Plan(SceneMaking.RangeM);
        for (var bearingDeg = 0; bearingDeg < 360; bearingDeg += 30)
        {
            var box = Assert.Single(picture.Texts, t => t.Text == bearingDeg.ToString("000")).Box;
            var found = Math.Atan2(box.MidX - middle.X, middle.Y - box.MidY) / Degree;
            Assert.Equal(0, Math.IEEERemainder(found - bearingDeg, 360), 1.0);
        }
    }

    [Theory]
    [InlineData(0.625, 90)]
    [InlineData(1.25, 180)]
    [InlineData(2.0, 288)]
    public void The_beam_is_a_wedge_of_its_real_width_at_its_azimuth(double timeS, double azimuthDeg)
    {
        var scenario = SceneMaking.Scenario(0, 10);
        var scene = new SceneBuilder(scenario).Build() with { BeamwidthRad = 6 * Degree };
        using var picture = PaintedPicture.Of(scene, new ViewOptions(), timeS, new PictureSize(1600, 1200));
        var (middle, pxPerM) = picture.Plan(SceneMaking.RangeM);
        // Halfway between the rings at 30 and 40 km, where nothing else is drawn.
        var radius = 35_000 * pxPerM;
        var lit = new List<double>();
        for (var offsetDeg = -8.0; offsetDeg <= 8; offsetDeg += 0.05)
        {
            var a = (azimuthDeg + offsetDeg) * Degree;
            var pixel = picture.At(middle.X + radius * Math.Sin(a), middle.Y - radius * Math.Cos(a));
            if (pixel.Red > Colours.Dark.Ground.Red + 0x18)
            {
                lit.Add(offsetDeg);
            }
        }

        // One pixel of edge on each side.
        var pixelDeg = 1 / radius / Degree;
        Assert.Equal(-3, lit.Min(), 1.5 * pixelDeg);
        Assert.Equal(3, lit.Max(), 1.5 * pixelDeg);
    }

    [Fact]
    public void A_target_is_ringed_where_it_really_is_between_two_truth_rows()
    {
        var builder = new SceneBuilder(SceneMaking.Scenario(1, 10));
        var id = SceneMaking.Scenario(1, 10).Targets[0].Id;
        builder.AddTruth([SceneMaking.TruthRow(id, 0, 1, 10_000, 0), SceneMaking.TruthRow(id, 1, 3, 14_000, 0)]);
        using var picture = PaintedPicture.Of(builder.Build(), new ViewOptions { ShowLabels = false, TrailScans = 0 }, 2, PictureSize.Default);
        var (middle, pxPerM) = picture.Plan(SceneMaking.RangeM);
        var x = middle.X + 12_000 * pxPerM;
        var found = RadiusOfLineNear(picture, new SKPoint((float)x, middle.Y), 180 * Degree, Glyphs.TruthRadius, 3);
        Assert.Equal(Glyphs.TruthRadius, found, 0.7);
    }

    private static Scene OnePlot(double bearingDeg, double rangeM, string target)
    {
        var scenario = SceneMaking.Scenario(1, 10);
        var builder = new SceneBuilder(scenario with { Targets = [scenario.Targets[0] with { Id = target }], Radar = scenario.Radar with { Scan = new Scan.Rotation { PeriodS = 7 } } });
        builder.AddPlots([SceneMaking.PlotRow(target, 0, 2, rangeM, bearingDeg)]);
        return builder.Build();
    }

    /// <summary>Centre of mass of the pixels near a point that have more of a colour than of the ground.</summary>
    private static SKPoint CentreOf(PaintedPicture picture, SKColor colour, SKPoint near)
    {
        double sum = 0, sumX = 0, sumY = 0;
        for (var y = (int)near.Y - 9; y <= near.Y + 9; y++)
        {
            for (var x = (int)near.X - 9; x <= near.X + 9; x++)
            {
                // Only saturated pixels: grid lines are grey.
                var pixel = picture.At(x, y);
                double weight = Math.Max(0, pixel.Blue - pixel.Red - 20);
                (sum, sumX, sumY) = (sum + weight, sumX + weight * (x + 0.5), sumY + weight * (y + 0.5));
            }
        }

        Assert.True(sum > 20 * (colour.Blue - colour.Red), $"no plot near {near}");
        return new SKPoint((float)(sumX / sum), (float)(sumY / sum));
    }

    /// <summary>Along a ray, the distance at which a line is crossed: centre of mass of what is brighter than the ground.</summary>
    private static double RadiusOfLineNear(PaintedPicture picture, SKPoint from, double bearingRad, double radius, double around)
    {
        double sum = 0, weighted = 0;
        for (var r = radius - around; r <= radius + around; r += 0.1)
        {
            var pixel = picture.At(from.X + r * Math.Sin(bearingRad), from.Y - r * Math.Cos(bearingRad));
            double weight = Math.Max(0, pixel.Red - Colours.Dark.Ground.Red - 4);
            (sum, weighted) = (sum + weight, weighted + weight * r);
        }

        Assert.True(sum > 0, $"no line near radius {radius}");
        return weighted / sum;
    }
}
