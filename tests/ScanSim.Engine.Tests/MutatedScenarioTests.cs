using System.Globalization;
using System.Text.RegularExpressions;
using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Engine.Tests;

/// <summary>Whatever a scenario file says, if the checks let it pass, the engine runs it.</summary>
public partial class MutatedScenarioTests
{
    private const int Rounds = 200;

    /// <summary>Runs above this size are left out: they are valid, and long.</summary>
    private const long MostDwells = 10_000;

    private static readonly string[] Factors = ["0", "1e-12", "1e-6", "1e-3", "0.1", "0.5", "-1", "2", "10", "1e3", "1e6", "1e12"];

    [Theory]
    [InlineData("harbour.json")]
    [InlineData("airfield.json")]
    public void A_mutated_scenario_is_refused_or_runs(string file)
    {
        var text = File.ReadAllText(Path.Combine(RepositoryRoot.Find(), "scenarios", file));
        var numbers = Number().Matches(text).Where(m => !IsComment(text, m.Index)).ToList();
        var random = new CsCheck.PCG(101, 7);
        var run = 0;
        for (var round = 0; round < Rounds; round++)
        {
            // From the back, so that the places of the earlier numbers stay.
            var mutated = text;
            var chosen = new[] { numbers[(int)random.Next((uint)numbers.Count)], numbers[(int)random.Next((uint)numbers.Count)] };
            foreach (var number in chosen.DistinctBy(m => m.Index).OrderByDescending(m => m.Index))
            {
                var value = double.Parse(number.Value, CultureInfo.InvariantCulture) * double.Parse(Factors[random.Next((uint)Factors.Length)], CultureInfo.InvariantCulture);
                mutated = mutated.Remove(number.Index, number.Length).Insert(number.Index, value.ToString("R", CultureInfo.InvariantCulture));
            }

            run += Runs(mutated) ? 1 : 0;
        }

        Assert.InRange(run, Rounds / 20, Rounds);
    }

    private static bool Runs(string text)
    {
        Scenario scenario;
        try
        {
            scenario = ScenarioFile.Parse(text, "mutated.json");
        }
        catch (ScenarioException)
        {
            return false;
        }

        scenario = scenario with { Run = scenario.Run with { DurationS = Math.Min(scenario.Run.DurationS, 5) } };
        if (RunLimits.Broken(scenario) is not null || ScanTimeline.Of(scenario).FirstDwell(ScanTimeline.Of(scenario).ScanCount) > MostDwells)
        {
            return false;
        }

        var sink = new CollectingSink();
        Run.Execute(scenario, new RunOptions { Looks = LooksKept.All, Threads = 1 }, sink, null, CancellationToken.None);
        foreach (var look in sink.Looks)
        {
            Assert.InRange(look.Pd, 0, 1);
            Assert.False(double.IsNaN(look.SnrDb) || double.IsNaN(look.StatisticDb));
        }

        Assert.All(sink.Plots, p => Assert.True(double.IsFinite(p.RangeM) && double.IsFinite(p.SigmaAzimuthDeg) && p.AzimuthDeg is >= 0 and < 360));
        Assert.All(sink.Truth, t => Assert.True(double.IsFinite(t.LatitudeDeg) && double.IsFinite(t.RangeM)));
        _ = scenario.Targets.IsEmpty ? null : Budget.Of(scenario, scenario.Targets[0], scenario.Targets[0].Track.StartS, null);
        return true;
    }

    private static bool IsComment(string text, int index)
    {
        var line = text.LastIndexOf('\n', index) + 1;
        var comment = text.IndexOf("//", line, StringComparison.Ordinal);
        return comment >= 0 && comment < index;
    }

    [GeneratedRegex(@"(?<=[\s""])-?\d+(\.\d+)?(e-?\d+)?(?=[\s"",])")]
    private static partial Regex Number();
}
