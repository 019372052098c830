using System.CommandLine;
using System.CommandLine.Parsing;
using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Films;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim film</summary>
internal static class FilmCommand
{
    /// <summary>A film that shows the whole recording at the usual speed; stands in where the options give nothing.</summary>
    private static readonly FilmPlan Usual = new() { FromS = 0, ToS = 0 };

    public static (Command Command, string Example) Create(Interruption interruption)
    {
        var folder = new Argument<string>("FOLDER") { Description = "Folder of the recording." };
        var from = QuantityOption.Create("--from", Dimension.Time, "TIME", "Time of the first frame, since the scenario's start [default: 0 s].", 0);
        var to = QuantityOption.Create("--to", Dimension.Time, "TIME", "Time of the last frame [default: the recording's end].", 0);
        var speed = new Option<double>("--speed")
        {
            Description = "Seconds of the scenario in one second of the film.",
            HelpName = "FACTOR",
            CustomParser = ParseSpeed,
            DefaultValueFactory = _ => Usual.SpeedRatio,
        };
        var output = new Option<string>("--output", "-o") { Description = "Film to write: .webp, .gif or .mp4 (which needs ffmpeg).", HelpName = "FILE", Required = true };
        var fps = new Option<int>("--fps")
        {
            Description = "Frames a second.",
            HelpName = "N",
            CustomParser = ParseFramesPerSecond,
            DefaultValueFactory = _ => Usual.FramesPerSecond,
        };
        var command = new Command("film", "Film a recording: the plan view in motion, and the scan timeline beneath it.")
        {
            folder, from, to, speed, output, fps,
        };
        var drawn = ViewArguments.AddTo(command, Usual.Size);
        command.SetAction(parsed =>
        {
            var recording = Recording.Open(parsed.GetValue(folder)!);
            var plan = new FilmPlan
            {
                FromS = Within(recording, "--from", parsed.GetValue(from) ?? 0),
                ToS = Within(recording, "--to", parsed.GetValue(to) ?? recording.Head.DurationS),
                SpeedRatio = parsed.GetValue(speed),
                FramesPerSecond = parsed.GetValue(fps),
                Size = drawn.Size(parsed),
            };
            // Reading a long recording takes a while: what is wrong with the options is said before.
            Film.Check(plan, recording.Head.DurationS, parsed.GetValue(output)!);
            var scenario = ScenarioFile.Parse(recording.ScenarioText, ViewArguments.ScenarioName);
            var view = drawn.View(parsed, scenario.Site);
            var scene = SceneReader.Load(recording, scenario, double.NegativeInfinity, double.PositiveInfinity);
            ProgressBar.Around("frames", report => Film.Save(scene, view, plan, parsed.GetValue(output)!, report, interruption.Token));
            return ExitCode.Done;
        });
        return (command, "scansim film out -o harbour.webp\nscansim film out --from \"2 min\" --to \"4 min\" --speed 5 --range \"6 km\" -o harbour.gif\nscansim film out --speed 30 --fps 25 --size 1920x1080 -o harbour.mp4");
    }

    private static double Within(Recording recording, string option, double timeS) =>
        timeS <= recording.Head.DurationS
            ? timeS
            : throw new InputException(string.Create(
                CultureInfo.InvariantCulture, $"{option}: read {timeS:0.###} s, expected a time within the recording: 0 s to {recording.Head.DurationS:0.###} s"));

    private static double ParseSpeed(ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var speed) && speed is >= FilmPlan.LeastSpeedRatio and <= FilmPlan.GreatestSpeedRatio)
        {
            return speed;
        }

        result.AddError($"--speed: read \"{text}\", expected a number from {FilmPlan.LeastSpeedRatio} to {FilmPlan.GreatestSpeedRatio}");
        return Usual.SpeedRatio;
    }

    private static int ParseFramesPerSecond(ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var fps) && fps is >= 1 and <= FilmPlan.MostFramesPerSecond)
        {
            return fps;
        }

        result.AddError($"--fps: read \"{text}\", expected a whole number from 1 to {FilmPlan.MostFramesPerSecond}");
        return Usual.FramesPerSecond;
    }
}
