namespace ScanSim.Scenarios.Tests;

public sealed class ShippedScenariosTests
{
    [Fact]
    public void The_harbour_is_read()
    {
        var scenario = ScenarioFile.Load(ShippedScenarios.PathOf("harbour.json"));
        Assert.Equal(8, scenario.Targets.Length);
        Assert.Equal(2.5, ((Scan.Rotation)scenario.Radar.Scan).PeriodS);
        Assert.Equal(600, scenario.Run.DurationS);
    }
}
