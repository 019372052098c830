using System.Collections.Immutable;
using ScanSim.Display.Replay;
using ScanSim.Display.Windowing;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Tests.Replay;

/// <summary>Replays of small recordings on disk.</summary>
internal static class ReplayMaking
{
    public const float Width = 1280;
    public const float Height = 800;

    public static ReplayRecording Recording(string folder, Scenario scenario, LooksKept looks = LooksKept.Best) =>
        Recording(folder, scenario, looks, sink => SceneMaking.Feed(sink, scenario, looks));

    public static ReplayRecording Recording(string folder, Scenario scenario, LooksKept looks, Action<IRecordingSink> feed)
    {
        var head = new RecordingHead
        {
            ScenarioName = scenario.Name,
            ScenarioDigest = "00",
            ScenarioText = "{}",
            ProgramVersion = "0.1.0",
            Seed = 7,
            StartUtc = scenario.Run.Start,
            DurationS = scenario.Run.DurationS,
            Looks = looks,
            Format = TableFormat.Parquet,
        };
        using (var writer = RecordingWriter.Create(folder, head, force: false))
        {
            feed(writer);
            writer.Complete();
        }

        return ReplayRecording.Open(folder, ScanSim.Recordings.Recording.Open(folder), scenario);
    }

    /// <summary>A paused replay of 1280 x 800 in which everything has been read.</summary>
    public static ReplayScreen Screen(ImmutableArray<ReplayRecording> recordings, ReplaySettings? settings = null)
    {
        var screen = new ReplayScreen(recordings, settings ?? new ReplaySettings { IsPlaying = false });
        screen.Handle(new WindowEvent { Kind = WindowEventKind.Resized, X = Width, Y = Height, Scale = 1 });
        screen.WaitForRows();
        return screen;
    }

    public static WindowEvent Typed(char character) => new() { Kind = WindowEventKind.KeyDown, Key = WindowKey.Character, Character = character };

    public static WindowEvent Key(WindowKey key, bool shift = false) => new() { Kind = WindowEventKind.KeyDown, Key = key, Shift = shift };

    public static WindowEvent Pointer(WindowEventKind kind, float x, float y, PointerButton button = PointerButton.None) =>
        new() { Kind = kind, X = x, Y = y, Button = button, Clicks = kind == WindowEventKind.PointerDown ? 1 : 0 };

    public static WindowEvent Wheel(float x, float y, float notches, bool shift = false) =>
        new() { Kind = WindowEventKind.Wheel, X = x, Y = y, Wheel = notches, Shift = shift };

    public static void Press(this ReplayScreen screen, params ReadOnlySpan<WindowEvent> events)
    {
        foreach (var e in events)
        {
            screen.Handle(e);
        }
    }

    public static void Click(this ReplayScreen screen, float x, float y) => screen.Press(
        Pointer(WindowEventKind.PointerMoved, x, y),
        Pointer(WindowEventKind.PointerDown, x, y, PointerButton.Left),
        Pointer(WindowEventKind.PointerUp, x, y, PointerButton.Left));
}
