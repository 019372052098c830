namespace ScanSim.Scenarios.Tests;

public sealed class ShippedScenariosTests
{
    public static TheoryData<string> Names => [.. ShippedScenarios.Names];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_shipped_scenario_has_no_fault(string name) =>
        Assert.Equal("", string.Join('\n', ScenarioFile.Check(ShippedScenarios.Text(name), name)));

    [Theory]
    [MemberData(nameof(Names))]
    public void The_pieces_of_a_shipped_track_follow_one_another_without_gap_in_time_or_place(string name)
    {
        foreach (var target in ScenarioFile.Load(ShippedScenarios.PathOf(name)).Targets)
        {
            for (var i = 1; i < target.Track.Pieces.Length; i++)
            {
                var (before, after) = (target.Track.Pieces[i - 1], target.Track.Pieces[i]);
                var end = before.At(before.EndS);
                Assert.Equal(before.EndS, after.StartS);
                Assert.Equal((end.EastM, end.NorthM, end.HeightM), (after.EastM, after.NorthM, after.HeightM));
            }
        }
    }

    [Fact]
    public void The_harbour_is_read_in_SI_units()
    {
        var scenario = ScenarioFile.Load(ShippedScenarios.PathOf("harbour.json"));
        Assert.Equal(8, scenario.Targets.Length);
        Assert.Equal(2.5, Assert.IsType<Scan.Rotation>(scenario.Radar.Scan).PeriodS);
        Assert.Equal(9.41e9, scenario.Radar.CarrierHz);
        Assert.Equal(25e3, scenario.Radar.PeakPowerW);
        Assert.Equal(0.25e-6, scenario.Radar.Waveform.PulseWidthS);
        Assert.Equal(0.25e-6, scenario.Radar.Waveform.CompressedWidthS);
        Assert.Equal(12 * 1852.0, scenario.Radar.InstrumentedRangeM);
        Assert.Equal(4.0 / 3.0, scenario.Environment.EffectiveEarthFactor);
        Assert.Null(scenario.Radar.Processing.PulsesPerDwell);
        Assert.Equal(600, scenario.Run.DurationS);
        Assert.Equal(new DateTimeOffset(2031, 5, 12, 6, 0, 0, TimeSpan.Zero), scenario.Run.Start);
        Assert.Equal(ShippedScenarios.Text("harbour.json"), scenario.SourceText);
    }

    [Fact]
    public void The_two_ships_of_the_harbour_pass_within_the_beam_and_within_a_range_cell()
    {
        var scenario = ScenarioFile.Load(ShippedScenarios.PathOf("harbour.json"));
        var (nearestM, rangeM) = Nearest(scenario, "coaster-out", "coaster-in");
        Assert.InRange(nearestM, 30, 120);
        Assert.True(nearestM < rangeM * scenario.Radar.Antenna.Azimuth.BeamwidthRad);
    }

    [Fact]
    public void The_crossing_traffic_of_the_airfield_comes_near_and_passes()
    {
        var (nearestM, _) = Nearest(ScenarioFile.Load(ShippedScenarios.PathOf("airfield.json")), "crossing-west", "crossing-north");
        Assert.InRange(nearestM, 500, 3000);
    }

    private static (double NearestM, double RangeM) Nearest(Scenario scenario, string first, string second)
    {
        var (a, b) = (Track(scenario, first), Track(scenario, second));
        return Enumerable.Range(0, (int)Math.Min(a.EndS, b.EndS))
            .Select(second => (a.At(second), b.At(second)))
            .Select(pair => (Distance(pair.Item1, pair.Item2), Distance(pair.Item1, default)))
            .Min();
    }

    private static Track Track(Scenario scenario, string id) => scenario.Targets.Single(target => target.Id == id).Track;

    private static double Distance(TrackState a, TrackState b) => Math.Sqrt(Math.Pow(a.EastM - b.EastM, 2) + Math.Pow(a.NorthM - b.NorthM, 2));
}
