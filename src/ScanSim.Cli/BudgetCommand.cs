using System.CommandLine;
using System.Globalization;
using ScanSim.Engine;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim budget</summary>
internal static class BudgetCommand
{
    private const double UsualDetectionProbability = 0.9;

    public static (Command Command, string Example) Create()
    {
        var file = new Argument<string>("SCENARIO") { Description = "Scenario file." };
        var id = new Option<string>("--target") { Description = "Id of the target.", HelpName = "ID", Required = true };
        var at = QuantityOption.Create("--at", Dimension.Time, "TIME", "When, in the target's life [default: its first moment].", 0);
        var range = QuantityOption.Create("--range", Dimension.Length, "LENGTH", "Put the target at this slant range, on its bearing and at its height.", 1);
        var solve = ChoiceOption.Create(
            "--solve", "Solve for a term: the value at which Pd is reached, all else as it stands.",
            ("none", Wanted.None), ("range", Wanted.Range), ("power", Wanted.Power), ("rcs", Wanted.Rcs), ("gain", Wanted.Gain), ("snr", Wanted.Snr));
        var pd = new Option<double>("--pd")
        {
            Description = "Detection probability to solve for.",
            HelpName = "P",
            CustomParser = ParseProbability,
            DefaultValueFactory = _ => UsualDetectionProbability,
        };
        var command = new Command("budget", "The radar equation of a scenario for one target, term by term in dB, and solved for one of them.")
        {
            file, id, at, range, solve, pd,
        };
        command.SetAction(parsed =>
        {
            var scenario = ScenarioFile.Load(parsed.GetValue(file)!);
            var target = TargetOf(scenario, parsed.GetValue(id)!);
            var timeS = parsed.GetValue(at) ?? target.Track.StartS;
            if (timeS < target.Track.StartS || timeS > target.Track.EndS)
            {
                throw new InputException(string.Create(
                    CultureInfo.InvariantCulture,
                    $"--at: read {timeS:0.###} s, expected a time in the life of target {target.Id}: {target.Track.StartS:0.###} s to {target.Track.EndS:0.###} s"));
            }

            var budget = Budget.Of(scenario, target, timeS, parsed.GetValue(range));
            BudgetReport.Write(Console.Out, scenario, budget, parsed.GetValue(solve), parsed.GetValue(pd));
            return ExitCode.Done;
        });
        return (command, "scansim budget scenarios/harbour.json --target ferry\nscansim budget scenarios/harbour.json --target jet-ski --range \"6 km\" --solve range --pd 0.8");
    }

    private static Target TargetOf(Scenario scenario, string id) =>
        scenario.Targets.FirstOrDefault(t => string.Equals(t.Id, id, StringComparison.Ordinal))
        ?? throw new InputException($"--target: read \"{id}\", expected one of {string.Join(", ", scenario.Targets.Select(t => t.Id))}");

    private static double ParseProbability(System.CommandLine.Parsing.ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var pd) && pd is >= 0.01 and <= 0.9999)
        {
            return pd;
        }

        result.AddError($"--pd: read \"{text}\", expected a number from 0.01 to 0.9999");
        return UsualDetectionProbability;
    }
}
