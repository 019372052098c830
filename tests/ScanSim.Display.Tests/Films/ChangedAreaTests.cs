using ScanSim.Display.Films;

namespace ScanSim.Display.Tests.Films;

public sealed class ChangedAreaTests
{
    [Fact]
    public void The_area_is_the_smallest_that_holds_every_difference()
    {
        var size = FilmMaking.Plan.Size;
        using var frame = new FrameBuffer(size);
        using var before = new FrameBuffer(size);
        var painter = new Painter(FilmMaking.Scene);
        foreach (var stepS in (double[])[0, 0.01, 0.8, 30])
        {
            before.Paint(painter, FilmMaking.View, 50);
            frame.Paint(painter, FilmMaking.View, 50 + stepS);
            var different = (
                from y in Enumerable.Range(0, size.HeightPx)
                from x in Enumerable.Range(0, size.WidthPx)
                where frame.Row(y)[x] != before.Row(y)[x]
                select (X: x, Y: y)).ToList();
            var area = ChangedArea.Of(frame, before);
            Assert.Equal(different.Count == 0, stepS == 0);
            Assert.Equal(
                different.Count == 0 ? new ChangedArea(0, 0, 1, 1) : Box(different.Min(p => p.X), different.Min(p => p.Y), different.Max(p => p.X), different.Max(p => p.Y)),
                area);
        }

        Assert.Equal(new ChangedArea(0, 0, size.WidthPx, size.HeightPx), ChangedArea.Of(frame, null));
    }

    [Theory]
    [InlineData(0, 0, 1, 1, 0, 0, 1, 1)]
    [InlineData(5, 8, 3, 4, 4, 8, 4, 4)]
    [InlineData(6, 7, 1, 1, 6, 6, 1, 2)]
    public void An_area_grown_to_even_pixels_ends_where_it_did(int left, int top, int width, int height, int evenLeft, int evenTop, int evenWidth, int evenHeight) =>
        Assert.Equal(new ChangedArea(evenLeft, evenTop, evenWidth, evenHeight), new ChangedArea(left, top, width, height).FromEven());

    private static ChangedArea Box(int left, int top, int right, int bottom) => new(left, top, right - left + 1, bottom - top + 1);
}
