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
        var command = new Command("picture", "Draw a recording at one time: the plan view, and the scan timeline beneath it.")
        {
            folder, at, output,
        };
        var drawn = ViewArguments.AddTo(command, PictureSize.Default);
        command.SetAction(parsed =>
        {
            var recording = Recording.Open(parsed.GetValue(folder)!);
            var durationS = recording.Head.DurationS;
            var timeS = parsed.GetValue(at) ?? durationS;
            if (timeS > durationS)
            {
                throw new InputException(string.Create(CultureInfo.InvariantCulture, $"--at: read {timeS:0.###} s, expected a time within the recording: 0 s to {durationS:0.###} s"));
            }

            var scenario = ScenarioFile.Parse(recording.ScenarioText, ViewArguments.ScenarioName);
            var view = drawn.View(parsed, scenario.Site);
            Picture.Save(SceneReader.Load(recording, scenario, double.NegativeInfinity, double.PositiveInfinity), view, timeS, drawn.Size(parsed), parsed.GetValue(output)!);
            return ExitCode.Done;
        });
        return (command, "scansim picture out --at \"125 s\" -o harbour.png\nscansim picture out --at \"5 min\" -o harbour.pdf --paper --unit nmi --overlay scenarios/harbour-coast.geojson");
    }
}
