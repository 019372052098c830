using System.Text.Encodings.Web;
using System.Text.Json;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios;

/// <summary>The JSON Schema of scenario files, for completion and checking in an editor.</summary>
public static class ScenarioSchema
{
    private static readonly JsonSerializerOptions Options = new()
    {
        WriteIndented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>Draft 2020-12, indented, ends with a line feed.</summary>
    public static string Json() => SchemaWriter.Write(FileFormat.Root).ToJsonString(Options) + "\n";
}
