using ScanSim.Display.Painting;
using ScanSim.Display.Replay;
using ScanSim.Display.Windowing;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Tests.Replay;

public sealed class ReplayKeysTests
{
    [Fact]
    public void No_key_is_in_the_table_twice() =>
        Assert.Equal(ReplayKeys.All.Length, ReplayKeys.All.Select(key => (key.Key, key.Character, key.Shift)).Distinct().Count());

    [Fact]
    public void Every_key_of_the_table_is_obeyed_and_every_other_event_means_nothing()
    {
        foreach (var key in ReplayKeys.All)
        {
            Assert.Same(key, ReplayKeys.Of(EventOf(key)));
        }

        var known = ReplayKeys.All.Select(key => (key.Key, key.Character, key.Shift)).ToHashSet();
        for (var c = '!'; c <= '~'; c++)
        {
            Assert.Equal(known.Contains((WindowKey.Character, c, false)), ReplayKeys.Of(ReplayMaking.Typed(c)) is not null);
        }

        foreach (var named in Enum.GetValues<WindowKey>().Except([WindowKey.Character]))
        {
            Assert.Equal(known.Contains((named, '\0', false)), ReplayKeys.Of(ReplayMaking.Key(named)) is not null);
        }
    }

    [Theory]
    [InlineData(800, 600)]
    [InlineData(1280, 800)]
    [InlineData(1920, 1080)]
    public void The_help_page_lists_every_key_and_nothing_on_it_overlaps(int width, int height)
    {
        var texts = new List<DrawnText>();
        using var surface = SKSurface.Create(new SKImageInfo(width, height));
        using var sheet = new Sheet(surface.Canvas, Colours.Dark, false, texts);
        HelpPage.Paint(sheet, width, height);
        foreach (var key in ReplayKeys.All)
        {
            Assert.Contains(texts, text => text.Text == key.Keys);
            Assert.Contains(texts, text => text.Text.Split('…')[0] is { Length: > 3 } shown && key.Does.StartsWith(shown, StringComparison.Ordinal));
        }

        foreach (var gesture in ReplayKeys.Pointer)
        {
            Assert.Contains(texts, text => text.Text == gesture.Gesture);
        }

        Overlaps.None(texts, width, height);
    }

    [Fact]
    public void Every_key_can_be_pressed_whatever_is_selected()
    {
        using var folder = new TemporaryFolder();
        var recording = ReplayMaking.Recording(folder.In("run"), SceneMaking.Scenario(8, 60));
        foreach (var selected in (string?[])[null, recording.Scene.Targets[0].Id])
        {
            foreach (var key in ReplayKeys.All)
            {
                using var screen = ReplayMaking.Screen([recording], new ReplaySettings { IsPlaying = false, StartS = 30, Selected = selected, SaveFolder = folder.In("") });
                Assert.True(screen.Handle(EventOf(key)), $"{key.Keys} with {selected ?? "nothing"} selected");
            }
        }

        Assert.Equal(
            ["harbour-approach-morning-traffic-061030-2.pdf", "harbour-approach-morning-traffic-061030-2.png", "harbour-approach-morning-traffic-061030-2.svg",
             "harbour-approach-morning-traffic-061030.pdf", "harbour-approach-morning-traffic-061030.png", "harbour-approach-morning-traffic-061030.svg"],
            folder.Files());
    }

    private static WindowEvent EventOf(ReplayKey key) =>
        new() { Kind = WindowEventKind.KeyDown, Key = key.Key, Character = key.Character, Shift = key.Shift || char.IsUpper(key.Character) };
}
