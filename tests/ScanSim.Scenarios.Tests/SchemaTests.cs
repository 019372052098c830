using System.Text.Json;
using Json.Schema;

namespace ScanSim.Scenarios.Tests;

public sealed class SchemaTests
{
    private static readonly JsonDocumentOptions Lenient = new() { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true };

    private static readonly JsonSchema Schema = JsonSchema.FromText(ScenarioSchema.Json());

    public static TheoryData<string> Shipped => [.. ShippedScenarios.Names];

    public static TheoryData<string, string> Broken => new()
    {
        { "\"peakPower\": \"25 kW\"", "\"peakPower\": 25" },
        { "\"peakPower\": \"25 kW\"", "\"peakPower\": \"25\"" },
        { "\"peakPower\": \"25 kW\"", "\"peakPower\": \"25 KW\"" },
        { "\"peakPower\": \"25 kW\"", "\"peakPower\": \"25 MHz\"" },
        { "\"peakPower\": \"25 kW\",", "" },
        { "\"peakPower\": \"25 kW\"", "\"peakPower\": \"25 kW\", \"colour\": \"grey\"" },
        { "\"format\": 1", "\"format\": 2" },
        { "\"rotation\": \"24 rpm\",", "" },
        { "\"rotation\": \"24 rpm\"", "\"rotation\": \"24 rpm\", \"sector\": { \"from\": \"0 deg\", \"to\": \"9 deg\", \"rate\": \"9 deg/s\", \"turnaround\": \"0 s\" }" },
        { "\"noiseFigure\": \"5 dB\"", "\"noiseFigure\": \"5 dB\", \"systemTemperature\": \"900 K\"" },
        { "\"noiseFigure\": \"5 dB\",", "" },
        { "\"shape\": \"cosineSquared\"", "\"shape\": \"cosecantSquared\"" },
        { "\"shape\": \"cosineSquared\", \"beamwidth\": \"1.0 deg\"", "\"shape\": \"table\", \"beamwidth\": \"1.0 deg\"" },
        { "\"shape\": \"gaussian\", \"beamwidth\": \"22 deg\"", "\"shape\": \"gaussian\", \"beamwidth\": \"22 deg\", \"upTo\": \"30 deg\"" },
        { "\"pulsesPerDwell\": \"beamwidth\"", "\"pulsesPerDwell\": \"scan\"" },
        { "\"falseAlarmProbability\": 1e-6", "\"falseAlarmProbability\": 0.2" },
        { "\"fluctuation\": 4", "\"fluctuation\": 5" },
        { "\"fluctuation\": 4", "\"fluctuation\": 1.5" },
        { "\"id\": \"ferry\"", "\"id\": \"the ferry\"" },
        { "{ \"wait\": \"45 s\" }", "{ \"wait\": \"45 s\", \"straight\": \"1 km\" }" },
        { "{ \"wait\": \"45 s\" }", "{ }" },
        { "{ \"wait\": \"45 s\" }", "{ \"wait\": \"45 s\", \"speed\": \"3 kn\" }" },
        { "\"by\": \"180 deg\", \"radius\": \"60 m\"", "\"by\": \"180 deg\"" },
        { "\"2031-05-12T06:00:00Z\"", "\"2031-05-12 06:00\"" },
        { "\"duration\": \"10 min\"", "\"duration\": null" },
        { "\"name\": \"Quillhaven harbour mouth\"", "\"name\": \"\"" },
    };

    [Theory]
    [MemberData(nameof(Shipped))]
    public void A_shipped_scenario_satisfies_the_schema(string name) =>
        Assert.True(IsValid(ShippedScenarios.Text(name)));

    [Theory]
    [MemberData(nameof(Broken))]
    public void What_the_reader_refuses_for_its_form_the_schema_refuses_too(string right, string wrong)
    {
        var text = ShippedScenarios.Text("harbour.json");
        Assert.Contains(right, text, StringComparison.Ordinal);
        var broken = text.Replace(right, wrong, StringComparison.Ordinal);
        Assert.False(IsValid(broken));
        Assert.NotEmpty(ScenarioFile.Check(broken, "broken.json"));
    }

    [Fact]
    public void The_schema_says_its_draft_and_describes_every_property()
    {
        using var schema = JsonDocument.Parse(ScenarioSchema.Json());
        Assert.Equal("https://json-schema.org/draft/2020-12/schema", schema.RootElement.GetProperty("$schema").GetString());
        var blocks = schema.RootElement.GetProperty("$defs").EnumerateObject().Select(block => block.Value).Append(schema.RootElement).ToList();
        Assert.Equal(FormatWalk.Properties().Count, blocks.Sum(block => block.GetProperty("properties").EnumerateObject().Count()));
        Assert.All(
            blocks.SelectMany(block => block.GetProperty("properties").EnumerateObject()),
            property => Assert.False(string.IsNullOrWhiteSpace(property.Value.GetProperty("description").GetString())));
        Assert.All(blocks, block => Assert.False(block.GetProperty("additionalProperties").GetBoolean()));
    }

    private static bool IsValid(string text)
    {
        using var document = JsonDocument.Parse(text, Lenient);
        return Schema.Evaluate(document.RootElement).IsValid;
    }
}
