using System.Collections.Immutable;
using System.Text;
using ScanSim.Scenarios.Building;
using ScanSim.Scenarios.Format;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios;

/// <summary>Reads scenario files: all errors at once, or a scenario that is valid.</summary>
public static class ScenarioFile
{
    /// <summary>A scenario of 100,000 targets has about this size; more is some other file.</summary>
    private const int LargestBytes = 64 * 1024 * 1024;

    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    /// <summary>The scenario in a file; its path is what messages call it.</summary>
    /// <exception cref="ScenarioException">The file cannot be read, or holds errors.</exception>
    public static Scenario Load(string path) => Parse(ScenarioText.Read(path, LargestBytes), path);

    /// <summary>The scenario in a text.</summary>
    /// <exception cref="ScenarioException">The text holds errors.</exception>
    public static Scenario Parse(string text, string fileName)
    {
        var faults = Read(text, fileName, out var scenario);
        return scenario ?? throw new ScenarioException(faults);
    }

    /// <summary>All errors of a text, in its order; empty when it is a valid scenario.</summary>
    public static ImmutableArray<ScenarioFault> Check(string text, string fileName) => Read(text, fileName, out _);

    private static ImmutableArray<ScenarioFault> Read(string text, string fileName, out Scenario? scenario)
    {
        scenario = null;
        var faults = new FaultList(fileName);
        try
        {
            var tree = JsonTree.Read(Strict.GetBytes(text));
            if (new Checker(faults).Check(FileFormat.Root, tree, "$") is CheckedBlock root)
            {
                scenario = new ScenarioBuilder(root, faults).Build(text, faults.Count == 0 ? ScenarioDigest.Of(tree) : "");
            }
        }
        catch (JsonTextException fault)
        {
            faults.Add(fault.Line, fault.Column, "$", fault.Message, "JSON (comments and trailing commas are allowed)");
        }
        catch (EncoderFallbackException)
        {
            faults.Add(0, 0, "$", "half a surrogate pair", "Unicode text");
        }

        return faults.InOrder();
    }
}
