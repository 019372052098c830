using System.CommandLine;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim check</summary>
internal static class CheckCommand
{
    public static (Command Command, string Example) Create()
    {
        var files = new Argument<string[]>("SCENARIO") { Description = "Scenario files.", Arity = ArgumentArity.OneOrMore };
        var command = new Command("check", "Report every error of scenario files: line, JSON path, what was read, what would be right.") { files };
        command.SetAction(parsed => Check(parsed.GetValue(files)!));
        return (command, "scansim check scenarios/harbour.json scenarios/airfield.json");
    }

    private static int Check(string[] files)
    {
        var exitCode = ExitCode.Done;
        foreach (var file in files)
        {
            try
            {
                var scenario = ScenarioFile.Load(file);
                var duration = QuantityText.Format(scenario.Run.DurationS, Dimension.Time, "s");
                Console.Out.WriteLine($"{file}: good: \"{scenario.Name}\", {scenario.Targets.Length} targets, {duration}");
            }
            catch (ScenarioException faults)
            {
                Console.Error.WriteLine(faults.Message);
                exitCode = ExitCode.BadInput;
            }
        }

        return exitCode;
    }
}
