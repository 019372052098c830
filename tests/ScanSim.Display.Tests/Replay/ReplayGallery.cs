using ScanSim.Display.Replay;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Replay;

/// <summary>The window's contents as pictures to look at: of the recordings that SCANSIM_RECORDINGS lists, into the folder of SCANSIM_GALLERY.</summary>
public sealed class ReplayGallery
{
    [Fact]
    public void The_replay_is_painted_where_asked()
    {
        var folder = Environment.GetEnvironmentVariable("SCANSIM_GALLERY");
        var recordings = Environment.GetEnvironmentVariable("SCANSIM_RECORDINGS");
        Assert.SkipWhen(string.IsNullOrEmpty(folder) || string.IsNullOrEmpty(recordings), "SCANSIM_GALLERY or SCANSIM_RECORDINGS is not set");
        Directory.CreateDirectory(folder!);
        var opened = recordings!.Split(':').Select(ReplayRecording.Open).ToList();
        foreach (var recording in opened)
        {
            foreach (var theme in Enum.GetValues<Theme>())
            {
                using var screen = new ReplayScreen([recording], Settings(recording, theme));
                Save(screen, 1280, 800, Path.Combine(folder!, $"{recording.Name}-{theme}-plain.png"));
                screen.Press(ReplayMaking.Key(WindowKey.Tab), ReplayMaking.Key(WindowKey.Tab), ReplayMaking.Key(WindowKey.Tab), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'));
                Save(screen, 1280, 800, Path.Combine(folder!, $"{recording.Name}-{theme}-selected.png"));
                screen.Press(ReplayMaking.Typed('a'), ReplayMaking.Typed('n'));
                Save(screen, 1920, 1080, Path.Combine(folder!, $"{recording.Name}-{theme}-large.png"));
                screen.Press(ReplayMaking.Typed('l'), ReplayMaking.Key(WindowKey.Right, shift: true), ReplayMaking.Key(WindowKey.Right, shift: true), ReplayMaking.Typed('l'));
                HoverOverNewestPlot(screen);
                Save(screen, 800, 600, Path.Combine(folder!, $"{recording.Name}-{theme}-small.png"));
                screen.Press(ReplayMaking.Typed('?'));
                Save(screen, 1280, 800, Path.Combine(folder!, $"{recording.Name}-{theme}-help.png"));
            }
        }

        if (opened.Count > 1)
        {
            using var both = new ReplayScreen([opened[^2], opened[^1]], Settings(opened[^1], Theme.Dark));
            Save(both, 1280, 800, Path.Combine(folder!, "both.png"));
            both.Press(ReplayMaking.Key(WindowKey.Tab), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'), ReplayMaking.Typed('x'), ReplayMaking.Typed('.'), ReplayMaking.Typed('.'), ReplayMaking.Typed('.'));
            Save(both, 1280, 800, Path.Combine(folder!, "both-selected.png"));
        }
    }

    private static void HoverOverNewestPlot(ReplayScreen screen)
    {
        screen.Handle(new WindowEvent { Kind = WindowEventKind.Resized, X = 800, Y = 600, Scale = 1 });
        screen.WaitForRows();
        var plan = ReplayLayout.Of(800, 600, screen.World).Plans[0];
        if (ReplayPick.Shown(screen.State, screen.World, 0) is { IsEmpty: false } plots)
        {
            var place = ReplayMoves.Projection(screen.State, screen.World, plan).ToPlan(plots[^1].EastM, plots[^1].NorthM);
            screen.Press(ReplayMaking.Pointer(WindowEventKind.PointerMoved, place.X, place.Y));
        }
    }

    private static ReplaySettings Settings(ReplayRecording recording, Theme theme) =>
        new() { IsPlaying = false, StartS = 0.4 * recording.Scene.DurationS, Theme = theme };

    private static void Save(ReplayScreen screen, int width, int height, string path)
    {
        screen.Handle(new WindowEvent { Kind = WindowEventKind.Resized, X = width, Y = height, Scale = 1 });
        screen.WaitForRows();
        using var surface = SKSurface.Create(new SKImageInfo(width, height, SKColorType.Rgba8888, SKAlphaType.Premul));
        screen.Paint(surface.Canvas, width, height, 1);
        using var image = surface.Snapshot();
        using var data = image.Encode(SKEncodedImageFormat.Png, 100);
        using var stream = File.Create(path);
        data.SaveTo(stream);
    }
}
