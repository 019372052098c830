using System.Runtime.InteropServices;
using System.Text.Json;
using ScanSim.Recordings;

namespace ScanSim.Cli.Tests;

public sealed class RunCommandTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void A_run_leaves_a_recording_and_sums_up_each_target()
    {
        var outcome = ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "1 min").AssertDone();
        Assert.Contains("24 scans in 60 s", outcome.Output, StringComparison.Ordinal);
        Assert.Contains("Planning estimate", outcome.Error, StringComparison.Ordinal);
        var recording = Recording.Open(folder.Of("out"));
        Assert.Equal(60, recording.Head.DurationS);
        Assert.Equal(24, recording.Scans().Count());
        Assert.Equal(File.ReadAllText(ScanSimProcess.Harbour), recording.ScenarioText);
        foreach (var target in recording.Truth().Select(t => t.Target).Distinct())
        {
            Assert.Contains($"\n{target} ", outcome.Output, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("harbour")]
    [InlineData("airfield")]
    public void One_thread_and_eight_give_the_same_digests_and_bytes(string scenario)
    {
        var file = scenario == "harbour" ? ScanSimProcess.Harbour : ScanSimProcess.Airfield;
        ScanSimProcess.Run("run", file, "-o", folder.Of("one"), "--threads", "1", "--looks", "all", "--duration", "2 min").AssertDone();
        ScanSimProcess.Run("run", file, "-o", folder.Of("eight"), "--threads", "8", "--looks", "all", "--duration", "2 min").AssertDone();
        var one = Recording.Open(folder.Of("one"));
        var eight = Recording.Open(folder.Of("eight"));
        Assert.Equal(one.Tables.Select(t => (t.Key, t.Value.Digest)), eight.Tables.Select(t => (t.Key, t.Value.Digest)));
        foreach (var path in Directory.GetFiles(folder.Of("one")))
        {
            Assert.Equal(File.ReadAllBytes(path), File.ReadAllBytes(Path.Combine(folder.Of("eight"), Path.GetFileName(path))));
        }
    }

    [Fact]
    public void The_three_formats_hold_the_same_rows()
    {
        var digests = new[] { "parquet", "csv", "jsonl" }.Select(format =>
        {
            ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of(format), "--duration", "20 s", "--format", format).AssertDone();
            return string.Join(' ', Recording.Open(folder.Of(format)).Tables.OrderBy(t => t.Key).Select(t => t.Value.Digest));
        }).ToList();
        Assert.Single(digests.Distinct());
    }

    [Fact]
    public void The_seed_of_the_command_line_replaces_the_scenarios()
    {
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("a"), "--duration", "20 s", "--seed", "18446744073709551615").AssertDone();
        Assert.Equal(ulong.MaxValue, Recording.Open(folder.Of("a")).Head.Seed);
    }

    [Fact]
    public void Summary_goes_to_stdout_and_a_pipe_sees_no_progress()
    {
        var outcome = ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "10 s").AssertDone();
        Assert.Single(outcome.Error.Trim().Split('\n'));
        Assert.DoesNotContain("\u001b", outcome.Output + outcome.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void An_output_folder_that_exists_is_refused_and_left_alone()
    {
        Directory.CreateDirectory(folder.Of("out"));
        File.WriteAllText(folder.Of("out/mine.txt"), "precious");
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out")).AssertRefused("out");
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--force").AssertRefused("out", "neither");
        Assert.Equal("precious", File.ReadAllText(folder.Of("out/mine.txt")));
        Assert.Single(Directory.GetFiles(folder.Of("out")));
    }

    [Fact]
    public void Force_replaces_a_recording()
    {
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "10 s").AssertDone();
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "20 s").AssertRefused("--force");
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "20 s", "--force").AssertDone();
        Assert.Equal(20, Recording.Open(folder.Of("out")).Head.DurationS);
    }

    [Theory]
    [InlineData(PosixSignal.SIGINT, 130, "-INT")]
    [InlineData(PosixSignal.SIGTERM, 143, "-TERM")]
    public async Task A_signal_in_mid_run_ends_it_and_leaves_a_folder_that_readers_call_unfinished(PosixSignal signal, int exitCode, string flag)
    {
        Assert.SkipUnless(OperatingSystem.IsLinux() || OperatingSystem.IsMacOS(), $"{signal} is sent with kill(1)");
        using var process = ScanSimProcess.Start("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "100 h", "--looks", "all");
        var error = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        while (!File.Exists(folder.Of("out/scenario.json")))
        {
            Assert.False(process.HasExited, "the run ended before it could be interrupted");
            await Task.Delay(20, TestContext.Current.CancellationToken);
        }

        await Task.Delay(500, TestContext.Current.CancellationToken);
        using (var kill = System.Diagnostics.Process.Start("kill", [flag, process.Id.ToString(System.Globalization.CultureInfo.InvariantCulture)]))
        {
            await kill.WaitForExitAsync(TestContext.Current.CancellationToken);
        }

        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        Assert.Equal(exitCode, process.ExitCode);
        Assert.Contains("interrupted", await error, StringComparison.Ordinal);
        Assert.False(File.Exists(folder.Of("out/recording.json")));
        ScanSimProcess.Run("picture", folder.Of("out"), "-o", folder.Of("p.png")).AssertRefused("unfinished");
        Assert.False(File.Exists(folder.Of("p.png")));
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "10 s", "--force").AssertDone();
    }

    [Fact]
    public void A_full_disk_ends_the_run_with_a_message()
    {
        Assert.SkipUnless(OperatingSystem.IsLinux() && Environment.IsPrivilegedProcess, "needs root to mount a small file system");
        var disk = Directory.CreateDirectory(folder.Of("disk")).FullName;
        Assert.SkipUnless(Shell("mount", "-t", "tmpfs", "-o", "size=256k", "tmpfs", disk) == 0, "a small file system cannot be mounted here");
        try
        {
            ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", Path.Combine(disk, "out"), "--duration", "10 h", "--looks", "all", "--format", "csv").AssertRefused(disk);
            Assert.False(File.Exists(Path.Combine(disk, "out", "recording.json")));
        }
        finally
        {
            Assert.Equal(0, Shell("umount", disk));
        }
    }

    [Theory]
    [InlineData("--duration", "10", "unit")]
    [InlineData("--duration", "-3 s", "--duration")]
    [InlineData("--duration", "0 s", "--duration")]
    [InlineData("--duration", "5 km", "--duration")]
    [InlineData("--duration", "1e9 h", "at most")]
    [InlineData("--seed", "-1", "--seed")]
    [InlineData("--threads", "two", "--threads")]
    [InlineData("--looks", "some", "--looks")]
    [InlineData("--format", "0", "--format")]
    [InlineData("--colour", "red", "--colour")]
    public void A_wrong_option_is_refused_with_what_would_be_right(string option, string value, string word)
    {
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), option, value).AssertRefused(word);
        Assert.False(Directory.Exists(folder.Of("out")));
    }

    [Fact]
    public void A_scenario_with_errors_is_refused_with_all_of_them_and_nothing_is_written()
    {
        var text = File.ReadAllText(ScanSimProcess.Harbour);
        File.WriteAllText(folder.Of("bad.json"), text.Replace("\"25 kW\"", "\"-25 kW\"", StringComparison.Ordinal).Replace("\"peakPower\"", "\"peakPowr\"", StringComparison.Ordinal));
        ScanSimProcess.Run("run", folder.Of("bad.json"), "-o", folder.Of("out")).AssertRefused("bad.json:", "peakPowr", "peakPower");
        ScanSimProcess.Run("run", folder.Of("none.json"), "-o", folder.Of("out")).AssertRefused("none.json");
        Assert.False(Directory.Exists(folder.Of("out")));
    }

    [Fact]
    public void The_manifest_is_plain_JSON_and_the_same_twice()
    {
        foreach (var name in new[] { "a", "b" })
        {
            ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of(name), "--duration", "10 s").AssertDone();
        }

        var manifest = File.ReadAllText(folder.Of("a/recording.json"));
        Assert.Equal(manifest, File.ReadAllText(folder.Of("b/recording.json")));
        using var json = JsonDocument.Parse(manifest);
        Assert.Equal(JsonValueKind.Object, json.RootElement.ValueKind);
    }

    private static int Shell(string program, params string[] arguments)
    {
        try
        {
            using var process = System.Diagnostics.Process.Start(new System.Diagnostics.ProcessStartInfo(program, arguments) { UseShellExecute = false, RedirectStandardError = true })!;
            process.WaitForExit();
            return process.ExitCode;
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return 127;
        }
    }
}
