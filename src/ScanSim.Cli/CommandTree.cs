using System.CommandLine;
using System.CommandLine.Help;

namespace ScanSim.Cli;

/// <summary>The command line as a whole: commands, help with examples, and what becomes of errors.</summary>
internal static class CommandTree
{
    public static int Invoke(string[] args)
    {
        using var interruption = new Interruption();
        var root = new RootCommand(
            "ScanSim: what a rotating surveillance radar will see. Runs scenarios into recordings, explains them and draws them. "
            + "Results are planning estimates from models, no proof of performance.");
        var examples = new Dictionary<Command, string> { [root] = "scansim run scenarios/harbour.json -o out" };
        Add(root, examples, RunCommand.Create(interruption));
        Add(root, examples, CheckCommand.Create());
        Add(root, examples, SchemaCommand.Create());
        Add(root, examples, BudgetCommand.Create());
        Add(root, examples, PictureCommand.Create());
        Add(root, examples, ViewCommand.Create(interruption));
        Add(root, examples, ExplainCommand.Create());
        root.Options.OfType<HelpOption>().Single().Action = new HelpWithExample(examples);
        var parsed = root.Parse(args);
        if (parsed.Errors.Count > 0 && parsed.Action is not HelpWithExample)
        {
            foreach (var error in parsed.Errors)
            {
                Console.Error.WriteLine("scansim: " + error.Message.Replace("\n\t", " ", StringComparison.Ordinal));
            }

            var command = parsed.CommandResult.Command;
            Console.Error.WriteLine($"Try: scansim {(command is RootCommand ? "" : command.Name + " ")}--help");
            return ExitCode.BadInput;
        }

        return UserErrors.Report(() => parsed.Invoke(new InvocationConfiguration { EnableDefaultExceptionHandler = false, ProcessTerminationTimeout = null }), interruption);
    }

    private static void Add(RootCommand root, Dictionary<Command, string> examples, (Command Command, string Example) entry)
    {
        root.Add(entry.Command);
        examples[entry.Command] = entry.Example;
    }
}
