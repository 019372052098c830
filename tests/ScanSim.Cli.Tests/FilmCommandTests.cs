using System.Diagnostics;
using System.Globalization;
using ScanSim.Display.Films;
using SkiaSharp;

namespace ScanSim.Cli.Tests;

public sealed class FilmCommandTests(HarbourMinute recording) : IClassFixture<HarbourMinute>, IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData("webp")]
    [InlineData("gif")]
    public void A_film_has_the_frames_asked_for_and_is_the_same_twice(string ending)
    {
        foreach (var name in (string[])["a", "b"])
        {
            var outcome = ScanSimProcess.Run("film", recording.Path, "--from", "10 s", "--to", "40 s", "--fps", "5", "--size", "800x600", "-o", folder.Of(name + "." + ending)).AssertDone();
            Assert.Equal("", outcome.Output + outcome.Error);
        }

        using var codec = SKCodec.Create(folder.Of("a." + ending));
        Assert.Equal((800, 600, 16), (codec.Info.Width, codec.Info.Height, codec.FrameCount));
        Assert.Equal(3200, codec.FrameInfo.Sum(f => f.Duration));
        Assert.Equal(File.ReadAllBytes(folder.Of("a." + ending)), File.ReadAllBytes(folder.Of("b." + ending)));
        Assert.Equal(2, Directory.GetFileSystemEntries(folder.Path).Length);
    }

    [Fact]
    public void A_film_shows_what_a_picture_of_the_same_time_and_view_shows()
    {
        string[] view = ["--paper", "--unit", "nmi", "--range", "6 km", "--east", "1 km", "--afterglow", "3", "--no-truth", "--size", "900x700"];
        ScanSimProcess.Run(["film", recording.Path, "--from", "30 s", "--to", "31 s", "--speed", "1", "--fps", "1", "-o", folder.Of("a.webp"), .. view]).AssertDone();
        ScanSimProcess.Run(["picture", recording.Path, "--at", "30 s", "-o", folder.Of("a.png"), .. view]).AssertDone();
        using var picture = SKBitmap.Decode(folder.Of("a.png"));
        using var firstFrame = SKBitmap.Decode(folder.Of("a.webp"));
        Assert.Equal(picture.Pixels, firstFrame.Pixels);
    }

    [Fact]
    public void Without_times_the_whole_recording_is_filmed()
    {
        ScanSimProcess.Run("film", recording.Path, "--speed", "20", "--fps", "1", "-o", folder.Of("a.gif")).AssertDone();
        using var codec = SKCodec.Create(folder.Of("a.gif"));
        Assert.Equal((1280, 800, 4), (codec.Info.Width, codec.Info.Height, codec.FrameCount));
    }

    [Fact]
    public void An_mp4_is_made_where_ffmpeg_is_and_asked_for_where_it_is_not()
    {
        var outcome = ScanSimWithPath.Run("", "film", recording.Path, "-o", folder.Of("a.mp4"));
        outcome.AssertRefused("ffmpeg", "PATH", "install ffmpeg", ".webp");
        Assert.Empty(Directory.GetFileSystemEntries(folder.Path));
        Assert.SkipWhen(Ffmpeg.Find() is null, "ffmpeg is not installed");
        ScanSimProcess.Run("film", recording.Path, "--to", "5 s", "-o", folder.Of("a.mp4")).AssertDone();
        Assert.True(new FileInfo(folder.Of("a.mp4")).Length > 10_000);
    }

    [Fact]
    public void What_ffmpeg_says_of_its_failure_is_passed_on()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "the stand-in is a shell script");
        File.WriteAllText(folder.Of("ffmpeg"), "#!/bin/sh\necho \"Unknown encoder 'libx264'\" >&2\nexit 8\n");
        if (!OperatingSystem.IsWindows())
        {
            File.SetUnixFileMode(folder.Of("ffmpeg"), UnixFileMode.UserRead | UnixFileMode.UserExecute);
        }

        ScanSimWithPath.Run(folder.Path, "film", recording.Path, "-o", folder.Of("a.mp4")).AssertRefused("exit code 8", "scansim: Unknown encoder 'libx264'");
        Assert.Equal(["ffmpeg"], Directory.GetFileSystemEntries(folder.Path).Select(Path.GetFileName));
    }

    [Theory]
    [InlineData("webp", "-INT", 130)]
    [InlineData("gif", "-TERM", 143)]
    [InlineData("mp4", "-INT", 130)]
    public async Task A_signal_in_mid_film_leaves_no_file(string ending, string flag, int exitCode)
    {
        Assert.SkipUnless(OperatingSystem.IsLinux() || OperatingSystem.IsMacOS(), "signals are sent with kill(1)");
        Assert.SkipWhen(ending == "mp4" && Ffmpeg.Find() is null, "ffmpeg is not installed");
        using var process = ScanSimProcess.Start("film", recording.Path, "--speed", "0.1", "-o", folder.Of("a." + ending));
        var error = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        while (!File.Exists(folder.Of($"a.{ending}.part")))
        {
            Assert.False(process.HasExited, "the film ended before it could be interrupted");
            await Task.Delay(20, TestContext.Current.CancellationToken);
        }

        await Task.Delay(500, TestContext.Current.CancellationToken);
        using (var kill = Process.Start("kill", [flag, process.Id.ToString(CultureInfo.InvariantCulture)]))
        {
            await kill.WaitForExitAsync(TestContext.Current.CancellationToken);
        }

        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        Assert.Equal("scansim: interrupted", (await error).Trim());
        Assert.Equal(exitCode, process.ExitCode);
        Assert.Empty(Directory.GetFileSystemEntries(folder.Path));
    }

    [Theory]
    [InlineData("--speed", "0", "0.001 to 1000000")]
    [InlineData("--speed", "fast", "0.001 to 1000000")]
    [InlineData("--speed", "NaN", "0.001 to 1000000")]
    [InlineData("--speed", "0.01", "72001 frames, at most 20000")]
    [InlineData("--fps", "0", "1 to 60")]
    [InlineData("--fps", "12.5", "1 to 60")]
    [InlineData("--from", "2 h", "0 s to 60 s")]
    [InlineData("--to", "61 s", "0 s to 60 s")]
    [InlineData("--from", "60 s", "begin before it ends")]
    [InlineData("--to", "10", "unit")]
    [InlineData("--size", "10x10", "800 x 600")]
    [InlineData("--size", "5000x4000", "4096")]
    [InlineData("--size", "wide", "1920x1080")]
    [InlineData("--range", "5 kg", "--range")]
    [InlineData("--afterglow", "0", "Afterglow")]
    public void A_wrong_option_is_refused_with_what_would_be_right(string option, string value, string word)
    {
        ScanSimProcess.Run("film", recording.Path, "-o", folder.Of("a.webp"), option, value).AssertRefused(word);
        Assert.Empty(Directory.GetFileSystemEntries(folder.Path));
    }

    [Fact]
    public void A_film_of_no_recording_or_to_a_place_that_does_not_go_is_refused()
    {
        ScanSimProcess.Run("film", folder.Of("nowhere"), "-o", folder.Of("a.webp")).AssertRefused("nowhere");
        ScanSimProcess.Run("film", recording.Path, "-o", folder.Of("a.avi")).AssertRefused("a.avi", ".webp, .gif or .mp4");
        ScanSimProcess.Run("film", recording.Path, "-o", folder.Of("no/such/a.webp")).AssertRefused("a.webp");
        ScanSimProcess.Run("film", recording.Path, "--size", "801x600", "-o", folder.Of("a.mp4")).AssertRefused("even");
        ScanSimProcess.Run("film", recording.Path, "--fps", "60", "-o", folder.Of("a.gif")).AssertRefused("at most 50");
        Assert.Empty(Directory.GetFileSystemEntries(folder.Path));
    }

    [Fact]
    public void Help_has_examples_and_the_defaults()
    {
        var help = ScanSimProcess.Run("film", "--help").AssertDone().Output;
        Assert.Matches(@"(?s)Example:\s+scansim film out -o harbour\.webp\s+scansim film .*\.gif\s+scansim film .*\.mp4", help);
        Assert.Matches(@"--speed <FACTOR> .*film\. \[default: 10\]\n", help);
        Assert.Matches(@"--fps <N> .*second\. \[default: 12\]\n", help);
        Assert.Matches(@"--size <WxH> .*\[default: 1280x800\]\.\n", help);
    }
}
