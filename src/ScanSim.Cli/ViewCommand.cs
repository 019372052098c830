using System.CommandLine;
using System.CommandLine.Parsing;
using System.Diagnostics;
using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Overlays;
using ScanSim.Display.Replay;
using ScanSim.Display.Windowing;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim view</summary>
internal static class ViewCommand
{
    private const double SlowestRatio = 0.25;
    private const double FastestRatio = 64;

    private static readonly (int Width, int Height) Usual = (1280, 800);

    public static (Command Command, string Example) Create(Interruption interruption)
    {
        var folder = new Argument<string>("FOLDER") { Description = "Folder of the recording." };
        var other = new Argument<string?>("FOLDER2") { Description = "A second recording, shown beside it in step.", Arity = ArgumentArity.ZeroOrOne };
        var at = QuantityOption.Create("--at", Dimension.Time, "TIME", "Time to begin at, since the scenario's start [default: 0 s].", 0);
        var speed = Factor("--speed", "Times as fast as it was, from 0.25 to 64 [default: 1].", SlowestRatio, FastestRatio);
        var target = new Option<string?>("--target") { Description = "Target selected at first.", HelpName = "ID" };
        var unit = ChoiceOption.Create("--unit", "Unit of ranges.", ("km", RangeUnit.Kilometre), ("nmi", RangeUnit.NauticalMile));
        var paper = new Option<bool>("--paper") { Description = "Dark on white." };
        var afterglow = ViewArguments.AfterglowOption();
        var overlays = ViewArguments.OverlayOption();
        var size = new Option<(int Width, int Height)?>("--size") { Description = "Size of the window in pixels at scale 1 [default: 1280x800].", HelpName = "WxH", CustomParser = ParseSize };
        var scale = Factor("--scale", "Draws everything so many times as large, from 1 to 8 [default: as the screen asks].", 1, 8);
        var measure = QuantityOption.Create("--measure", Dimension.Time, "TIME", "Plays for so long, prints how long the frames took, and closes.", 0, above: true);
        var command = new Command("view", "Replay a recording in a window, or two side by side. The key ? lists what keys and mouse do.")
        {
            folder, other, at, speed, target, unit, paper, afterglow, overlays, size, scale, measure,
        };
        command.SetAction(parsed =>
        {
            string[] folders = parsed.GetValue(other) is { } second ? [parsed.GetValue(folder)!, second] : [parsed.GetValue(folder)!];
            var recordings = folders.Select(ReplayRecording.Open).ToArray();
            var settings = new ReplaySettings
            {
                StartS = parsed.GetValue(at) ?? 0,
                SpeedRatio = parsed.GetValue(speed) ?? 1,
                Unit = parsed.GetValue(unit),
                Theme = parsed.GetValue(paper) ? Theme.Paper : Theme.Dark,
                AfterglowScans = parsed.GetValue(afterglow),
                Selected = parsed.GetValue(target),
                Overlays = [.. parsed.GetValue(overlays)!.Select(file => Overlay.Load(file, recordings[0].Scenario.Site))],
            };
            Check(settings, recordings, parsed.GetValue(measure));
            Show(recordings, settings, parsed.GetValue(size) ?? Usual, parsed.GetValue(scale), parsed.GetValue(measure), interruption.Token);
            return ExitCode.Done;
        });
        return (command, "scansim view out\nscansim view slow fast --at \"5 min\" --speed 4 --overlay coast.geojson");
    }

    private static void Check(ReplaySettings settings, ReplayRecording[] recordings, double? measureS)
    {
        var durationS = recordings.Max(r => r.Scene.DurationS);
        if (settings.StartS > durationS)
        {
            throw new InputException(string.Create(CultureInfo.InvariantCulture, $"--at: read {settings.StartS:0.###} s, expected a time within the recording: 0 s to {durationS:0.###} s"));
        }

        if (settings.AfterglowScans is < 1 or > 1000)
        {
            throw new InputException($"--afterglow: read {settings.AfterglowScans}, expected a whole number from 1 to 1000");
        }

        if (settings.Selected is { } id && Array.TrueForAll(recordings, r => r.IndexOf(id) < 0))
        {
            throw new InputException($"--target: there is no target \"{id}\" in the recording; its targets are {string.Join(", ", recordings[0].Scene.Targets.Select(t => t.Id).Take(20))}");
        }

        var leftS = (durationS - settings.StartS) / settings.SpeedRatio - FrameMeasurement.WarmUpS;
        if (measureS > leftS)
        {
            throw new InputException(string.Create(CultureInfo.InvariantCulture, $"--measure: read {measureS:0.###} s, expected at most {Math.Max(0, leftS):0.###} s: then the recording is at its end at this speed"));
        }
    }

    private static void Show(ReplayRecording[] recordings, ReplaySettings settings, (int Width, int Height) size, double? scale, double? measureS, CancellationToken cancellation)
    {
        var measurement = measureS is { } lengthS ? new FrameMeasurement(lengthS, () => Environment.CpuUsage.TotalTime.TotalSeconds) : null;
        using var screen = new ReplayScreen([.. recordings], settings);
        using var window = SdlWindow.Open(screen.Title, size.Width, size.Height, (float?)scale);
        new WindowLoop(window, screen, () => Stopwatch.GetTimestamp() / (double)Stopwatch.Frequency).Run(measurement, cancellation);
        cancellation.ThrowIfCancellationRequested();
        if (measurement is { IsComplete: true })
        {
            Print(measurement, window);
        }
    }

    private static void Print(FrameMeasurement measured, SdlWindow window)
    {
        var size = window.Resized();
        Console.Out.WriteLine($"window {size.X * size.Scale:0} x {size.Y * size.Scale:0} pixels by {window.Driver}, {(window.DrawsOnSurface ? "painted on its surface" : "painted by way of a texture")}");
        Console.Out.WriteLine($"{measured.Frames} frames, {measured.RatePerS:0.0} a second (aim: {WindowLoop.FramesPerS:0})");
        Console.Out.WriteLine($"time per frame p50 {measured.WorkS(0.5) * 1000:0.0} ms, p99 {measured.WorkS(0.99) * 1000:0.0} ms, longest {measured.WorkS(1) * 1000:0.0} ms");
        Console.Out.WriteLine($"processor {measured.ProcessorRatio * 100:0} % of one core");
    }

    private static Option<double?> Factor(string name, string description, double least, double most) => new(name)
    {
        Description = description,
        HelpName = "FACTOR",
        CustomParser = result =>
        {
            var text = result.Tokens[0].Value;
            if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var factor) && factor >= least && factor <= most)
            {
                return factor;
            }

            result.AddError($"{name}: read \"{text}\", expected a number from {least} to {most}");
            return null;
        },
    };

    private static (int Width, int Height)? ParseSize(ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        var parts = text.Split('x');
        if (parts.Length == 2
            && int.TryParse(parts[0], NumberStyles.None, CultureInfo.InvariantCulture, out var width)
            && int.TryParse(parts[1], NumberStyles.None, CultureInfo.InvariantCulture, out var height)
            && width is >= PictureSize.LeastWidth and <= PictureSize.GreatestSidePx
            && height is >= PictureSize.LeastHeight and <= PictureSize.GreatestSidePx)
        {
            return (width, height);
        }

        result.AddError($"--size: read \"{text}\", expected width and height such as 1920x1080, at least {PictureSize.LeastWidth}x{PictureSize.LeastHeight}");
        return Usual;
    }
}
