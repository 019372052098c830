using System.Text.Json;
using System.Text.RegularExpressions;

namespace ScanSim.Cli.Tests;

public sealed class CommandLineTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData("run")]
    [InlineData("check")]
    [InlineData("schema")]
    [InlineData("budget")]
    [InlineData("picture")]
    [InlineData("explain")]
    [InlineData("film")]
    [InlineData("doctor")]
    public void Help_of_each_command_ends_with_an_example_of_it(string command)
    {
        var outcome = ScanSimProcess.Run(command, "--help").AssertDone();
        Assert.Matches($"(?s)Example:\\s+scansim {command}", outcome.Output);
        Assert.Equal("", outcome.Error);
    }

    [Fact]
    public void No_command_or_an_unknown_one_is_refused()
    {
        ScanSimProcess.Run().AssertRefused("--help");
        ScanSimProcess.Run("fly").AssertRefused("fly");
    }

    [Fact]
    public void Check_is_content_with_the_shipped_scenarios()
    {
        var outcome = ScanSimProcess.Run("check", ScanSimProcess.Harbour, ScanSimProcess.Airfield).AssertDone();
        Assert.Equal(2, outcome.Output.Split("good:").Length - 1);
    }

    [Fact]
    public void Check_reports_every_error_of_every_file_with_line_path_read_and_expected()
    {
        File.WriteAllText(folder.Of("a.json"), File.ReadAllText(ScanSimProcess.Harbour).Replace("\"24 rpm\"", "\"24 kn\"", StringComparison.Ordinal));
        File.WriteAllText(folder.Of("b.json"), "{ \"format\": 1,\n  \"name\": 5 }");
        var outcome = ScanSimProcess.Run("check", folder.Of("a.json"), folder.Of("b.json"), ScanSimProcess.Harbour);
        Assert.Equal(2, outcome.ExitCode);
        Assert.Matches(@"a\.json:\d+:\d+: \$\.radar\.rotation: read .*24 kn.*, expected .*rpm", outcome.Error);
        Assert.Matches(@"b\.json:2:\d+: \$\.name: read ", outcome.Error);
        Assert.Contains("radar", outcome.Error, StringComparison.Ordinal);
        Assert.Contains("harbour.json: good", outcome.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Schema_is_JSON_on_stdout()
    {
        using var schema = JsonDocument.Parse(ScanSimProcess.Run("schema").AssertDone().Output);
        Assert.Equal("https://json-schema.org/draft/2020-12/schema", schema.RootElement.GetProperty("$schema").GetString());
    }

    [Fact]
    public void The_budgets_decibels_add_up_as_printed()
    {
        var output = ScanSimProcess.Run("budget", ScanSimProcess.Harbour, "--target", "ferry", "--range", "8 km").AssertDone().Output;
        var lines = output.Split('\n');
        var head = Array.FindIndex(lines, l => l.StartsWith("term", StringComparison.Ordinal));
        double sum = 0;
        var totals = 0;
        foreach (var line in lines.Skip(head + 1).TakeWhile(l => l.Length > 0))
        {
            var value = double.Parse(Regex.Match(line, @"(-?\d+\.\d\d)( dBW| dB)?$").Groups[1].Value, System.Globalization.CultureInfo.InvariantCulture);
            if (line.StartsWith('='))
            {
                // 16 terms rounded to 0.01 dB.
                Assert.Equal(value, sum, 0.08);
                totals++;
            }
            else
            {
                sum += value;
            }
        }

        Assert.Equal(2, totals);
        Assert.Contains("slant range 8.000 km", output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("range", "slant range")]
    [InlineData("power", "peak power")]
    [InlineData("rcs", "radar cross section")]
    [InlineData("gain", "antenna gain")]
    [InlineData("snr", "SNR per pulse")]
    public void The_budget_is_solved_for_the_term_asked_for(string term, string words)
    {
        var outcome = ScanSimProcess.Run("budget", ScanSimProcess.Harbour, "--target", "ferry", "--solve", term, "--pd", "0.8").AssertDone();
        Assert.Matches($"Solved for Pd 0.8.*{words}", outcome.Output);
    }

    [Fact]
    public void A_solved_range_put_back_gives_the_Pd_it_was_solved_for()
    {
        var solved = ScanSimProcess.Run("budget", ScanSimProcess.Harbour, "--target", "ferry", "--range", "5 km", "--solve", "range", "--pd", "0.7").AssertDone().Output;
        Assert.Contains("Pd 0.7 needs", solved, StringComparison.Ordinal);
        Assert.Matches(@"slant range \d+\.\d{3} km", solved);
    }

    [Fact]
    public void A_budget_of_an_unknown_target_names_the_known_ones()
    {
        ScanSimProcess.Run("budget", ScanSimProcess.Harbour, "--target", "nobody").AssertRefused("nobody", "ferry");
        ScanSimProcess.Run("budget", ScanSimProcess.Harbour, "--target", "ferry", "--at", "99 h").AssertRefused("--at", "life");
        ScanSimProcess.Run("budget", ScanSimProcess.Harbour, "--target", "ferry", "--pd", "1.5").AssertRefused("--pd", "1.5");
    }

    [Theory]
    [InlineData("png")]
    [InlineData("svg")]
    [InlineData("pdf")]
    public void A_picture_is_made_in_each_format_and_is_the_same_twice(string ending)
    {
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "1 min").AssertDone();
        ScanSimProcess.Run("picture", folder.Of("out"), "--at", "50 s", "-o", folder.Of("a." + ending)).AssertDone();
        ScanSimProcess.Run("picture", folder.Of("out"), "--at", "50 s", "-o", folder.Of("b." + ending)).AssertDone();
        Assert.True(new FileInfo(folder.Of("a." + ending)).Length > 10_000);
        Assert.Equal(File.ReadAllBytes(folder.Of("a." + ending)), File.ReadAllBytes(folder.Of("b." + ending)));
        Assert.Equal(3, Directory.GetFileSystemEntries(folder.Path).Length);
    }

    [Fact]
    public void A_picture_that_cannot_be_made_is_refused()
    {
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "10 s").AssertDone();
        ScanSimProcess.Run("picture", folder.Of("out"), "-o", folder.Of("a.bmp")).AssertRefused("a.bmp", ".png");
        ScanSimProcess.Run("picture", folder.Of("out"), "--at", "2 h", "-o", folder.Of("a.png")).AssertRefused("--at");
        ScanSimProcess.Run("picture", folder.Of("out"), "--size", "10x10", "-o", folder.Of("a.png")).AssertRefused("10");
        ScanSimProcess.Run("picture", folder.Of("nowhere"), "-o", folder.Of("a.png")).AssertRefused("nowhere");
        ScanSimProcess.Run("picture", folder.Path, "-o", folder.Of("a.png")).AssertRefused(folder.Path);
        ScanSimProcess.Run("picture", folder.Of("out"), "-o", folder.Of("no/such/a.png")).AssertRefused("a.png");
        Assert.False(File.Exists(folder.Of("a.png")));
    }
}
