using ScanSim.Display.Windowing;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>What a test machine's keyboard cannot send: other layouts, other systems, held keys, fractions of the wheel.</summary>
public sealed class EventTranslationTests
{
    private readonly EventTranslation translation = new(preciseWheel: true, isMac: false);

    [Fact]
    public void A_question_mark_is_known_wherever_the_layout_has_it()
    {
        // German: shift and sharp s.
        Assert.Null(Send(Key('ß', SdlKeys.Shift & 1)));
        var e = Send(Text('?'));
        Assert.Equal((WindowKey.Character, '?', true), (e?.Key, e?.Character, e?.Shift));
    }

    [Fact]
    public void What_the_right_Alt_key_types_is_no_command()
    {
        // German on Windows: AltGr with 8 is a bracket, and reported as Control and right Alt.
        Assert.Null(Send(Key('8', SdlKeys.LeftControl | SdlKeys.RightAlt)));
        var e = Send(Text('['));
        Assert.Equal(('[', false, false), (e?.Character, e?.Control, e?.Alt));
    }

    [Fact]
    public void On_a_Mac_Option_types_and_Command_is_Control()
    {
        var mac = new EventTranslation(preciseWheel: true, isMac: true);
        Assert.False(mac.Translate(Key('l', SdlKeys.LeftAlt), out _));
        Assert.True(mac.Translate(Text('@'), out var typed));
        Assert.Equal('@', typed.Character);
        Assert.True(mac.Translate(Key('s', 0x0400), out var save));
        Assert.Equal(('s', true), (save.Character, save.Control));
    }

    [Fact]
    public void Held_letters_and_space_act_once_while_arrows_and_signs_go_on()
    {
        Assert.NotNull(Send(Key(' ')));
        Assert.Null(Send(Key(' ', repeat: true)));
        Assert.NotNull(Send(Key(1 << 30 | 79)));
        Assert.NotNull(Send(Key(1 << 30 | 79, repeat: true)));
        Send(Key('t'));
        Assert.NotNull(Send(Text('t')));
        Send(Key('t', repeat: true));
        Assert.Null(Send(Text('t')));
        Send(Key('.', repeat: true));
        Assert.NotNull(Send(Text('.')));
    }

    [Fact]
    public void The_keypad_gives_arrows_or_digits_as_NumLock_says()
    {
        const int Keypad6 = 1 << 30 | 94;
        Assert.Equal(WindowKey.Right, Send(Key(Keypad6))?.Key);
        Assert.Null(Send(Key(Keypad6, SdlKeys.NumLock)));
        Assert.Equal('6', Send(Text('6'))?.Character);
    }

    [Fact]
    public void Wheels_turn_by_fractions_and_sideways_not_at_all()
    {
        Assert.Equal(0.25f, Send(new SdlEvent { Type = SdlEvent.MouseWheel, PreciseWheelY = 0.25f })?.Wheel);
        Assert.Null(Send(new SdlEvent { Type = SdlEvent.MouseWheel }));
        var old = new EventTranslation(preciseWheel: false, isMac: false);
        Assert.True(old.Translate(new SdlEvent { Type = SdlEvent.MouseWheel, WheelY = -2, PreciseWheelY = float.NaN }, out var e));
        Assert.Equal(-2, e.Wheel);
    }

    [Fact]
    public void Modifiers_end_with_their_key()
    {
        Send(new SdlEvent { Type = SdlEvent.KeyDown, KeyCode = 1 << 30 | 225, Modifiers = 1 });
        Assert.True(Send(Move(1, 2))?.Shift);
        Send(new SdlEvent { Type = SdlEvent.KeyUp, KeyCode = 1 << 30 | 225, Modifiers = 0 });
        Assert.False(Send(Move(1, 2))?.Shift);
    }

    [Theory]
    [InlineData(1, 1)]
    [InlineData(2, 2)]
    [InlineData(3, 1)]
    [InlineData(4, 2)]
    public void Every_second_press_in_a_row_is_the_second_of_a_double_click(byte sdlClicks, int clicks) =>
        Assert.Equal(clicks, Send(new SdlEvent { Type = SdlEvent.MouseButtonDown, Button = 1, Clicks = sdlClicks })?.Clicks);

    [Fact]
    public void Letters_beyond_ASCII_arrive_whole_and_those_beyond_sixteen_bits_not()
    {
        Assert.Equal('ж', Send(new SdlEvent { Type = SdlEvent.TextInput, Text = 0xB6D0 })?.Character);
        Assert.Equal('€', Send(new SdlEvent { Type = SdlEvent.TextInput, Text = 0xAC82E2 })?.Character);
        Assert.Null(Send(new SdlEvent { Type = SdlEvent.TextInput, Text = 0x80989FF0 }));
    }

    private static SdlEvent Key(int code, int modifiers = 0, bool repeat = false) =>
        new() { Type = SdlEvent.KeyDown, KeyRepeat = repeat ? (byte)1 : (byte)0, KeyCode = code, Modifiers = (ushort)modifiers };

    private static SdlEvent Text(char ascii) => new() { Type = SdlEvent.TextInput, Text = ascii };

    private static SdlEvent Move(int x, int y) => new() { Type = SdlEvent.MouseMotion, X = x, Y = y };

    private WindowEvent? Send(SdlEvent sdl) => translation.Translate(sdl, out var e) ? e : null;
}
