namespace ScanSim.Scenarios.Tests;

public sealed class CrossCheckTests
{
    public static TheoryData<string, string, string, string, string> Rules => new()
    {
        { "\"pulseWidth\": \"1 us\"", "\"pulseWidth\": \"1 ms\"", "$.radar.waveform.prf", "too high for the pulse width \"1 ms\"", "below 1 / pulseWidth = 1000 Hz" },
        { "\"pulseWidth\": \"1 us\"", "\"pulseWidth\": \"1 us\", \"compressedWidth\": \"2 us\"", "$.radar.waveform.compressedWidth", "longer than the pulse", "at most pulseWidth, \"1 us\"" },

        // c / (2 · 3000 Hz) = 49,965.4 m; c / (2 · 50 km) = 2997.9 Hz.
        { "\"prf\": \"1000 Hz\"", "\"prf\": [\"1000 Hz\", \"3000 Hz\"]", "$.radar.instrumentedRange", "beyond the unambiguous range of prf \"3000 Hz\"", "at most 49.965 km, or no PRF above 2997 Hz" },
        { "\"rotation\": \"15 rpm\"", "\"sector\": { \"from\": \"40 deg\", \"to\": \"41 deg\", \"rate\": \"10 deg/s\", \"turnaround\": \"0 s\" }", "$.radar.sector", "a sector of 1 deg, narrower than the beam", "at least the azimuth beamwidth, 2 deg" },
        { "\"rotation\": \"15 rpm\"", "\"sector\": { \"from\": \"-90 deg\", \"to\": \"270 deg\", \"rate\": \"10 deg/s\", \"turnaround\": \"0 s\" }", "$.radar.sector", "'from' equal to 'to'", "or 'rotation' for full turns" },
        { "\"pulsesPerDwell\": 10", "\"pulsesPerDwell\": 4001", "$.radar.processing.pulsesPerDwell", "a dwell of 4.001 s in a scan of 4 s", "at most 4000 pulses" },
        { "\"pulsesPerDwell\": 10", "\"pulsesPerDwell\": \"beamwidth\", \"x\": 1", "$.radar.processing.x", "unknown", "allowed" },
        { "\"rotation\": \"15 rpm\"", "\"blanked\": [{ \"from\": \"10 deg\", \"to\": \"200 deg\" }, { \"from\": \"190 deg\", \"to\": \"10 deg\" }], \"rotation\": \"15 rpm\"", "$.radar.blanked", "cover all that is scanned", "some azimuth" },
        { "\"rotation\": \"15 rpm\"", "\"blanked\": [{ \"from\": \"10 deg\", \"to\": \"10 deg\" }], \"rotation\": \"15 rpm\"", "$.radar.blanked[0]", "'from' equal to 'to'", "two different azimuths" },
        { "\"rotation\": \"15 rpm\"", "\"blanked\": [{ \"from\": \"350 deg\", \"to\": \"20 deg\" }], \"sector\": { \"from\": \"355 deg\", \"to\": \"15 deg\", \"rate\": \"10 deg/s\", \"turnaround\": \"0 s\" }", "$.radar.blanked", "cover all", "some azimuth" },
        { "\"shape\": \"uniform\", \"beamwidth\": \"20 deg\"", "\"shape\": \"cosecantSquared\", \"beamwidth\": \"20 deg\", \"upTo\": \"10 deg\"", "$.radar.antenna.elevation.upTo", "not above the cosecant-squared part's beginning", "more than 10 deg" },
        { "\"shape\": \"uniform\", \"beamwidth\": \"20 deg\" }", "\"shape\": \"cosecantSquared\", \"beamwidth\": \"20 deg\", \"upTo\": \"30 deg\" }, \"tilt\": \"-11 deg\"", "$.radar.antenna.elevation", "begins at -1 deg", "above the horizontal" },
        { "\"shape\": \"uniform\", \"beamwidth\": \"20 deg\"", Table("-3 deg", "0 dB", "-3 deg", "-1 dB", "5 deg", "-9 dB"), "$.radar.antenna.elevation.table[1].offset", "\"-3 deg\"", "an offset above \"-3 deg\"" },
        { "\"shape\": \"uniform\", \"beamwidth\": \"20 deg\"", Table("-3 deg", "-9 dB", "0 deg", "-1 dB", "5 deg", "-9 dB"), "$.radar.antenna.elevation.table", "highest level is -1 dB", "the highest is 0 dB" },
        { "\"shape\": \"uniform\", \"beamwidth\": \"20 deg\"", Table("-3 deg", "-9 dB", "0 deg", "0 dB", "5 deg", "-3 dB"), "$.radar.antenna.elevation.table", "without half-power points", "both sides" },
    };

