using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace ScanSim.Cli;

/// <summary>The usual help, with an example to copy at its end.</summary>
internal sealed class HelpWithExample(IReadOnlyDictionary<Command, string> examples) : SynchronousCommandLineAction
{
    private readonly HelpAction help = new();

    public override int Invoke(ParseResult parseResult)
    {
        var result = help.Invoke(parseResult);
        if (examples.TryGetValue(parseResult.CommandResult.Command, out var example))
        {
            Console.Out.WriteLine("Example:");
            foreach (var line in example.Split('\n'))
            {
                Console.Out.WriteLine("  " + line);
            }

            Console.Out.WriteLine();
        }

        return result;
    }
}
