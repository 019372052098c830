using ScanSim.Testing;

namespace ScanSim.Scenarios.Tests;

/// <summary>The scenario files that come with the program.</summary>
internal static class ShippedScenarios
{
    public static readonly string[] Names = ["harbour.json", "airfield.json"];

    public static string PathOf(string name) => Path.Combine(RepositoryRoot.Find(), "scenarios", name);

    public static string Text(string name) => File.ReadAllText(PathOf(name));
}
