using System.Globalization;
using System.Text.RegularExpressions;
using System.Xml.Linq;

namespace ScanSim.Cli.Tests;

public sealed class ExplainCommandTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Help_ends_with_an_example_and_says_what_is_shown_without_a_span()
    {
        var outcome = ScanSimProcess.Run("explain", "--help").AssertDone();
        Assert.Matches(@"(?s)Example:\s+scansim explain", outcome.Output);
        Assert.Contains("longest stretch", outcome.Output.ReplaceLineEndings(" "), StringComparison.Ordinal);
    }

    [Fact]
    public void The_summary_counts_the_scans_as_the_runs_own_does()
    {
        var run = Run("out", "2 min").Output;
        foreach (var target in new[] { "ferry", "open-boat", "light-aircraft", "trawler" })
        {
            var row = Regex.Match(run, $@"(?m)^{target} .*?(\d+) of (\d+) +(\d+) +(\d+) %");
            var story = ScanSimProcess.Run("explain", folder.Of("out"), "--target", target).AssertDone().Output;
            Assert.Contains($"in view in {row.Groups[1]} of {row.Groups[2]} scans, with a plot in {row.Groups[3]} of these ({row.Groups[4]} %)", story, StringComparison.Ordinal);
            Assert.Equal(int.Parse(row.Groups[2].Value, CultureInfo.InvariantCulture), Outcomes(story).Sum());
        }
    }

    [Fact]
    public void Without_a_span_the_looks_are_those_of_the_longest_stretch()
    {
        Run("out", "2 min");
        var story = ScanSimProcess.Run("explain", folder.Of("out"), "--target", "light-aircraft").AssertDone().Output;
        var stretch = Regex.Match(story, @"The looks of the longest stretch, scans (\d+) to (\d+):");
        var scans = Looks(story).Select(l => l.Scan).ToList();
        Assert.Equal(int.Parse(stretch.Groups[1].Value, CultureInfo.InvariantCulture), scans[0]);
        Assert.Equal(int.Parse(stretch.Groups[2].Value, CultureInfo.InvariantCulture), scans[^1]);
        Assert.All(Looks(story), l => Assert.DoesNotContain("detected", l.Reason, StringComparison.Ordinal));
        Assert.Contains("The term that cost most: ", story, StringComparison.Ordinal);

        var seen = ScanSimProcess.Run("explain", folder.Of("out"), "--target", "ferry").AssertDone().Output;
        Assert.Contains("It gave a plot in every scan", seen, StringComparison.Ordinal);
    }

    [Fact]
    public void The_printed_terms_add_up_to_the_SNR_and_the_margin_to_the_losses_in_words()
    {
        Run("out", "1 min", "--looks", "all");
        var looks = Looks(ScanSimProcess.Run("explain", folder.Of("out"), "--target", "light-aircraft", "--from", "10 s", "--to", "40 s").AssertDone().Output);
        Assert.True(looks.Count > 24, $"{looks.Count} looks");
        foreach (var look in looks)
        {
            // Six terms, each rounded to 0.1 dB, and the sum likewise.
            Assert.Equal(look.SnrDb, look.TermsDb.Sum(), 0.35 + 1e-9);
            Assert.Equal(look.MarginDb, look.SnrDb - look.NeedDb, 0.15 + 1e-9);
            if (look.Reason.StartsWith("missed: ", StringComparison.Ordinal))
            {
                var split = Regex.Match(look.Reason, @"^missed: ([\d.]+) dB below need: (.*)$");
                var parts = Regex.Matches(split.Groups[2].Value, @"([\d.]+) dB (of|off|in hand)").Sum(m => (m.Groups[2].Value == "in hand" ? -1 : 1) * double.Parse(m.Groups[1].Value, CultureInfo.InvariantCulture));
                Assert.Equal(-look.MarginDb, double.Parse(split.Groups[1].Value, CultureInfo.InvariantCulture), 1e-9);
                Assert.Equal(-look.MarginDb, parts, 0.25 + 1e-9);
            }
        }
    }

    [Fact]
    public void One_scan_shows_each_of_its_looks_and_the_best_alone_when_no_more_were_kept()
    {
        Run("all", "30 s", "--looks", "all");
        Run("best", "30 s");
        var all = Looks(ScanSimProcess.Run("explain", folder.Of("all"), "--target", "light-aircraft", "--scan", "6").AssertDone().Output);
        var best = Looks(ScanSimProcess.Run("explain", folder.Of("best"), "--target", "light-aircraft", "--scan", "6").AssertDone().Output);
        Assert.True(all.Count > 1);
        Assert.All(all, l => Assert.Equal(6, l.Scan));
        Assert.Equal(all.MaxBy(l => l.SnrDb)!.Reason, Assert.Single(best).Reason);
    }

    [Fact]
    public void Looks_all_round_through_side_lobes_are_counted_not_listed()
    {
        Run("all", "10 s", "--looks", "all");
        var story = ScanSimProcess.Run("explain", folder.Of("all"), "--target", "coaster-out", "--scan", "2").AssertDone().Output;
        Assert.Matches(@"and \d{2,} looks through side lobes, without a hit", story);
        Assert.True(Looks(story).Count < 10);
    }

    [Fact]
    public void An_aircraft_overhead_is_lost_to_the_beams_elevation()
    {
        ScanSimProcess.Run("run", ScanSimProcess.Airfield, "-o", folder.Of("out"), "--duration", "250 s").AssertDone();
        var looks = Looks(ScanSimProcess.Run("explain", folder.Of("out"), "--target", "overflight", "--from", "206 s").AssertDone().Output);
        Assert.True(looks.Count >= 9, $"{looks.Count} looks");
        Assert.All(looks, l => Assert.Matches(@"60\.0 dB off the beam's elevation, [\d.]+ dB in hand by range$", l.Reason));
    }

    [Theory]
    [InlineData("\"bearing\": \"20 deg\", \"range\": \"9.5 km\"", "\"bearing\": \"230 deg\", \"range\": \"9.5 km\"", "trawler", @"24 scans, the first: in the blanked sector 200° to 260° \(bearing 230\.\d°\)")]
    [InlineData("\"bearing\": \"20 deg\", \"range\": \"9.5 km\"", "\"bearing\": \"20 deg\", \"range\": \"60 km\"", "trawler", @"24 scans, the first: below the horizon by 26\.\d\d km: 60\.\d\d km away over ground, in sight to 33\.\d\d km \(antenna 42 m, target 3 m above sea level\)")]
    [InlineData("\"bearing\": \"35 deg\", \"range\": \"17 km\"", "\"bearing\": \"35 deg\", \"range\": \"30 km\"", "light-aircraft", @"24 scans, the first: beyond the instrumented range of 22\.22 km by 7\.\d\d km")]
    [InlineData("\"rcs\": \"10 m^2\"", "\"rcs\": \"1e-6 m^2\"", "trawler", @"24 scans, the first: signal too weak for a look: -[45]\d\.\d dB per pulse at the beam's peak")]
    public void Scans_without_a_look_give_the_reason(string was, string becomes, string target, string words)
    {
        var text = File.ReadAllText(ScanSimProcess.Harbour);
        Assert.Contains(was, text, StringComparison.Ordinal);
        File.WriteAllText(folder.Of("changed.json"), text.Replace(was, becomes, StringComparison.Ordinal));
        ScanSimProcess.Run("run", folder.Of("changed.json"), "-o", folder.Of("out"), "--duration", "1 min").AssertDone();
        Assert.Matches(words, ScanSimProcess.Run("explain", folder.Of("out"), "--target", target).AssertDone().Output);
    }

    [Fact]
    public void Ranges_are_in_the_unit_asked_for_and_the_probability_too()
    {
        Run("out", "10 s");
        var story = ScanSimProcess.Run("explain", folder.Of("out"), "--target", "ferry", "--unit", "nmi", "--pd", "0.8").AssertDone().Output;
        Assert.Contains(" nmi", story, StringComparison.Ordinal);
        Assert.DoesNotContain(" km", story, StringComparison.Ordinal);
        Assert.Contains("dB for Pd 0.8;", story, StringComparison.Ordinal);
    }

    [Fact]
    public void The_terms_are_drawn_as_SVG_the_same_twice_and_nothing_else_is_left()
    {
        Run("out", "1 min");
        foreach (var name in new[] { "a.svg", "b.svg" })
        {
            ScanSimProcess.Run("explain", folder.Of("out"), "--target", "light-aircraft", "--svg", folder.Of(name)).AssertDone();
        }

        Assert.Equal(File.ReadAllBytes(folder.Of("a.svg")), File.ReadAllBytes(folder.Of("b.svg")));
        Assert.Equal("svg", XDocument.Load(folder.Of("a.svg")).Root!.Name.LocalName);
        Assert.Equal(3, Directory.GetFileSystemEntries(folder.Path).Length);
        ScanSimProcess.Run("explain", folder.Of("out"), "--target", "light-aircraft", "--svg", folder.Of("a.png")).AssertRefused("a.png", ".svg");
        ScanSimProcess.Run("explain", folder.Of("out"), "--target", "light-aircraft", "--svg", folder.Of("no/such/a.svg")).AssertRefused("a.svg");
        Assert.Equal(3, Directory.GetFileSystemEntries(folder.Path).Length);
    }

    [Fact]
    public void What_cannot_be_explained_is_refused_with_what_would_be_right()
    {
        Run("out", "10 s");
        string[] ferry = ["explain", folder.Of("out"), "--target", "ferry"];
        ScanSimProcess.Run("explain", folder.Of("out"), "--target", "nobody").AssertRefused("nobody", "ferry", "coaster-in");
        ScanSimProcess.Run("explain", folder.Of("out")).AssertRefused("--target");
        ScanSimProcess.Run([.. ferry, "--scan", "4"]).AssertRefused("--scan", "0 to 3");
        ScanSimProcess.Run([.. ferry, "--scan", "-1"]).AssertRefused("--scan", "-1");
        ScanSimProcess.Run([.. ferry, "--scan", "1", "--from", "2 s"]).AssertRefused("--scan", "--from");
        ScanSimProcess.Run([.. ferry, "--from", "8 s", "--to", "3 s"]).AssertRefused("--from", "--to");
        ScanSimProcess.Run([.. ferry, "--from", "1 h"]).AssertRefused("--from", "10 s");
        ScanSimProcess.Run([.. ferry, "--to", "1 h"]).AssertRefused("--to", "10 s");
        ScanSimProcess.Run([.. ferry, "--from", "3"]).AssertRefused("--from", "unit");
        ScanSimProcess.Run([.. ferry, "--pd", "2"]).AssertRefused("--pd", "0.9999");
        ScanSimProcess.Run([.. ferry, "--unit", "ly"]).AssertRefused("--unit", "nmi");
        ScanSimProcess.Run("explain", folder.Of("out"), "--target", "drone").AssertRefused("drone", "life");
        ScanSimProcess.Run("explain", folder.Of("nowhere"), "--target", "ferry").AssertRefused("nowhere");
        ScanSimProcess.Run("explain", folder.Path, "--target", "ferry").AssertRefused(folder.Path, "recording.json");
    }

    [Fact]
    public void A_recording_without_looks_and_an_unfinished_one_are_refused()
    {
        Run("none", "10 s", "--looks", "none");
        ScanSimProcess.Run("explain", folder.Of("none"), "--target", "ferry").AssertRefused("--looks best", "--looks all");
        Directory.CreateDirectory(folder.Of("broken"));
        File.WriteAllText(folder.Of("broken/recording.json.part"), "");
        ScanSimProcess.Run("explain", folder.Of("broken"), "--target", "ferry").AssertRefused("unfinished");
    }

    private Outcome Run(string name, string duration, params string[] options) =>
        ScanSimProcess.Run(["run", ScanSimProcess.Harbour, "-o", folder.Of(name), "--duration", duration, .. options]).AssertDone();

    private static IEnumerable<int> Outcomes(string story) => story.Split('\n')
        .SkipWhile(l => !l.StartsWith("what became of it", StringComparison.Ordinal)).Skip(1)
        .TakeWhile(l => l.Length > 0)
        .Select(l => int.Parse(Regex.Match(l, @" (\d+) +[\d.]+ %$").Groups[1].Value, CultureInfo.InvariantCulture));

    private static List<PrintedLook> Looks(string story)
    {
        var looks = new List<PrintedLook>();
        foreach (var line in story.Split('\n').SkipWhile(l => !l.TrimStart().StartsWith("time ", StringComparison.Ordinal)).Skip(1))
        {
            var match = Regex.Match(line, @"^ *[\d.]+ s +(\d+) +[\d.]+ (?:km|nmi) +[\d.]+° +-?[\d.]+°(?: +(-?[\d.]+)){9} +[\d.]+ +(?:-?[\d.]+|–) +-?[\d.]+ +(\S.*)$");
            if (match.Success)
            {
                var numbers = match.Groups[2].Captures.Select(c => double.Parse(c.Value, CultureInfo.InvariantCulture)).ToArray();
                looks.Add(new PrintedLook(int.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture), numbers[..6], numbers[6], numbers[7], numbers[8], match.Groups[3].Value));
            }
        }

        return looks;
    }

    private sealed record PrintedLook(int Scan, double[] TermsDb, double SnrDb, double NeedDb, double MarginDb, string Reason);
}
