using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Tests;

/// <summary>States differ in shape when all have the same colour.</summary>
public sealed class ShapeTests
{
    private const int Side = 32;

    /// <summary>One colour for everything.</summary>
    private static readonly Colours Plain = Colours.Dark with { Outcomes = [.. Enum.GetValues<LookOutcome>().Select(_ => SKColors.White)] };

    [Fact]
    public void A_false_plot_is_hollow_where_a_plot_of_a_target_is_filled()
    {
        var plot = Mask(sheet => sheet.Discs([new SKPoint(16, 16)], Glyphs.PlotRadius, SKColors.White));
        var falsePlot = Mask(sheet =>
        {
            using var path = new SKPath();
            Glyphs.FalsePlot(path, new SKPoint(16, 16));
            sheet.Outline(path, 1.4f, SKColors.White);
        });
        Assert.True(plot[16 * Side + 16]);
        Assert.False(falsePlot[16 * Side + 16]);
        Assert.True(Difference(plot, falsePlot) > 0.6, $"{Difference(plot, falsePlot)}");
    }

    [Theory]
    [InlineData(4.0f)]
    [InlineData(2.75f)]
    public void Each_outcome_has_a_mark_of_its_own_shape(float radius) => AllDiffer(
        outcome => Mask(sheet => Glyphs.Outcome(sheet, outcome, new SKPoint(16, 16), radius)), 0.25);

    [Fact]
    public void Each_outcome_has_a_texture_of_its_own() => AllDiffer(
        outcome => Mask(sheet => OutcomeTexture.Fill(sheet, outcome, new SKRect(8, 9, 24, 23))), 0.25);

    [Fact]
    public void A_target_out_of_view_has_a_broken_ring()
    {
        var inView = Mask(sheet => Ring(sheet, true));
        var outOfView = Mask(sheet => Ring(sheet, false));
        Assert.True(Difference(inView, outOfView) > 0.3);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(8)]
    [InlineData(100)]
    public void Plots_fade_with_each_scan_and_never_vanish_or_brighten(int scans)
    {
        Assert.Equal(1, Afterglow.Opacity(0, scans));
        for (var age = 1; age < scans; age++)
        {
            Assert.InRange(Afterglow.Opacity(age, scans), 0.1, Afterglow.Opacity(age - 1, scans) - 1e-6);
        }
    }

    [Fact]
    public void Drawn_plots_are_the_fainter_the_older_and_gone_after_the_last_scan()
    {
        var scenario = SceneMaking.Scenario(1, 60);
        var builder = new SceneBuilder(scenario);
        var id = scenario.Targets[0].Id;
        // One plot a scan, each in a place of its own; the picture is taken at 22 s, in the ninth scan of 2.5 s.
        builder.AddPlots([.. Enumerable.Range(0, 9).Select(scan => SceneMaking.PlotRow(id, scan, scan * 2.5 + 0.6, 12_000 + 2_500 * scan, 90.0 + 10))]);
        using var picture = PaintedPicture.Of(builder.Build(), new ViewOptions { ShowTruth = false, AfterglowScans = 6 }, 22, PictureSize.Default);
        var (middle, pxPerM) = picture.Plan(SceneMaking.RangeM);
        var blues = Enumerable.Range(0, 9).Select(scan =>
        {
            var (sin, cos) = Math.SinCos(100 * Math.PI / 180);
            var r = (12_000 + 2_500 * scan) * pxPerM;
            var pixel = picture.At(middle.X + r * sin, middle.Y - r * cos);
            return pixel.Blue - pixel.Red;
        }).ToList();
        Assert.All(blues.Take(3), b => Assert.InRange(b, -12, 20));
        for (var scan = 4; scan < 9; scan++)
        {
            Assert.True(blues[scan] > blues[scan - 1], string.Join(' ', blues));
        }
    }

    private static void Ring(Sheet sheet, bool isInView)
    {
        using var path = new SKPath();
        Glyphs.Truth(path, new SKPoint(16, 16), 0, 0, isInView);
        sheet.Outline(path, 1.4f, SKColors.White);
    }

    private static void AllDiffer(Func<LookOutcome, bool[]> maskOf, double least)
    {
        var masks = Enum.GetValues<LookOutcome>().Select(o => (Outcome: o, Mask: maskOf(o))).ToList();
        foreach (var (first, index) in masks.Select((m, i) => (m, i)))
        {
            Assert.Contains(true, first.Mask);
            foreach (var second in masks.Skip(index + 1))
            {
                var difference = Difference(first.Mask, second.Mask);
                Assert.True(difference >= least, $"{first.Outcome} and {second.Outcome} differ by {difference:0.00} only");
            }
        }
    }

    private static bool[] Mask(Action<Sheet> draw)
    {
        using var bitmap = new SKBitmap(new SKImageInfo(Side, Side, SKColorType.Rgba8888, SKAlphaType.Premul));
        using var canvas = new SKCanvas(bitmap);
        using var sheet = new Sheet(canvas, Plain, false, null);
        canvas.Clear(SKColors.Black);
        draw(sheet);
        return [.. bitmap.Pixels.Select(p => p.Red > 110)];
    }

    /// <summary>Share of the pixels lit in either that are not lit in both.</summary>
    private static double Difference(bool[] a, bool[] b)
    {
        var either = a.Zip(b).Count(p => p.First || p.Second);
        return (double)a.Zip(b).Count(p => p.First != p.Second) / either;
    }
}
