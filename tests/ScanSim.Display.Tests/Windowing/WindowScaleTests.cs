using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Windowing;

public sealed class WindowScaleTests
{
    [Theory]
    [InlineData(1, 96, false, 1)]
    [InlineData(1, 157, false, 1)]
    [InlineData(1, 192, false, 2)]
    [InlineData(1, 284, false, 2)]
    [InlineData(1, 120, true, 1.25)]
    [InlineData(1, 144, true, 1.5)]
    [InlineData(1, 72, true, 1)]
    [InlineData(2, 220, false, 2)]
    [InlineData(1.5, 0, false, 1.5)]
    [InlineData(1, 0, false, 1)]
    [InlineData(1, float.NaN, false, 1)]
    [InlineData(1, float.PositiveInfinity, false, 1)]
    [InlineData(1, 5000, false, 8)]
    public void The_scale_follows_points_first_and_density_in_the_systems_steps(float pixelsPerCoordinate, float dpi, bool usersChoice, float scale) =>
        Assert.Equal(scale, WindowScale.Wanted(pixelsPerCoordinate, dpi, usersChoice));

    [Theory]
    [InlineData(2, 1600, 1200, 2)]
    [InlineData(2, 1920, 1080, 1.75)]
    [InlineData(2, 1366, 768, 1.25)]
    [InlineData(2, 640, 480, 1)]
    [InlineData(1, 4000, 3000, 1)]
    public void The_scale_is_lowered_until_the_least_layout_fits(float wanted, int widthPx, int heightPx, float scale) =>
        Assert.Equal(scale, WindowScale.Fitting(wanted, new SKSizeI(widthPx, heightPx)));
}
