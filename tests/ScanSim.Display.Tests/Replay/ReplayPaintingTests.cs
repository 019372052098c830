using System.Collections.Immutable;
using ScanSim.Display.Overlays;
using ScanSim.Display.Painting;
using ScanSim.Display.Replay;
using ScanSim.Display.Windowing;
using ScanSim.Recordings;
using SkiaSharp;
using static ScanSim.Display.Tests.Replay.ReplayMaking;

namespace ScanSim.Display.Tests.Replay;

public sealed class ReplayPaintingTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData(0, 1280, 800)]
    [InlineData(8, 800, 600)]
    [InlineData(8, 1920, 1080)]
    [InlineData(50, 1280, 800)]
    [InlineData(200, 1280, 800)]
    [InlineData(200, 1920, 1080)]
    public void No_text_covers_another_or_leaves_the_window(int targets, int width, int height)
    {
        var recording = Recording(folder.In("run"), SceneMaking.Scenario(targets, 120));
        foreach (var recordings in (ImmutableArray<ReplayRecording>[])[[recording], [recording, recording]])
        {
            foreach (var isSelected in (bool[])[false, true])
            {
                using var screen = Screen(recordings, new ReplaySettings { IsPlaying = false, StartS = 60 });
                screen.Press(new WindowEvent { Kind = WindowEventKind.Resized, X = width, Y = height });
                if (isSelected)
                {
                    screen.Press(Key(WindowKey.Tab));
                }

                var texts = TextsOf(screen, width, height);
                Assert.Contains(texts, text => text.Text == "Scan timeline");
                Overlaps.None(texts, width, height);
            }
        }
    }

    [Fact]
    public void Layers_kept_as_pixels_look_like_what_is_painted_anew()
    {
        using var screen = Screen([Recording(folder.In("run"), SceneMaking.Scenario(20, 120))], new ReplaySettings { IsPlaying = true, StartS = 60, SaveFolder = folder.In("") });
        screen.Press(Key(WindowKey.Tab), Typed('x'), Wheel(400, 200, 2));
        for (var frame = 0; frame < 30; frame++)
        {
            screen.Advance(1.0 / 60);
            Pixels(screen).Dispose();
        }

        // The saved picture is painted without layers. Both without labels: their places may have been kept from an earlier frame.
        screen.Press(Key(WindowKey.Space), Typed('i'), Pointer(WindowEventKind.PointerLeft, 0, 0));
        screen.WaitForRows();
        using var kept = Pixels(screen);
        screen.Press(Typed('p'));
        using var anew = SKBitmap.Decode(folder.In(folder.Files().Single(name => name.EndsWith(".png", StringComparison.Ordinal))));
        var foot = ReplayLayout.Of(Width, Height, screen.World).Foot;
        var differing = 0;
        for (var y = 0; y < (int)foot.Top; y++)
        {
            for (var x = 0; x < (int)Width; x++)
            {
                var (a, b) = (kept.GetPixel(x, y), anew.GetPixel(x, y));
                differing += Math.Abs(a.Red - b.Red) + Math.Abs(a.Green - b.Green) + Math.Abs(a.Blue - b.Blue) > 24 ? 1 : 0;
            }
        }

        Assert.InRange(differing, 0, 40);
    }

    [Fact]
    public void The_still_parts_are_painted_once_while_time_runs()
    {
        using var screen = Screen([Recording(folder.In("run"), SceneMaking.Scenario(20, 120))], new ReplaySettings { IsPlaying = true, StartS = 60 });
        for (var frame = 0; frame < 60; frame++)
        {
            screen.Advance(1.0 / 60);
            Pixels(screen).Dispose();
        }

        // One second of a scan of 2.5 s: the trails in eighths of a scan, the timeline once, labels as their targets move.
        Assert.Equal(["ground 4", "timeline 1"], screen.Painter.Counts().Where(count => !count.StartsWith("labels", StringComparison.Ordinal)));
    }

    [Fact]
    public void Hits_light_up_when_the_beam_meets_them_and_are_gone_half_a_scan_later()
    {
        var scenario = SceneMaking.Scenario(1, 20);
        var recording = Recording(folder.In("run"), scenario, LooksKept.Best, sink => sink.AddHits([
            new HitRow { TimeS = 5, Scan = 2, Dwell = 1, BeamAzimuthDeg = 90, RangeM = 12_000, SnrDb = 10, Kind = EchoKind.Target, Target = scenario.Targets[0].Id }]));
        using var screen = Screen([recording], new ReplaySettings { IsPlaying = false });
        var plan = ReplayLayout.Of(Width, Height, screen.World).Plans[0];
        var pxPerM = (Math.Min(plan.Width, plan.Height) / 2 - 30) / SceneMaking.RangeM;
        // Off the bearing of 90 degrees the ring and the line of the grid do not disturb.
        Assert.True(IsLit(5.05));
        Assert.False(IsLit(4.95));
        Assert.False(IsLit(6.25));
        screen.Press(Typed('h'));
        Assert.False(IsLit(5.05));

        bool IsLit(double timeS)
        {
            var rows = ReplayLayout.Of(Width, Height, screen.World).Rows;
            screen.Click(rows.Left + (float)(timeS / 20) * rows.Width, rows.MidY);
            screen.WaitForRows();
            using var pixels = Pixels(screen);
            return pixels.GetPixel((int)(plan.MidX + 12_000 * pxPerM), (int)plan.MidY).Red > 0xA0;
        }
    }

    [Fact]
    public void An_overlay_is_drawn_where_it_lies_and_can_be_switched_off()
    {
        var overlay = new Overlay
        {
            Lines = [new OverlayLine { Vertices = [new(5_000, -20_000), new(5_000, 20_000)], Closed = false, Name = "" }],
            Points = [],
            LeftOut = 0,
        };
        var recording = Recording(folder.In("run"), SceneMaking.Scenario(0, 20));
        using var screen = Screen([recording], new ReplaySettings { IsPlaying = false, StartS = 1, Overlays = [overlay] });
        Assert.True(IsThere());
        screen.Press(Typed('o'));
        Assert.False(IsThere());

        bool IsThere()
        {
            var plan = ReplayLayout.Of(Width, Height, screen.World).Plans[0];
            var at = ReplayMoves.Projection(screen.State, screen.World, plan).ToPlan(5_000, 14_300);
            using var pixels = Pixels(screen);
            return Enumerable.Range(-1, 3).Any(dx => pixels.GetPixel((int)at.X + dx, (int)at.Y).Red > Colours.Dark.Ground.Red + 0x10);
        }
    }

    [Fact]
    public void A_ring_label_stands_beside_a_target_not_under_it()
    {
        var scenario = SceneMaking.Scenario(1, 10);
        var builder = new SceneBuilder(scenario);
        var diagonalM = 10_000 * Math.Sqrt(0.5);
        builder.AddTruth([SceneMaking.TruthRow(scenario.Targets[0].Id, 0, 1, diagonalM, diagonalM), SceneMaking.TruthRow(scenario.Targets[0].Id, 1, 3.5, diagonalM, diagonalM)]);
        using var free = PaintedPicture.Of(builder.Build(), new ViewOptions { ShowTruth = false }, 2, PictureSize.Default);
        using var taken = PaintedPicture.Of(builder.Build(), new ViewOptions(), 2, PictureSize.Default);
        var (middle, pxPerM) = taken.Plan(SceneMaking.RangeM);
        var target = new SKPoint((float)(middle.X + diagonalM * pxPerM), (float)(middle.Y - diagonalM * pxPerM));
        Assert.True(SKRect.Inflate(LabelBox(free), 6, 6).Contains(target), "without the target the label stands at 045");
        Assert.False(SKRect.Inflate(LabelBox(taken), 6, 6).Contains(target));

        // The scale bar says the same further down.
        static SKRect LabelBox(PaintedPicture picture) => picture.Texts.First(text => text.Text == "10 km").Box;
    }

    [Fact]
    public void Labels_overlap_none_while_their_targets_move()
    {
        using var screen = Screen([Recording(folder.In("run"), SceneMaking.Scenario(60, 120))], new ReplaySettings { IsPlaying = true, StartS = 40, SpeedRatio = 4 });
        var ids = screen.World.Rows.Select(row => row.Id).ToHashSet(StringComparer.Ordinal);
        var plan = ReplayLayout.Of(Width, Height, screen.World).Plans[0];
        for (var frame = 0; frame < 120; frame++)
        {
            screen.Advance(1.0 / 60);
            var labels = TextsOf(screen, (int)Width, (int)Height).Where(text => ids.Contains(text.Text) && plan.Contains(text.Box)).ToList();
            Assert.True(labels.Count > 20);
            Overlaps.None(labels, Width, Height);
        }
    }

    private static List<DrawnText> TextsOf(ReplayScreen screen, int width, int height)
    {
        var texts = new List<DrawnText>();
        screen.WaitForRows();
        screen.Journal = texts;
        using var surface = SKSurface.Create(new SKImageInfo(width, height));
        screen.Paint(surface.Canvas, width, height, 1);
        screen.Journal = null;
        return texts;
    }

    private static SKBitmap Pixels(ReplayScreen screen)
    {
        var pixels = new SKBitmap(new SKImageInfo((int)Width, (int)Height, SKColorType.Rgba8888, SKAlphaType.Premul));
        using var canvas = new SKCanvas(pixels);
        screen.Paint(canvas, Width, Height, 1);
        return pixels;
    }
}
