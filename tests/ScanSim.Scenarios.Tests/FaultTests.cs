namespace ScanSim.Scenarios.Tests;

public sealed class FaultTests
{
    /// <summary>What is replaced, by what; then line, column and path of the fault, and what its read and expected parts say.</summary>
    public static TheoryData<string, string, int, int, string, string, string> Form => new()
    {
        { "\"10 kW\"", "\"10 kW\", \"colour\": 1", 7, 27, "$.radar.colour", "the unknown property 'colour'", "allowed in radar: carrier, peakPower" },
        { "\"peakPower\"", "\"peakPowr\"", 7, 5, "$.radar.peakPowr", "the unknown property 'peakPowr'", "perhaps 'peakPower'; allowed in radar" },
        { "\"format\": 1,", "\"format\": 1, \"Name\": \"x\",", 2, 16, "$.Name", "the unknown property 'Name'", "perhaps 'name'" },
        { "\"10 kW\"", "\"10 kW\", \"peakPower\": \"9 kW\"", 7, 27, "$.radar.peakPower", "the property 'peakPower' a second time", "each property once" },
        { "\"peakPower\": \"10 kW\",", "", 5, 12, "$.radar.peakPower", "nothing: the property is missing", "power with its unit (W, kW, MW, mW, dBW, dBm)" },
        { "\"10 kW\"", "10", 7, 18, "$.radar.peakPower", "10 (a bare number where a unit is needed)", "power with its unit (W, kW, MW, mW, dBW, dBm), from 1 mW to 1000 MW, for example \"25 kW\"" },
        { "\"10 kW\"", "\"10\"", 7, 18, "$.radar.peakPower", "\"10\" (a bare number where a unit is needed)", "power with its unit" },
        { "\"10 kW\"", "\"10 km\"", 7, 18, "$.radar.peakPower", "\"10 km\" (km is a unit of length, not of power)", "power with its unit" },
        { "\"10 kW\"", "\"10 KW\"", 7, 18, "$.radar.peakPower", "units are case-sensitive: kW", "power with its unit" },
        { "\"10 kW\"", "\"10 horses\"", 7, 18, "$.radar.peakPower", "'horses' is not a unit of power", "power with its unit" },
        { "\"10 kW\"", "\"-10 kW\"", 7, 18, "$.radar.peakPower", "\"-10 kW\" (out of range)", "from 1 mW to 1000 MW" },
        { "\"10 kW\"", "\"NaN kW\"", 7, 18, "$.radar.peakPower", "\"NaN kW\" (it does not begin with a number)", "power with its unit" },
        { "\"10 kW\"", "\"1e400 kW\"", 7, 18, "$.radar.peakPower", "\"1e400 kW\" (the number is too large)", "power with its unit" },
        { "\"10 kW\"", "\"\"", 7, 18, "$.radar.peakPower", "\"\" (empty)", "power with its unit" },
        { "\"10 kW\"", "null", 7, 18, "$.radar.peakPower", "null", "power with its unit" },
        { "\"10 kW\"", "true", 7, 18, "$.radar.peakPower", "true", "power with its unit" },
        { "\"10 kW\"", "[]", 7, 18, "$.radar.peakPower", "an empty list", "power with its unit" },
        { "\"10 kW\"", "{}", 7, 18, "$.radar.peakPower", "an empty block", "power with its unit" },
        { "1e-6", "1e400", 16, 91, "$.radar.processing.falseAlarmProbability", "1e400 (out of range)", "a number from 1E-15 to 0.1" },
        { "1e-6", "0", 16, 91, "$.radar.processing.falseAlarmProbability", "0 (out of range)", "a number from 1E-15 to 0.1" },
        { "1e-6", "\"1e-6\"", 16, 91, "$.radar.processing.falseAlarmProbability", "\"1e-6\"", "a number from" },
        { "\"fluctuation\": 1", "\"fluctuation\": 5", 24, 22, "$.targets[0].fluctuation", "5", "a whole number from 0 to 4" },
        { "\"fluctuation\": 1", "\"fluctuation\": 1.5", 24, 22, "$.targets[0].fluctuation", "1.5", "a whole number from 0 to 4" },
        { "\"fluctuation\": 1", "\"fluctuation\": -1", 24, 22, "$.targets[0].fluctuation", "-1", "a whole number from 0 to 4" },
        { "\"seed\": 7", "\"seed\": 18446744073709551616", 33, 75, "$.run.seed", "18446744073709551616", "a whole number from 0 to 18446744073709551615" },
        { "\"format\": 1", "\"format\": 2", 2, 13, "$.format", "2", "the number 1" },
        { "\"noncoherent\"", "\"coherent\"", 16, 29, "$.radar.processing.kind", "\"coherent\"", "\"noncoherent\"" },
        { "\"pulsesPerDwell\": 10", "\"pulsesPerDwell\": 0", 16, 62, "$.radar.processing.pulsesPerDwell", "0", "a whole number from 1 to 10000; or \"beamwidth\"" },
        { "\"shape\": \"gaussian\"", "\"shape\": \"cosecantSquared\"", 10, 29, "$.radar.antenna.azimuth.shape", "\"cosecantSquared\"", "\"gaussian\" or \"uniform\" or \"cosine\" or \"cosineSquared\" or \"table\"" },
        { "\"shape\": \"uniform\", \"beamwidth\": \"20 deg\"", "\"shape\": \"uniform\"", 11, 20, "$.radar.antenna.elevation.beamwidth", "nothing: the property is missing", "angle with its unit" },
        { "\"beamwidth\": \"20 deg\"", "\"beamwidth\": \"20 deg\", \"upTo\": \"30 deg\"", 11, 73, "$.radar.antenna.elevation.upTo", "'upTo', which does not go with this 'shape'", "only beamwidth here" },
        { "\"rotation\": \"15 rpm\",", "", 5, 12, "$.radar", "none of them", "exactly one of 'rotation', or 'sector'" },
        { "\"noiseFigure\": \"3 dB\"", "\"noiseFigure\": \"3 dB\", \"systemTemperature\": \"500 K\"", 15, 17, "$.radar.receiver", "'systemTemperature' and 'noiseFigure' and 'lineLoss'", "exactly one of" },
        { ", \"lineLoss\": \"1 dB\"", "", 15, 17, "$.radar.receiver.lineLoss", "nothing: the property is missing", "ratio in decibels with its unit (dB), from 0 dB to 60 dB" },
        { "\"noiseFigure\": \"3 dB\", \"lineLoss\": \"1 dB\"", "\"systemTemperature\": \"500 K\", \"lineTemperature\": \"290 K\"", 15, 68, "$.radar.receiver.lineTemperature", "'lineTemperature', which does not go with 'systemTemperature'", "only systemTemperature here" },
        { "\"id\": \"one\"", "\"id\": \"the one\"", 21, 13, "$.targets[0].id", "\"the one\"", "letters, digits, '-', '_' and '.'" },
        { "\"name\": \"Small\"", "\"name\": \"\"", 3, 11, "$.name", "\"\"", "text of 1 to 200 characters" },
        { "\"name\": \"Small\"", "\"name\": \"a\\nb\"", 3, 11, "$.name", "\"a\uFFFDb\"", "on one line" },
        { "03:04:05Z", "03:04:05+01:00", 33, 21, "$.run.start", "\"2031-01-02T03:04:05+01:00\"", "a UTC time as YYYY-MM-DDThh:mm:ssZ" },
        { "2031-01-02", "2031-02-30", 33, 21, "$.run.start", "\"2031-02-30T03:04:05Z\"", "a UTC time as" },
        { "\"latitude\": \"10 deg\"", "\"latitude\": \"90 deg\"", 4, 41, "$.site.latitude", "\"90 deg\" (out of range)", "from -89.9 deg to 89.9 deg" },
        { "\"height\": \"3 m\"", "\"height\": \"51 km\"", 26, 63, "$.targets[0].track.start.height", "\"51 km\" (out of range)", "from -500 m to 50 km" },
        { "\"rcs\": \"3 m^2\"", "\"rcs\": \"70 dBsm\"", 23, 14, "$.targets[0].rcs", "\"70 dBsm\" (out of range)", "from 0.000001 m^2 to 1000000 m^2" },
        { "{ \"to\": { \"east\": \"4 km\", \"north\": \"6 km\" } }", "", 27, 17, "$.targets[0].track.legs", "an empty list", "a list of 1 to 10000" },
        { "{ \"to\": { \"east\": \"4 km\", \"north\": \"6 km\" } }", "{ \"fly\": 1 }, { \"wait\": \"1 s\" }", 28, 13, "$.targets[0].track.legs[0].fly", "the unknown property 'fly'", "allowed in leg: to, straight, turn" },
        { "\"prf\": \"1000 Hz\"", "\"prf\": [\"1000 Hz\", \"2000 s\"]", 14, 60, "$.radar.waveform.prf[1]", "\"2000 s\" (s is a unit of time, not of frequency)", "frequency with its unit (GHz, MHz, kHz, Hz)" },
        { "\"prf\": \"1000 Hz\"", "\"prf\": [[]]", 14, 49, "$.radar.waveform.prf[0]", "an empty list", "frequency with its unit" },
    };

