using ScanSim.Scenarios.Building;
using ScanSim.Testing;

namespace ScanSim.Scenarios.Tests;

public sealed class TrackTests
{
    private const string North = """{ "east": "0 m", "north": "0 m", "height": "100 m", "heading": "0 deg", "speed": "10 m/s" }""";

    [Fact]
    public void A_straight_leg_of_five_kilometres_at_10_mps_takes_500_seconds()
    {
        var track = ScenarioFile.Parse(SmallScenario.Text, SmallScenario.File).Targets[0].Track;
        Assert.Equal(0, track.StartS);
        Close(500, track.EndS);
        At(track, 250, 2500, 4000, 3, 6, 8, 0);
        Close(10, track.MaximumSpeedMps);
    }

    [Fact]
    public void A_height_at_the_point_is_reached_evenly()
    {
        var track = SmallScenario.Track(North, """{ "to": { "east": "3 km", "north": "4 km", "height": "600 m" } }""");
        At(track, 250, 1500, 2000, 350, 6, 8, 1);
        Close(Math.Sqrt(101), track.MaximumSpeedMps);
    }

    [Theory]
    [InlineData("90 deg", 1000, 1000, 10, 0)]
    [InlineData("-90 deg", -1000, 1000, -10, 0)]
    [InlineData("180 deg", 2000, 0, 0, -10)]
    [InlineData("360 deg", 0, 0, 0, 10)]
    [InlineData("-450 deg", -1000, 1000, -10, 0)]
    public void A_turn_is_an_arc_of_its_radius(string by, double eastM, double northM, double eastMps, double northMps)
    {
        var track = SmallScenario.Track(North, $$"""{ "turn": { "by": "{{by}}", "radius": "1 km" } }""");
        Assert.True(QuantityText.TryParse(by, Dimension.Angle, out var byRad, out _));
        Close(Math.Abs(byRad) * 100, track.EndS);
        At(track, track.EndS, eastM, northM, 100, eastMps, northMps, 0);
    }

    [Theory]
    [InlineData("90 deg", 30)]
    [InlineData("270 deg", 30)]
    [InlineData("-90 deg", 30)]
    [InlineData("180 deg", 60)]
    [InlineData("200 deg", 160 / 3.0)]
    public void A_turn_onto_a_heading_takes_the_shorter_way_at_its_rate(string onto, double durationS)
    {
        var track = SmallScenario.Track(North, $$"""{ "turn": { "onto": "{{onto}}", "rate": "3 deg/s" } }, { "straight": "10 s" }""");
        Close(durationS + 10, track.EndS);
        Assert.True(QuantityText.TryParse(onto, Dimension.Angle, out var ontoRad, out _));
        var end = track.At(track.EndS);
        Close(10 * Math.Sin(ontoRad), end.EastMps);
        Close(10 * Math.Cos(ontoRad), end.NorthMps);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(-1)]
    public void A_leg_with_a_turn_rate_flies_the_arc_first_and_then_straight(int side)
    {
        // Radius 10 / 0.1 = 100 m; a quarter circle leads to (±100, 100), from there 500 m straight.
        var track = SmallScenario.Track(North, $$"""{ "to": { "east": "{{side * 600}} m", "north": "100 m", "height": "200 m" }, "turnRate": "0.1 rad/s" }""");
        var arcS = Math.PI / 2 / 0.1;
        Close(arcS + 50, track.EndS);
        Assert.Equal(2, track.Pieces.Length);
        var climbMps = 100 / (arcS + 50);
        At(track, arcS, side * 100, 100, 100 + climbMps * arcS, side * 10, 0, climbMps);
        At(track, track.EndS, side * 600, 100, 200, side * 10, 0, climbMps);
    }

    [Fact]
    public void Without_a_turn_rate_the_corner_is_sharp()
    {
        var track = SmallScenario.Track(North, """{ "to": { "east": "600 m", "north": "0 m" } }""");
        At(track, 0, 0, 0, 100, 10, 0, 0);
        Close(60, track.EndS);
    }

