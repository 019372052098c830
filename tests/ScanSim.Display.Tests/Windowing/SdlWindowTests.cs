using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>The real window on a real X server: input by the server, pixels from its screen. One at a time, as SDL is one in a process.</summary>
[Collection(WindowCollection.Name)]
public sealed class SdlWindowTests(VirtualDisplay display)
{
    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void What_a_screen_paints_is_on_the_display_to_the_last_corner(bool texture)
    {
        display.Require();
        using var window = new OpenedWindow(display, tryTexture: texture);
        window.AwaitColours(
            (5, 5, RecordingScreen.TopLeft),
            (995, 5, RecordingScreen.TopRight),
            (5, 695, RecordingScreen.BottomLeft),
            (999, 699, RecordingScreen.BottomRight),
            (500, 350, RecordingScreen.Ground),
            (1001, 350, SKColors.Black),
            (500, 701, SKColors.Black));
        window.Screen.Closing = true;
        window.AwaitEnd();
        Assert.Equal(!texture, window.DrewOnSurface);
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void A_screen_begins_with_its_size_and_hears_of_each_new_one(bool texture)
    {
        display.Require();
        using var window = new OpenedWindow(display, tryTexture: texture);
        var first = window.Screen.Events.First();
        Assert.Equal((WindowEventKind.Resized, 1000f, 700f, 1f), (first.Kind, first.X, first.Y, first.Scale));
        display.Do("windowsize", window.Id, "1200", "900");
        window.AwaitEvent(e => e is { Kind: WindowEventKind.Resized, X: 1200, Y: 900 }, "the new size");
        window.AwaitColours((1199, 899, RecordingScreen.BottomRight), (5, 899, RecordingScreen.BottomLeft), (1100, 200, RecordingScreen.Ground));
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void At_scale_2_a_unit_is_two_pixels_for_painting_and_for_the_pointer(bool texture)
    {
        display.Require();
        using var window = new OpenedWindow(display, scale: 2, tryTexture: texture, width: 800, height: 600);
        var first = window.Screen.Events.First();
        Assert.Equal((800f, 600f, 2f), (first.X, first.Y, first.Scale));
        window.AwaitColours((79, 79, RecordingScreen.TopLeft), (81, 81, RecordingScreen.Ground), (1599, 1199, RecordingScreen.BottomRight));
        display.Do("mousemove", "301", "500", "click", "1");
        var click = window.AwaitEvent(e => e.Kind == WindowEventKind.PointerDown, "the click");
        Assert.Equal((150.5f, 250f), (click.X, click.Y));
    }

    [Fact]
    public void A_window_larger_than_the_screen_is_cut_to_it_and_a_scale_too_large_is_lowered()
    {
        display.Require();
        using var window = new OpenedWindow(display, scale: 4, width: 3000, height: 2000);
        var first = window.Screen.Events.First();
        Assert.Equal((800f, 600f, 2f), (first.X, first.Y, first.Scale));
    }

    [Theory]
    [InlineData(1, PointerButton.Left)]
    [InlineData(2, PointerButton.Middle)]
    [InlineData(3, PointerButton.Right)]
    public void A_click_tells_button_place_and_both_its_ends(int xButton, PointerButton button)
    {
        display.Require();
        using var window = new OpenedWindow(display);
        display.Do("mousemove", "320", "240", "click", $"{xButton}");
        var released = window.AwaitEvent(e => e.Kind == WindowEventKind.PointerUp, "the release");
        var pressed = window.Screen.Events.First(e => e.Kind == WindowEventKind.PointerDown);
        Assert.Equal((320f, 240f, button, 1), (pressed.X, pressed.Y, pressed.Button, pressed.Clicks));
        Assert.Equal((320f, 240f, button), (released.X, released.Y, released.Button));
    }

    [Fact]
    public void The_second_press_of_a_double_click_counts_2()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        display.Do("mousemove", "320", "240", "click", "--repeat", "2", "--delay", "60", "1");
        var second = window.AwaitEvent(e => e is { Kind: WindowEventKind.PointerDown, Clicks: 2 }, "the double click");
        Assert.Equal(1, window.Screen.Events.First(e => e.Kind == WindowEventKind.PointerDown).Clicks);
        Assert.Equal(PointerButton.Left, second.Button);
    }

    [Fact]
    public void A_drag_is_a_press_moves_and_a_release_and_goes_on_outside_the_window()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        display.Do("mousemove", "100", "120", "mousedown", "1", "sleep", "0.1", "mousemove", "180", "150", "sleep", "0.1", "mousemove", "1100", "150", "sleep", "0.1", "mouseup", "1");
        window.AwaitEvent(e => e.Kind == WindowEventKind.PointerUp, "the release");
        var drag = window.Screen.Events.SkipWhile(e => e.Kind != WindowEventKind.PointerDown)
            .Where(e => e.Kind is WindowEventKind.PointerDown or WindowEventKind.PointerMoved or WindowEventKind.PointerUp)
            .Select(e => (e.Kind, e.X, e.Y)).ToArray();
        Assert.Equal((WindowEventKind.PointerDown, 100f, 120f), drag[0]);
        Assert.Contains((WindowEventKind.PointerMoved, 180f, 150f), drag);
        Assert.Contains((WindowEventKind.PointerMoved, 1100f, 150f), drag);
        Assert.Equal(WindowEventKind.PointerUp, drag[^1].Kind);
    }