    [Theory]
    [MemberData(nameof(Form))]
    public void A_fault_of_form_is_told_with_its_place(string right, string wrong, int line, int column, string path, string read, string expected)
    {
        var faults = ScenarioFile.Check(SmallScenario.With(right, wrong), SmallScenario.File);
        var fault = faults.FirstOrDefault(fault => fault.JsonPath == path);
        Assert.True(fault is not null, string.Join('\n', faults));
        Assert.Equal((SmallScenario.File, line, column), (fault.File, fault.Line, fault.Column));
        Assert.Contains(read, fault.Read, StringComparison.Ordinal);
        Assert.Contains(expected, fault.Expected, StringComparison.Ordinal);
    }

    [Fact]
    public void The_small_scenario_of_these_tests_has_no_fault() => Assert.Empty(ScenarioFile.Check(SmallScenario.Text, SmallScenario.File));

    [Fact]
    public void All_faults_of_a_file_are_told_at_once_in_the_order_of_its_lines()
    {
        var text = SmallScenario.Text
            .Replace("\"10 kW\"", "\"10 km\"", StringComparison.Ordinal)
            .Replace("\"duration\": \"10 min\"", "\"duration\": 600", StringComparison.Ordinal)
            .Replace("\"id\": \"one\"", "\"id\": \"o n e\"", StringComparison.Ordinal)
            .Replace("\"prf\": \"1000 Hz\"", "\"prf\": \"900 kHz\"", StringComparison.Ordinal)
            .Replace("\"4 km\", \"north\": \"6 km\"", "\"1 km\", \"north\": \"2 km\"", StringComparison.Ordinal);
        var error = Assert.Throws<ScenarioException>(() => ScenarioFile.Parse(text, SmallScenario.File));
        Assert.Equal([7, 17, 21, 28, 33], error.Faults.Select(fault => fault.Line));
        Assert.Equal(
            "$.radar.peakPower $.radar.instrumentedRange $.targets[0].id $.targets[0].track.legs[0].to $.run.duration",
            string.Join(' ', error.Faults.Select(fault => fault.JsonPath)));
        Assert.Equal(error.Faults.Length, error.Message.Split('\n').Length);
        Assert.StartsWith("small.json:7:18: $.radar.peakPower: read \"10 km\"", error.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("{\n  \"format\": 1\n  \"name\": 2\n}", 3, 3)]
    [InlineData("", 1, 1)]
    [InlineData("{\n  // only a comment\n", 3, 1)]
    [InlineData("{ \"format\": NaN }", 1, 13)]
    [InlineData("{ \"fo\u00E9\": 1, x }", 1, 13)]
    [InlineData("{} {}", 1, 4)]
    [InlineData("{ \"name\": \"\\ud800\" }", 1, 11)]
    public void Text_that_is_not_JSON_is_told_with_line_and_column(string text, int line, int column)
    {
        var fault = SmallScenario.Fault(text);
        Assert.Equal((line, column), (fault.Line, fault.Column));
        Assert.StartsWith("JSON", fault.Expected, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("[]", "an empty list")]
    [InlineData("null", "null")]
    [InlineData("3", "3")]
    public void A_file_that_is_no_block_is_told(string text, string read) => Assert.Equal(read, SmallScenario.Fault(text).Read);

    [Fact]
    public void Nesting_beyond_all_measure_is_a_fault() =>
        Assert.Equal(1, SmallScenario.Fault(new string('[', 100_000)).Line);

    [Fact]
    public void Comments_trailing_commas_and_a_schema_address_are_allowed()
    {
        var text = SmallScenario.With("\"format\": 1,", "/* a */ \"$schema\": \"x.json\", // b\n \"format\": 1,").Replace("\"seed\": 7 }", "\"seed\": 7, },", StringComparison.Ordinal);
        Assert.Equal(7UL, ScenarioFile.Parse(text, SmallScenario.File).Run.Seed);
    }

    [Fact]
    public void Of_many_faults_the_message_shows_two_hundred_and_the_count_of_the_rest()
    {
        var text = "{" + string.Join(',', Enumerable.Range(0, 300).Select(i => $"\"p{i}\": 1")) + "}";
        var error = Assert.Throws<ScenarioException>(() => ScenarioFile.Parse(text, SmallScenario.File));
        Assert.Equal(201, error.Message.Split('\n').Length);
        Assert.EndsWith($"and {error.Faults.Length - 200} more errors", error.Message, StringComparison.Ordinal);
    }
}
