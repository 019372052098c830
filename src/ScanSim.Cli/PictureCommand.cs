using System.CommandLine;
using System.Globalization;
using ScanSim.Display;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim picture</summary>
internal static class PictureCommand
{
    public static (Command Command, string Example) Create()
    {
        var folder = new Argument<string>("FOLDER") { Description = "Folder of the recording." };
        var at = QuantityOption.Create("--at", Dimension.Time, "TIME", "Time shown, since the scenario's start [default: the recording's end].", 0);
        var output = new Option<string>("--output", "-o") { Description = "Picture to write: .png, .svg or .pdf.", HelpName = "FILE", Required = true };
        var unit = ChoiceOption.Create("--unit", "Unit of ranges.", ("km", RangeUnit.Kilometre), ("nmi", RangeUnit.NauticalMile));
        var range = QuantityOption.Create("--range", Dimension.Length, "LENGTH", "Range from the site to the plan's edge [default: the instrumented range].", 10);
        var east = QuantityOption.Create("--east", Dimension.Length, "LENGTH", "Middle of the plan, east of the site [default: 0 m].");
        var north = QuantityOption.Create("--north", Dimension.Length, "LENGTH", "Middle of the plan, north of the site [default: 0 m].");
        var paper = new Option<bool>("--paper") { Description = "Dark on white, for printing." };
        var afterglow = new Option<int>("--afterglow") { Description = "Scans for which plots stay, fading.", HelpName = "SCANS", DefaultValueFactory = _ => new ViewOptions().AfterglowScans };
        var size = new Option<PictureSize>("--size") { Description = "Pixels [default: 1280x900].", HelpName = "WxH", CustomParser = ParseSize, DefaultValueFactory = _ => PictureSize.Default };
        var scale = new Option<double>("--scale") { Description = "Draws everything so many times as large.", HelpName = "FACTOR", DefaultValueFactory = _ => 1 };
        var noTruth = new Option<bool>("--no-truth") { Description = "Leave out where the targets really are." };
        var command = new Command("picture", "Draw a recording at one time: the plan view, and the scan timeline beneath it.")
        {
            folder, at, output, unit, range, east, north, paper, afterglow, size, scale, noTruth,
        };
        command.SetAction(parsed =>
        {
            var recording = Recording.Open(parsed.GetValue(folder)!);
            var durationS = recording.Head.DurationS;
            var timeS = parsed.GetValue(at) ?? durationS;
            if (timeS > durationS)
            {
                throw new InputException(string.Create(CultureInfo.InvariantCulture, $"--at: read {timeS:0.###} s, expected a time within the recording: 0 s to {durationS:0.###} s"));
            }

            var view = new ViewOptions
            {
                Unit = parsed.GetValue(unit),
                Theme = parsed.GetValue(paper) ? Theme.Paper : Theme.Dark,
                RangeM = parsed.GetValue(range),
                CentreEastM = parsed.GetValue(east) ?? 0,
                CentreNorthM = parsed.GetValue(north) ?? 0,
                AfterglowScans = parsed.GetValue(afterglow),
                ShowTruth = !parsed.GetValue(noTruth),
            };
            Picture.Save(SceneReader.Load(recording), view, timeS, parsed.GetValue(size) with { Scale = parsed.GetValue(scale) }, parsed.GetValue(output)!);
            return ExitCode.Done;
        });
        return (command, "scansim picture out --at \"125 s\" -o harbour.png\nscansim picture out --at \"5 min\" -o harbour.pdf --paper --unit nmi");
    }

    private static PictureSize ParseSize(System.CommandLine.Parsing.ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        var parts = text.Split('x');
        if (parts.Length == 2
            && int.TryParse(parts[0], NumberStyles.None, CultureInfo.InvariantCulture, out var width)
            && int.TryParse(parts[1], NumberStyles.None, CultureInfo.InvariantCulture, out var height))
        {
            return new PictureSize(width, height);
        }

        result.AddError($"--size: read \"{text}\", expected width and height in pixels, such as 1920x1080");
        return PictureSize.Default;
    }
}
