using System.Text;
using System.Text.RegularExpressions;
using CsCheck;

namespace ScanSim.Scenarios.Tests;

/// <summary>Whatever is done to a scenario file, reading it gives a scenario or a <see cref="ScenarioException"/>, and a scenario can be used.</summary>
public sealed partial class FuzzTests
{
    private const int Rounds = 2000;

    private static readonly string[] Extremes =
    [
        "null", "true", "0", "-1", "1e400", "-1e-400", "1e308", "18446744073709551616", "\"\"", "\"0 m\"", "\"1e308 km\"", "\"1e-320 m/s\"",
        "\"NaN m\"", "\"-0 deg\"", "\"360 deg\"", "\"1e-9 kn\"", "\"9e9 h\"", "\"0 s\"", "\"720 h\"", "\"1 ns\"", "\"10000 m/s\"", "\"0.001 deg/s\"",
        "\"300 dB\"", "\"-300 dBm\"", "\"2000 km\"", "\"-500 m\"", "\"90 deg\"", "\"180 deg\"", "\"\\ud83d\\ude00\"", "\"\\u0000\"", "{}", "[]", "[{}]", "[[]]",
    ];

    private static readonly string[] Sources = [SmallScenario.Text, ShippedScenarios.Text("harbour.json"), ShippedScenarios.Text("airfield.json")];

    private static readonly Gen<string> Source = Gen.Int[0, Sources.Length - 1].Select(i => Sources[i]);

    [Fact]
    public void Flipped_bytes_give_a_scenario_or_faults() =>
        Try(Gen.Select(Source, Gen.Select(Gen.Double[0, 1], Gen.Byte).Array[1, 4], (text, flips) =>
        {
            var bytes = Encoding.UTF8.GetBytes(text);
            foreach (var (place, value) in flips)
            {
                bytes[(int)(place * (bytes.Length - 1))] = value;
            }

            return Encoding.UTF8.GetString(bytes);
        }));

    [Fact]
    public void Cut_and_doubled_stretches_give_a_scenario_or_faults() =>
        Try(Gen.Select(Source, Gen.Double[0, 1], Gen.Int[1, 300], Gen.Bool, (text, place, length, twice) =>
        {
            var start = (int)(place * (text.Length - 1));
            var end = Math.Min(text.Length, start + length);
            return twice ? text[..end] + text[start..] : text[..start] + text[end..];
        }));

    [Fact]
    public void Values_at_the_extremes_give_a_scenario_or_faults() =>
        Try(Gen.Select(Source, Gen.Select(Gen.Double[0, 1], Gen.Int[0, Extremes.Length - 1]).Array[1, 3], (text, changes) =>
            changes.Aggregate(text, (changed, change) => Replace(changed, change.Item1, _ => Extremes[change.Item2]))));

    [Fact]
    public void Numbers_of_any_size_with_their_own_unit_give_a_scenario_or_faults() =>
        Try(Gen.Select(Source, Gen.Select(Gen.Double[0, 1], Gen.Double[-12, 12]).Array[1, 6], (text, changes) =>
            changes.Aggregate(text, (changed, change) => Replace(changed, change.Item1, value => Number().Replace(value, number =>
                (double.Parse(number.Value) * Math.Pow(10, change.Item2)).ToString("R"))))));

    [Fact]
    public void Swapped_values_give_a_scenario_or_faults() =>
        Try(Gen.Select(Source, Gen.Double[0, 1], Gen.Double[0, 1], (text, first, second) =>
        {
            var values = Value().Matches(text);
            var (a, b) = (values[(int)(first * (values.Count - 1))], values[(int)(second * (values.Count - 1))]);
            (a, b) = a.Index < b.Index ? (a, b) : (b, a);
            return a.Index == b.Index ? text : text[..a.Index] + b.Value + text[(a.Index + a.Length)..b.Index] + a.Value + text[(b.Index + b.Length)..];
        }));

    [Fact]
    public void Removed_properties_give_a_scenario_or_faults() =>
        Try(Gen.Select(Source, Gen.Double[0, 1].Array[1, 3], (text, places) => places.Aggregate(text, (changed, place) =>
        {
            var members = Member().Matches(changed);
            return members.Count == 0 ? changed : changed.Remove(members[(int)(place * (members.Count - 1))].Index, members[(int)(place * (members.Count - 1))].Length);
        })));

    /// <summary>One generator state a round, counted up from 0: a failing round is named and comes again.</summary>
    private static void Try(Gen<string> mutants)
    {
        var valid = 0;
        for (var round = 0; round < Rounds; round++)
        {
            var text = mutants.Generate(new PCG(1, (ulong)round), null, out _);
            try
            {
                Use(ScenarioFile.Parse(text, "mutant.json"));
                valid++;
            }
            catch (ScenarioException error)
            {
                Assert.NotEmpty(error.Faults);
                Assert.All(error.Faults, fault => Assert.True(fault.Line >= 0 && fault.Read.Length > 0 && fault.Expected.Length > 0));
            }
            catch (Exception error) when (error is not Xunit.Sdk.IAssertionException)
            {
                Assert.Fail($"round {round}: {error}\n{text}");
            }
        }

        Assert.InRange(valid, 1, Rounds - 1);
    }

    private static void Use(Scenario scenario)
    {
        foreach (var track in scenario.Targets.Select(target => target.Track))
        {
            Assert.NotEmpty(track.Pieces);
            Assert.True(track.EndS > track.StartS && double.IsFinite(track.EndS) && double.IsFinite(track.MaximumSpeedMps));
            foreach (var timeS in new[] { track.StartS, (track.StartS + track.EndS) / 2, track.EndS })
            {
                var state = track.At(timeS);
                Assert.True(double.IsFinite(state.EastM) && double.IsFinite(state.NorthM) && state.HeightM is > -501 and < 50_001);
                var speedMps = Math.Sqrt(state.EastMps * state.EastMps + state.NorthMps * state.NorthMps + state.UpMps * state.UpMps);
                Assert.True(speedMps <= track.MaximumSpeedMps * (1 + 1e-9) + 1e-9);
            }
        }

        Assert.True(scenario.Radar.Antenna.Azimuth.BeamwidthRad > 0 && scenario.Radar.Receiver.SystemTemperatureK > 0);
    }

    private static string Replace(string text, double place, Func<string, string> change)
    {
        var values = Value().Matches(text);
        if (values.Count == 0)
        {
            return text;
        }

        var value = values[(int)(place * (values.Count - 1))];
        return text[..value.Index] + change(value.Value) + text[(value.Index + value.Length)..];
    }

    /// <summary>A text or number behind a colon.</summary>
    [GeneratedRegex("(?<=\": )(\"[^\"\n]*\"|-?[0-9][0-9.e+-]*)", RegexOptions.CultureInvariant | RegexOptions.ExplicitCapture, 10_000)]
    private static partial Regex Value();

    [GeneratedRegex("[0-9]+(\\.[0-9]+)?", RegexOptions.CultureInvariant | RegexOptions.ExplicitCapture, 10_000)]
    private static partial Regex Number();

    /// <summary>A property with a plain value, and its comma.</summary>
    [GeneratedRegex("\"[A-Za-z]+\": (\"[^\"\n]*\"|-?[0-9][0-9.e+-]*|\\{[^{}]*\\}),?", RegexOptions.CultureInvariant | RegexOptions.ExplicitCapture, 10_000)]
    private static partial Regex Member();
}