    [Theory]
    [MemberData(nameof(Rules))]
    public void A_rule_between_properties_is_told_at_the_property(string right, string wrong, string path, string read, string expected)
    {
        var fault = SmallScenario.Fault(SmallScenario.With(right, wrong));
        Assert.Equal(path, fault.JsonPath);
        Assert.Contains(read, fault.Read, StringComparison.Ordinal);
        Assert.Contains(expected, fault.Expected, StringComparison.Ordinal);
        Assert.True(fault.Line > 0);
    }

    [Fact]
    public void A_scan_too_fast_for_one_pulse_in_the_beam_is_told()
    {
        var text = SmallScenario.With("\"pulsesPerDwell\": 10", "\"pulsesPerDwell\": \"beamwidth\"")
            .Replace("1000 Hz", "10 Hz", StringComparison.Ordinal);

        // 2 deg · 10 Hz / 90 deg/s = 0.2222 pulses.
        Assert.Contains("0.2222 pulses in a beamwidth", SmallScenario.Fault(text).Read, StringComparison.Ordinal);
    }

    [Fact]
    public void A_run_of_more_dwells_than_can_be_counted_is_told()
    {
        var text = SmallScenario.With("\"pulsesPerDwell\": 10", "\"pulsesPerDwell\": 1")
            .Replace("\"10 min\"", "\"600 h\"", StringComparison.Ordinal)
            .Replace("1000 Hz", "2900 Hz", StringComparison.Ordinal);
        Assert.Equal("$.run.duration", SmallScenario.Fault(text).JsonPath);
        Assert.Empty(ScenarioFile.Check(text.Replace("600 h", "400 h", StringComparison.Ordinal), SmallScenario.File));
    }

    [Fact]
    public void A_second_target_with_the_same_id_is_told_with_the_line_of_the_first()
    {
        var fault = SmallScenario.Fault(TwoTargets("one"));
        Assert.Equal("$.targets[1].id", fault.JsonPath);
        Assert.Contains("which the target in line 21 has already", fault.Read, StringComparison.Ordinal);
    }

    /// <summary>"costarring" and "liquid" are the best known pair of words with one 32-bit FNV-1a hash (0x5e4daa9d).</summary>
    [Fact]
    public void Two_ids_that_would_share_their_random_draws_are_told()
    {
        var text = TwoTargets("liquid").Replace("\"one\"", "\"costarring\"", StringComparison.Ordinal);
        var fault = SmallScenario.Fault(text);
        Assert.Contains("share the random draws of \"costarring\"", fault.Read, StringComparison.Ordinal);
        Assert.Contains("rename one of the two", fault.Expected, StringComparison.Ordinal);
    }

    [Fact]
    public void Blanked_sectors_that_leave_a_degree_are_allowed() =>
        Assert.Empty(ScenarioFile.Check(
            SmallScenario.With("\"rotation\"", "\"blanked\": [{ \"from\": \"10 deg\", \"to\": \"200 deg\" }, { \"from\": \"201 deg\", \"to\": \"10 deg\" }], \"rotation\""),
            SmallScenario.File));

    [Fact]
    public void A_scenario_without_targets_is_valid()
    {
        var start = SmallScenario.Text.IndexOf("\"targets\": [", StringComparison.Ordinal);
        var end = SmallScenario.Text.IndexOf("],\n  \"run\"", StringComparison.Ordinal);
        Assert.Empty(ScenarioFile.Parse(SmallScenario.Text[..start] + "\"targets\": [" + SmallScenario.Text[end..], SmallScenario.File).Targets);
    }

    private static string TwoTargets(string secondId)
    {
        var start = SmallScenario.Text.IndexOf("    {\n      \"id\"", StringComparison.Ordinal);
        var end = SmallScenario.Text.IndexOf("\n  ],\n  \"run\"", StringComparison.Ordinal);
        var target = SmallScenario.Text[start..end];
        return SmallScenario.Text[..end] + ",\n" + target.Replace("\"one\"", $"\"{secondId}\"", StringComparison.Ordinal) + SmallScenario.Text[end..];
    }

    private static string Table(params string[] rows) =>
        "\"shape\": \"table\", \"table\": [" + string.Join(", ", rows.Chunk(2).Select(row => $"{{ \"offset\": \"{row[0]}\", \"level\": \"{row[1]}\" }}")) + "]";
}
