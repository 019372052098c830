using System.CommandLine;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>scansim schema</summary>
internal static class SchemaCommand
{
    public static (Command Command, string Example) Create()
    {
        var command = new Command("schema", "Print the JSON Schema of scenario files, for completion and hints in an editor.");
        command.SetAction(_ =>
        {
            Console.Out.WriteLine(ScenarioSchema.Json());
            return ExitCode.Done;
        });
        return (command, "scansim schema > scenario.schema.json");
    }
}