    /// <summary>Against the definition, not the formula: the arc's end heads for the point, within a turn, for a grid of points all round.</summary>
    [Fact]
    public void After_the_arc_the_point_lies_straight_ahead()
    {
        var comparison = new Comparison("A turning leg ends in its point, heading along the tangent", "plane geometry: sine of the angle between velocity and line of sight", 1e-9, 0);
        for (var step = 0; step < 72; step++)
        {
            foreach (var distanceM in new[] { 250.0, 1000, 50_000 })
            {
                var (sin, cos) = Math.SinCos(step * Math.PI / 36 + 0.01);
                var (eastM, northM) = (distanceM * sin, distanceM * cos);
                var angleRad = TurnToPoint.AngleRad(0.7, eastM, northM, 100);
                Assert.NotNull(angleRad);
                var arc = new TrackWriter(0, 0, 0, 0) { HeadingRad = 0.7 };
                arc.Arc(angleRad.Value, 0.1, 10);
                var (restEastM, restNorthM) = (eastM - arc.EastM, northM - arc.NorthM);
                var headingRad = arc.HeadingRad!.Value;
                var acrossM = restEastM * Math.Cos(headingRad) - restNorthM * Math.Sin(headingRad);
                Assert.True(restEastM * Math.Sin(headingRad) + restNorthM * Math.Cos(headingRad) > 0);
                comparison.Add($"{step * 5} deg, {distanceM} m", 0, acrossM / distanceM);
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void A_speed_change_from_10_to_20_mps_at_2_mps2_takes_5_seconds_and_75_metres()
    {
        var track = SmallScenario.Track(North, """{ "speedTo": { "speed": "20 m/s", "acceleration": "2 m/s^2" } }, { "straight": "100 m" }""");
        At(track, 2.5, 0, 31.25, 100, 0, 15, 0);
        At(track, 5, 0, 75, 100, 0, 20, 0);
        Close(10, track.EndS);
        Close(20, track.MaximumSpeedMps);
    }

    [Fact]
    public void Braking_to_a_stop_takes_v_squared_over_2a()
    {
        var track = SmallScenario.Track(North, """{ "speedTo": { "speed": "0 m/s", "acceleration": "0.5 m/s^2" } }, { "wait": "30 s" }""");
        At(track, 20, 0, 100, 100, 0, 0, 0);
        At(track, 50, 0, 100, 100, 0, 0, 0);
        Close(10, track.MaximumSpeedMps);
    }

    [Fact]
    public void A_climb_flies_on_along_the_heading()
    {
        var track = SmallScenario.Track(North, """{ "climbTo": { "height": "60 m", "rate": "2 m/s" } }""");
        At(track, 20, 0, 200, 60, 0, 10, -2);
        Close(20, track.EndS);
    }

    [Fact]
    public void With_speed_0_a_climb_is_straight_up_and_needs_no_heading()
    {
        var track = SmallScenario.Track(
            """{ "east": "5 m", "north": "6 m", "height": "0 m", "speed": "0 m/s" }""", """{ "climbTo": { "height": "60 m", "rate": "2 m/s" } }""");
        At(track, 15, 5, 6, 30, 0, 0, 2);
    }

    [Fact]
    public void After_a_wait_the_old_speed_holds()
    {
        var track = SmallScenario.Track(North, """{ "wait": "1 min" }, { "straight": "100 m" }""");
        At(track, 59, 0, 0, 100, 0, 0, 0);
        At(track, 65, 0, 50, 100, 0, 10, 0);
        Close(70, track.EndS);
    }

    [Fact]
    public void A_leg_can_have_its_own_speed_and_it_holds_from_then_on()
    {
        var track = SmallScenario.Track(North, """{ "straight": "100 m", "speed": "20 m/s" }, { "straight": "5 s" }""");
        Close(10, track.EndS);
        At(track, 10, 0, 200, 100, 0, 20, 0);
    }

    [Theory]
    [InlineData("30 s", 30)]
    [InlineData("2 h", 60)]
    public void A_track_ends_at_its_end_or_with_its_last_leg_whichever_is_earlier(string end, double endS)
    {
        var track = SmallScenario.Track(North.Replace("\"speed\"", "\"at\": \"10 s\", \"speed\"", StringComparison.Ordinal), """{ "straight": "20 s" }, { "straight": "30 s" }""", end);
        Close(10, track.StartS);
        Close(endS, track.EndS);
    }

    [Fact]
    public void Bearing_and_range_are_from_true_north_clockwise()
    {
        var track = SmallScenario.Track("""{ "bearing": "-90 deg", "range": "10 km", "height": "1 m", "speed": "1 m/s" }""", """{ "wait": "1 s" }""");
        At(track, 0, -10_000, 0, 1, 0, 0, 0);
    }

    /// <summary>
    /// A degree of latitude about 15 deg is 110.649 km long, about 45 deg 111.132 km, about 60 deg 111.412 km (WGS-84; table of
    /// the meridian degree as printed in geodesy handbooks, from memory).
    /// </summary>
    [Theory]
    [InlineData(14.5, 110_649)]
    [InlineData(44.5, 111_132)]
    [InlineData(59.5, 111_412)]
    public void A_degree_of_latitude_north_of_the_site_has_its_published_length(double siteDeg, double lengthM)
    {
        var text = SmallScenario.WithTrack($$"""{ "latitude": "{{siteDeg + 1}} deg", "longitude": "20 deg", "height": "1 m", "speed": "1 m/s" }""", """{ "wait": "1 s" }""")
            .Replace("\"latitude\": \"10 deg\"", $"\"latitude\": \"{siteDeg} deg\"", StringComparison.Ordinal);
        var state = ScenarioFile.Parse(text, SmallScenario.File).Targets[0].Track.At(0);
        Assert.Equal(lengthM, state.NorthM, 0.5);
        Assert.Equal(0, state.EastM, 1e-6);
    }

    public static TheoryData<string, string, string, string, string> Faults => new()
    {
        { """{ "straight": "1 km" }, { "to": { "east": "0 m", "north": "1 km" } }""", "", "$.targets[0].track.legs[1].to", "where the target already is", "a point away from it" },
        { """{ "to": { "east": "50 m", "north": "0 m" }, "turnRate": "0.1 rad/s" }""", "", "$.targets[0].track.legs[0].to", "inside the turning circle (radius 100 m at 10 m/s)", "a point outside it" },
        { """{ "straight": "1 km", "speed": "0 m/s" }""", "", "$.targets[0].track.legs[0]", "a leg with speed 0", "a speed above 0" },
        { """{ "speedTo": { "speed": "10 m/s", "acceleration": "1 m/s^2" } }""", "", "$.targets[0].track.legs[0].speedTo", "the speed that the target already has", "another speed" },
        { """{ "climbTo": { "height": "100 m", "rate": "1 m/s" } }""", "", "$.targets[0].track.legs[0].climbTo", "the height that the target already has", "another height" },
        { """{ "turn": { "onto": "360 deg", "rate": "1 deg/s" } }""", "", "$.targets[0].track.legs[0].turn", "a turn by nothing", "an angle other than 0" },
        { """{ "wait": "0 s" }""", "", "$.targets[0].track.legs[0].wait", "out of range", "above 0 s" },
        { """{ "wait": "-5 s" }""", "", "$.targets[0].track.legs[0].wait", "out of range", "above 0 s" },
        { """{ "straight": "5 kg" }""", "", "$.targets[0].track.legs[0].straight", "\"5 kg\"", "length with its unit (m, km, nmi, ft, mi, cm), above 0 m, at most 6000 km; or time with its unit" },
        { """{ "wait": "5 s" }""", "0 s", "$.targets[0].track.end", "not after the start", "a time after 0 s (start.at)" },
        { """{ "straight": "2001 km" }""", "", "$.targets[0].track.legs[0]", "a leg that leads more than 2000 km", "legs that stay within 2000 km" },
        { """{ "straight": "720 h", "speed": "1 mm/s" }""", "", "$.targets[0].track.legs[0].speed", "'mm/s' is not a unit of speed", "speed with its unit" },
        { """{ "wait": "720 h" }, { "wait": "1 s" }""", "", "$.targets[0].track.legs[1]", "a leg that ends 720", "legs that end within 720 h" },
        { """{ "to": { "latitude": "40 deg", "longitude": "20 deg" } }""", "", "$.targets[0].track.legs[0].to.latitude", "more than 2000 km from the site", "check the signs" },
        { """{ "to": { "latitude": "-10 deg", "longitude": "-160 deg" } }""", "", "$.targets[0].track.legs[0].to.latitude", "more than 2000 km from the site", "check the signs" },
        { """{ "turn": { "by": "90 deg" } }""", "", "$.targets[0].track.legs[0].turn", "none of them", "exactly one of 'rate', or 'radius'" },
    };

    [Theory]
    [MemberData(nameof(Faults))]
    public void A_leg_that_cannot_be_is_told_with_its_path(string legs, string end, string path, string read, string expected)
    {
        var fault = SmallScenario.Fault(SmallScenario.WithTrack(North, legs, end));
        Assert.Equal(path, fault.JsonPath);
        Assert.Contains(read, fault.Read, StringComparison.Ordinal);
        Assert.Contains(expected, fault.Expected, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("""{ "straight": "1 km" }""", "a leg without a speed")]
    [InlineData("""{ "straight": "1 km", "speed": "3 kn" }""", "a leg without a heading")]
    [InlineData("""{ "turn": { "by": "1 deg", "rate": "1 deg/s" }, "speed": "3 kn" }""", "a leg without a heading")]
    [InlineData("""{ "to": { "east": "1 km", "north": "0 m" } }""", "a leg without a speed")]
    [InlineData("""{ "climbTo": { "height": "50 m", "rate": "1 m/s" }, "speed": "3 kn" }""", "a leg without a heading")]
    [InlineData("""{ "speedTo": { "speed": "3 kn", "acceleration": "1 m/s^2" } }""", "a leg without a heading")]
    public void A_leg_that_lacks_speed_or_heading_is_told(string leg, string read)
    {
        var fault = SmallScenario.Fault(SmallScenario.WithTrack("""{ "east": "0 m", "north": "0 m", "height": "0 m" }""", leg));
        Assert.Equal("$.targets[0].track.legs[0]", fault.JsonPath);
        Assert.Equal(read, fault.Read);
    }

    private static void At(Track track, double timeS, double eastM, double northM, double heightM, double eastMps, double northMps, double upMps)
    {
        var state = track.At(timeS);
        Close(eastM, state.EastM);
        Close(northM, state.NorthM);
        Close(heightM, state.HeightM);
        Close(eastMps, state.EastMps);
        Close(northMps, state.NorthMps);
        Close(upMps, state.UpMps);
    }

    /// <summary>A micrometre, a microsecond: rounding of a few steps at these sizes is a thousand times smaller.</summary>
    private static void Close(double expected, double actual) => Assert.Equal(expected, actual, 1e-6);
}
