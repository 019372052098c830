using System.Text.RegularExpressions;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Tests;

public sealed partial class TextLayoutTests
{
    public static TheoryData<int, int, int, double> Cases()
    {
        var cases = new TheoryData<int, int, int, double>();
        foreach (var targets in (int[])[0, 1, 8, 50, 200])
        {
            cases.Add(targets, 800, 600, 1);
            cases.Add(targets, 1280, 900, 1);
            cases.Add(targets, 1920, 1080, 1);
            cases.Add(targets, 3840, 2160, 1);
            cases.Add(targets, 3840, 2160, 2);
            cases.Add(targets, 2000, 1500, 2.5);
        }

        return cases;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void No_text_is_small_clipped_or_covers_another(int targets, int widthPx, int heightPx, double scale)
    {
        var scene = SceneMaking.Scene(targets, 120, blanked: [new(4, 4.5)]);
        var size = new PictureSize(widthPx, heightPx, scale);
        using var picture = PaintedPicture.Of(scene, new ViewOptions(), 83, size);
        var page = new SKRect(0, 0, size.Width, size.Height);
        for (var i = 0; i < picture.Texts.Count; i++)
        {
            var text = picture.Texts[i];
            Assert.True(text.Size >= 11, $"'{text.Text}' is set at {text.Size}");
            Assert.True(page.Contains(text.Box), $"'{text.Text}' at {text.Box} leaves the page");
            foreach (var other in picture.Texts.Skip(i + 1))
            {
                Assert.False(text.Box.IntersectsWith(other.Box), $"'{text.Text}' at {text.Box} and '{other.Text}' at {other.Box}");
            }
        }

        Assert.All(picture.Texts.Where(t => picture.Layout.Panel.Contains(t.Box.Left, t.Box.Top)), t => Assert.True(picture.Layout.Panel.Contains(t.Box), $"'{t.Text}' leaves the panel"));
    }

    [Fact]
    public void Long_names_are_cut_with_an_ellipsis_and_stay_inside()
    {
        var longName = string.Concat(Enumerable.Repeat("Traffic in the northern approach ", 12));
        var scenario = SceneMaking.Scenario(3, 60, name: longName);
        scenario = scenario with
        {
            Site = scenario.Site with { Name = longName },
            Targets = [.. scenario.Targets.Select((t, i) => t with { Id = new string('W', 40) + i })],
        };
        using var picture = PaintedPicture.Of(SceneMaking.Gather(scenario).Build(), new ViewOptions(), 30, new PictureSize(800, 600));
        Assert.All(picture.Texts, t => Assert.True(t.Box is { Left: >= 0, Right: <= 800 }, t.Text));
        Assert.Contains(picture.Texts, t => t.Text.StartsWith("Traffic", StringComparison.Ordinal) && t.Text.EndsWith('…') && t.Size > 12);
    }

    [Theory]
    [InlineData(1, 0)]
    [InlineData(8, 0)]
    [InlineData(50, 1)]
    [InlineData(200, 1)]
    public void Every_target_has_a_row_or_is_counted(int targets, int countLines)
    {
        var scene = SceneMaking.Scene(targets, 120);
        using var picture = PaintedPicture.Of(scene, new ViewOptions(), 60, PictureSize.Default);
        var ids = scene.Targets.Select(t => t.Id).ToHashSet(StringComparer.Ordinal);
        var rows = picture.Texts.Count(t => ids.Contains(t.Text) && picture.Layout.Timeline.Contains(t.Box));
        var more = picture.Texts.Select(t => MoreTargets().Match(t.Text)).Where(m => m.Success).Select(m => int.Parse(m.Groups["count"].Value)).ToList();
        Assert.Equal(countLines, more.Count);
        Assert.Equal(targets, rows + more.Sum());
        Assert.Equal(picture.Layout.ShownTargets, rows);
    }

    [Theory]
    [InlineData(800, 600)]
    [InlineData(1280, 900)]
    [InlineData(1920, 1080)]
    public void Eight_targets_keep_all_their_labels(int widthPx, int heightPx)
    {
        var scene = SceneMaking.Scene(8);
        using var picture = PaintedPicture.Of(scene, new ViewOptions(), 203, new PictureSize(widthPx, heightPx));
        foreach (var target in scene.Targets)
        {
            Assert.Contains(picture.Texts, t => t.Text == target.Id && picture.Layout.Plan.Contains(t.Box));
        }
    }

    [Fact]
    public void The_picture_says_what_it_shows_and_with_what_caution()
    {
        using var picture = PaintedPicture.Of(SceneMaking.Scene(8), new ViewOptions(), 203, PictureSize.Default);
        string[] expected =
        [
            "Harbour approach, morning traffic", "Cape North", "06:13:23", "UTC", "2026-05-12", "203.0 s", "81 (82 of 120)",
            "N", "000", "330", "Scan timeline", "blip/scan", "Planning estimate from models, not proof of performance.",
        ];
        foreach (var text in expected)
        {
            Assert.Contains(picture.Texts, t => t.Text == text);
        }

        using var quiet = PaintedPicture.Of(SceneMaking.Scene(8), new ViewOptions { ShowLabels = false, ShowFalsePlots = false, ShowTruth = false }, 203, PictureSize.Default);
        Assert.DoesNotContain(quiet.Texts, t => t.Text == "False plot");
        Assert.DoesNotContain(quiet.Texts, t => t.Text == "ferry-01" && quiet.Layout.Plan.Contains(t.Box));
    }

    [GeneratedRegex(@"^\+ (?<count>\d+) more targets$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex MoreTargets();
}
