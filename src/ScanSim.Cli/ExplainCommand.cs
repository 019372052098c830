using System.CommandLine;
using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Explaining;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim explain</summary>
internal static class ExplainCommand
{
    public static (Command Command, string Example) Create()
    {
        var folder = new Argument<string>("FOLDER") { Description = "Folder of the recording, run with --looks best or --looks all." };
        var id = new Option<string>("--target") { Description = "Id of the target.", HelpName = "ID", Required = true };
        var scan = new Option<int?>("--scan") { Description = "One scan, counted from 0.", HelpName = "N", CustomParser = ParseScan };
        var from = QuantityOption.Create("--from", Dimension.Time, "TIME", "Begin at this time since the scenario's start [default: the recording's start].", 0);
        var to = QuantityOption.Create("--to", Dimension.Time, "TIME", "End at this time [default: the recording's end].", 0);
        var pd = new Option<double>("--pd")
        {
            Description = "Detection probability to give the needed SNR and range for, besides 0.5.",
            HelpName = "P",
            CustomParser = ParseProbability,
            DefaultValueFactory = _ => LookExplainer.UsualPd,
        };
        var svg = new Option<string?>("--svg") { Description = "Draw the terms over time, stacked, with the misses marked.", HelpName = "FILE" };
        var unit = ChoiceOption.Create("--unit", "Unit of ranges.", ("km", RangeUnit.Kilometre), ("nmi", RangeUnit.NauticalMile));
        var command = new Command(
            "explain",
            "Why a target was seen or missed: a summary, and for each look the terms of its budget in dB, what it needed, the draw, and the reason in words. "
            + "Without --scan, --from or --to the summary is of the whole recording, and the looks are those of the longest stretch of scans in which the target was in view and gave no plot.")
        {
            folder, id, scan, from, to, pd, svg, unit,
        };
        command.Validators.Add(result =>
        {
            if (result.GetResult(scan) is { Implicit: false } && (result.GetResult(from) is { Implicit: false } || result.GetResult(to) is { Implicit: false }))
            {
                result.AddError("--scan: read together with --from or --to, expected either one scan or a span of time");
            }
        });
        command.SetAction(parsed =>
        {
            var request = new ExplainRequest(parsed.GetValue(folder)!, parsed.GetValue(id)!, parsed.GetValue(pd), parsed.GetValue(unit));
            var story = request.Read(parsed.GetValue(scan), parsed.GetValue(from), parsed.GetValue(to));
            if (parsed.GetValue(svg) is { } picture)
            {
                TermsPicture.Save(story, request.Scenario.Name, request.Recording.Head.StartUtc, parsed.GetValue(unit), picture);
            }

            var whole = parsed.GetValue(scan) is null && parsed.GetValue(from) is null && parsed.GetValue(to) is null;
            ExplainReport.Write(Console.Out, request.Scenario, story, parsed.GetValue(unit), whole);
            return ExitCode.Done;
        });
        return (command, "scansim explain out --target open-boat\nscansim explain out --target open-boat --from \"2 min\" --to \"5 min\" --svg open-boat.svg");
    }

    private static int? ParseScan(System.CommandLine.Parsing.ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var scan))
        {
            return scan;
        }

        result.AddError($"--scan: read \"{text}\", expected a whole number from 0");
        return null;
    }

    private static double ParseProbability(System.CommandLine.Parsing.ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var pd) && pd is >= 0.01 and <= 0.9999)
        {
            return pd;
        }

        result.AddError($"--pd: read \"{text}\", expected a number from 0.01 to 0.9999");
        return LookExplainer.UsualPd;
    }
}