    [Fact]
    public void The_pointer_is_told_to_leave()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        display.Do("mousemove", "500", "300");
        window.AwaitEvent(e => e is { Kind: WindowEventKind.PointerMoved, X: 500, Y: 300 }, "the move");
        display.Do("mousemove", "1500", "1100");
        window.AwaitEvent(e => e.Kind == WindowEventKind.PointerLeft, "the leave");
    }

    [Fact]
    public void The_wheel_counts_up_away_from_the_user_at_the_pointers_place()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        display.Do("mousemove", "640", "333", "click", "4");
        var away = window.AwaitEvent(e => e.Kind == WindowEventKind.Wheel, "the wheel");
        Assert.Equal((640f, 333f, 1f), (away.X, away.Y, away.Wheel));
        display.Do("keydown", "ctrl", "click", "5", "keyup", "ctrl");
        var towards = window.AwaitEvent(e => e is { Kind: WindowEventKind.Wheel, Wheel: < 0 }, "the wheel back");
        Assert.Equal((-1f, true, false, false), (towards.Wheel, towards.Control, towards.Shift, towards.Alt));
        Assert.Equal(2, window.Screen.Events.Count(e => e.Kind == WindowEventKind.Wheel));
    }

    [Theory]
    [InlineData("space", WindowKey.Space)]
    [InlineData("Escape", WindowKey.Escape)]
    [InlineData("Return", WindowKey.Enter)]
    [InlineData("KP_Enter", WindowKey.Enter)]
    [InlineData("Tab", WindowKey.Tab)]
    [InlineData("Left", WindowKey.Left)]
    [InlineData("Right", WindowKey.Right)]
    [InlineData("Up", WindowKey.Up)]
    [InlineData("Down", WindowKey.Down)]
    [InlineData("Home", WindowKey.Home)]
    [InlineData("End", WindowKey.End)]
    [InlineData("Prior", WindowKey.PageUp)]
    [InlineData("Next", WindowKey.PageDown)]
    [InlineData("Delete", WindowKey.Delete)]
    [InlineData("BackSpace", WindowKey.Backspace)]
    [InlineData("F1", WindowKey.F1)]
    public void Each_named_key_arrives_once_as_itself(string xKey, WindowKey key)
    {
        display.Require();
        using var window = new OpenedWindow(display);
        display.Do("key", xKey, "key", "z");
        window.AwaitEvent(e => e.Character == 'z', "the next key");
        var keys = window.Screen.Events.Where(e => e.Kind == WindowEventKind.KeyDown).Select(e => (e.Key, e.Character));
        Assert.Equal([(key, '\0'), (WindowKey.Character, 'z')], keys);
    }

    [Fact]
    public void Characters_arrive_as_they_are_typed()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        const string Text = "aZ?+-.,[]/9%";
        display.Do("type", "--delay", "30", Text);
        window.AwaitEvent(e => e.Character == '%', "the last character");
        var typed = window.Screen.Events.Where(e => e.Kind == WindowEventKind.KeyDown).ToArray();
        Assert.Equal(Text, string.Concat(typed.Select(e => e.Character)));
        Assert.All(typed, e => Assert.Equal(WindowKey.Character, e.Key));
        Assert.True(typed[2].Shift);
        Assert.False(typed[0].Shift);
    }

    [Fact]
    public void Letters_with_control_or_alt_arrive_once_with_it()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        display.Do("key", "ctrl+s", "key", "alt+f", "key", "ctrl+shift+s", "key", "z");
        window.AwaitEvent(e => e.Character == 'z', "the last key");
        var keys = window.Screen.Events.Where(e => e.Kind == WindowEventKind.KeyDown).Select(e => (e.Character, e.Control, e.Alt, e.Shift));
        Assert.Equal([('s', true, false, false), ('f', false, true, false), ('s', true, false, true), ('z', false, false, false)], keys);
    }

    [Fact]
    public void The_title_follows_the_screen()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        window.Screen.Heading = "Häfen – 12:00";
        display.Do("key", "z");
        window.Until(() => display.TitleOf(window.Id) == window.Screen.Heading, "the title", () => display.TitleOf(window.Id));
    }

    [Fact]
    public void The_systems_close_button_is_a_quit_event()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        XCloseButton.Press(display.Name, ulong.Parse(window.Id, System.Globalization.CultureInfo.InvariantCulture));
        window.AwaitEvent(e => e.Kind == WindowEventKind.Quit, "the quit");
        window.AwaitEnd();
    }

    [Fact]
    public void Cancellation_ends_a_window_at_rest()
    {
        display.Require();
        using var window = new OpenedWindow(display);
        Thread.Sleep(400);
        window.Cancel();
        window.AwaitEnd();
    }
}
