using ScanSim.Testing;

namespace ScanSim.Scenarios.Tests;

public sealed class ReferencePageTests
{
    /// <summary>Set it to 1 and run this test to rewrite the page after a change of the format.</summary>
    private const string Rewrite = "SCANSIM_REWRITE_REFERENCE";

    [Fact]
    public void The_reference_page_is_the_one_that_the_format_makes()
    {
        var path = Path.Combine(RepositoryRoot.Find(), "docs", "scenario-reference.md");
        if (string.Equals(Environment.GetEnvironmentVariable(Rewrite), "1", StringComparison.Ordinal))
        {
            File.WriteAllText(path, ScenarioReference.Markdown());
        }

        Assert.True(
            string.Equals(File.ReadAllText(path), ScenarioReference.Markdown(), StringComparison.Ordinal),
            $"docs/scenario-reference.md is behind the format: run the tests of ScanSim.Scenarios with {Rewrite}=1");
    }

    [Fact]
    public void Every_example_and_default_of_the_format_is_itself_valid()
    {
        var faulty = FormatWalk.Properties()
            .SelectMany(property => new[] { property.Example, property.Default }.OfType<string>().Select(json => (property, json)))
            .SelectMany(pair => FormatWalk.Faults(pair.property, pair.json))
            .ToList();
        Assert.Empty(faulty);
    }
}
