using System.CommandLine;
using System.Globalization;
using System.Reflection;
using ScanSim.Display;
using ScanSim.Engine;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim run</summary>
internal static class RunCommand
{
    public static (Command Command, string Example) Create(Interruption interruption)
    {
        var file = new Argument<string>("SCENARIO") { Description = "Scenario file." };
        var folder = new Option<string>("--output", "-o") { Description = "Folder of the recording; must not exist.", HelpName = "FOLDER", Required = true };
        var seed = new Option<ulong?>("--seed") { Description = "Seed of all draws, instead of the scenario's.", HelpName = "N", CustomParser = ParseSeed };
        var duration = QuantityOption.Create("--duration", Dimension.Time, "TIME", "How long, instead of the scenario's: \"10 min\".", 0, above: true);
        var threads = new Option<int>("--threads") { Description = "Threads that compute; 0: one per processor. Does not change the result.", HelpName = "N" };
        threads.Validators.Add(result =>
        {
            if (result.Tokens.Count == 1 && (!int.TryParse(result.Tokens[0].Value, NumberStyles.None, CultureInfo.InvariantCulture, out var n) || n > 1024))
            {
                result.AddError($"--threads: read \"{result.Tokens[0].Value}\", expected a whole number from 0 to 1024");
            }
        });
        var looks = ChoiceOption.Create(
            "--looks", "Which looks to keep: the best of each target and scan, all, or none.", ("best", LooksKept.Best), ("all", LooksKept.All), ("none", LooksKept.None));
        var format = ChoiceOption.Create(
            "--format", "How tables are stored.", ("parquet", TableFormat.Parquet), ("csv", TableFormat.Csv), ("jsonl", TableFormat.JsonLines));
        var unit = ChoiceOption.Create("--unit", "Unit of ranges in the summary.", ("km", RangeUnit.Kilometre), ("nmi", RangeUnit.NauticalMile));
        var force = new Option<bool>("--force") { Description = "Replace a recording that is in the folder." };
        var command = new Command("run", "Run a scenario into a recording, and sum up what each target gave.")
        {
            file, folder, seed, duration, threads, looks, format, unit, force,
        };
        command.SetAction(parsed =>
        {
            var scenario = ScenarioFile.Load(parsed.GetValue(file)!);
            scenario = scenario with
            {
                Run = scenario.Run with
                {
                    Seed = parsed.GetValue(seed) ?? scenario.Run.Seed,
                    DurationS = parsed.GetValue(duration) ?? scenario.Run.DurationS,
                },
            };
            if (RunLimits.Broken(scenario) is { } problem)
            {
                throw new InputException($"{parsed.GetValue(file)}: {problem}");
            }

            var options = new RunOptions { Threads = parsed.GetValue(threads), Looks = parsed.GetValue(looks) };
            var tally = Run(scenario, options, parsed.GetValue(folder)!, parsed.GetValue(format), parsed.GetValue(force), interruption);
            RunSummary.Write(Console.Out, scenario, tally, parsed.GetValue(unit));
            Console.Error.WriteLine("Planning estimate from models, not proof of performance: see \"Cautions\" in README.md.");
            return ExitCode.Done;
        });
        return (command, "scansim run scenarios/harbour.json -o out\nscansim run scenarios/harbour.json -o out --seed 5 --duration \"2 min\" --looks all --force");
    }

    private static RunTally Run(Scenario scenario, RunOptions options, string folder, TableFormat format, bool force, Interruption interruption)
    {
        var head = new RecordingHead
        {
            ScenarioName = scenario.Name,
            ScenarioDigest = scenario.Digest,
            ScenarioText = scenario.SourceText,
            ProgramVersion = ProgramVersion,
            Seed = scenario.Run.Seed,
            StartUtc = scenario.Run.Start,
            DurationS = scenario.Run.DurationS,
            Looks = options.Looks,
            Format = format,
        };
        using var writer = RecordingWriter.Create(folder, head, force);
        var tally = new RunTally(scenario, writer);
        ProgressBar.Around("scans", report => Engine.Run.Execute(scenario, options, tally, report, interruption.Token));
        interruption.Token.ThrowIfCancellationRequested();
        tally.Finish();
        writer.Complete();
        return tally;
    }

    private static string ProgramVersion =>
        typeof(RunCommand).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()!.InformationalVersion.Split('+')[0];

    private static ulong? ParseSeed(System.CommandLine.Parsing.ArgumentResult result)
    {
        var text = result.Tokens[0].Value;
        if (ulong.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var seed))
        {
            return seed;
        }

        result.AddError($"--seed: read \"{text}\", expected a whole number from 0 to {ulong.MaxValue}");
        return null;
    }
}
