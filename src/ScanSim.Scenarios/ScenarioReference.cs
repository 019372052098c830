using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios;

/// <summary>The reference page of scenario files (docs/scenario-reference.md), made from the description that checks them.</summary>
public static class ScenarioReference
{
    public static string Markdown() => ReferencePage.Write(FileFormat.Root);
}
