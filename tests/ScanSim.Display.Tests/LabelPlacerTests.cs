using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Tests;

public sealed class LabelPlacerTests
{
    private static readonly SKRect Frame = new(0, 0, 1044, 560);

    [Theory]
    [InlineData(8)]
    [InlineData(50)]
    [InlineData(200)]
    public void No_label_covers_another_or_leaves_the_frame_or_lies_under_a_leader(int count)
    {
        var obstacles = (SKRect[])[new(500, 270, 620, 290), new(0, 500, 150, 560)];
        var requests = Requests(count);
        var layout = LabelPlacer.Place(requests, Frame, obstacles, Marks(count));
        Assert.Equal(count, layout.Placed.Length + layout.Omitted);
        for (var i = 0; i < layout.Placed.Length; i++)
        {
            var label = layout.Placed[i];
            Assert.True(Frame.Contains(label.Box), $"{label.Request.Text} leaves the frame");
            Assert.DoesNotContain(obstacles, o => o.IntersectsWith(label.Box));
            Assert.DoesNotContain(requests, r => r != label.Request && label.Box.Contains(r.Anchor));
            foreach (var other in layout.Placed.Where((_, j) => j != i))
            {
                Assert.False(label.Box.IntersectsWith(other.Box), $"{label.Request.Text} covers {other.Request.Text}");
                Assert.False(other.HasLeader && PointsOn(other).Any(label.Box.Contains), $"{label.Request.Text} lies on the leader of {other.Request.Text}");
            }
        }
    }

    [Fact]
    public void A_lone_label_stands_to_the_right_of_its_point_without_a_leader()
    {
        var layout = LabelPlacer.Place([new LabelRequest("boat", new SKPoint(500, 300), new SKSize(40, 14), false)], Frame, [], []);
        var label = Assert.Single(layout.Placed);
        Assert.False(label.HasLeader);
        Assert.True(label.Box.Left > 500);
        Assert.Equal(300, label.Box.MidY, 0.01f);
    }

    [Fact]
    public void A_label_gives_way_to_plots()
    {
        var request = new LabelRequest("boat", new SKPoint(500, 300), new SKSize(40, 14), false);
        var marks = Enumerable.Range(0, 10).Select(i => new SKPoint(510 + 4 * i, 300)).ToList();
        var label = Assert.Single(LabelPlacer.Place([request], Frame, [], marks).Placed);
        Assert.DoesNotContain(marks, label.Box.Contains);
    }

    [Fact]
    public void Labels_that_share_one_point_fan_out_and_the_rest_is_counted()
    {
        var requests = Enumerable.Range(0, 300).Select(i => new LabelRequest($"t{i}", new SKPoint(500, 300), new SKSize(60, 14), false)).ToList();
        var layout = LabelPlacer.Place(requests, Frame, [], []);
        Assert.InRange(layout.Placed.Length, 4, 299);
        Assert.Equal(300 - layout.Placed.Length, layout.Omitted);
    }

    [Fact]
    public void The_same_points_get_the_same_places()
    {
        var first = LabelPlacer.Place(Requests(200), Frame, [], Marks(200));
        var second = LabelPlacer.Place(Requests(200), Frame, [], Marks(200));
        Assert.Equal(first.Placed, second.Placed);
    }

    [Theory]
    [InlineData(8, 0)]
    [InlineData(50, 5)]
    public void Hardly_a_label_is_left_out_when_there_is_room(int count, int most) =>
        Assert.InRange(LabelPlacer.Place(Requests(count), Frame, [], []).Omitted, 0, most);

    private static List<LabelRequest> Requests(int count)
    {
        var draws = new Random(count);
        return [.. Enumerable.Range(0, count).Select(i => new LabelRequest(
            $"target-{i:000}",
            new SKPoint(1044 * draws.NextSingle(), 560 * draws.NextSingle()),
            new SKSize(62, 14),
            false))];
    }

    private static List<SKPoint> Marks(int count)
    {
        var draws = new Random(count + 1);
        return [.. Enumerable.Range(0, 8 * count).Select(_ => new SKPoint(1044 * draws.NextSingle(), 560 * draws.NextSingle()))];
    }

    private static IEnumerable<SKPoint> PointsOn(PlacedLabel label)
    {
        for (var share = 0.0f; share <= 1; share += 0.02f)
        {
            yield return new SKPoint(
                label.Request.Anchor.X + share * (label.LeaderEnd.X - label.Request.Anchor.X),
                label.Request.Anchor.Y + share * (label.LeaderEnd.Y - label.Request.Anchor.Y));
        }
    }
}
