using System.Text.RegularExpressions;

namespace ScanSim.Cli.Tests;

public sealed class DoctorCommandTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Doctor_lists_every_part_with_who_needs_it_and_its_state()
    {
        var outcome = ScanSimProcess.Run("doctor").AssertDone();
        Assert.Matches(@"^part +needed by +state +found +what to do\n", outcome.Output);
        foreach (var (part, neededBy) in new[]
        {
            (".NET runtime", "all"), ("processors", "all"), ("temporary folder", "dotnet run, tests"), ("Skia drawing library", "picture, film, view"),
            ("ffmpeg with H.264", "film -o FILE.mp4"), ("SDL 2 library", "view"), ("screen", "view"),
        })
        {
            Assert.Matches($@"\n{Regex.Escape(part)} +{Regex.Escape(neededBy)} +(there|missing) ", outcome.Output);
        }

        Assert.Matches(@"\n\.NET runtime +all +there +10\.", outcome.Output);
        Assert.Matches(@"\nSkia drawing library +picture, film, view +there ", outcome.Output);
        Assert.Matches($@"\nprocessors +all +there +{Environment.ProcessorCount}\b", outcome.Output);
    }

    [Fact]
    public void Without_ffmpeg_on_the_path_and_without_a_screen_both_are_missing_with_what_to_do()
    {
        var outcome = ScanSimWithPath.Run(folder.Path, "doctor").AssertDone();
        Assert.Matches(@"\nffmpeg with H\.264 +film -o FILE\.mp4 +missing +not on the PATH +Install it", outcome.Output);
        Assert.Matches(@"\d of 7 parts missing", outcome.Error);
        if (OperatingSystem.IsLinux())
        {
            Assert.Matches(@"\nscreen +view +missing +neither WAYLAND_DISPLAY nor DISPLAY is set +Run it in a desktop session", outcome.Output);
        }
    }

    [Theory]
    [InlineData("exit 1", "does not run")]
    [InlineData("echo 'ffmpeg version 9 from a test'", "without libx264")]
    [InlineData("test $2 = -version && echo 'ffmpeg version 9 from a test' || echo ' V..... libx264 H.264'", "ffmpeg 9")]
    public void An_ffmpeg_is_tried_and_not_only_looked_for(string commands, string found)
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "the stand-in is a shell script");
        File.WriteAllText(folder.Of("ffmpeg"), $"#!/bin/sh\n{commands}\n");
        if (!OperatingSystem.IsWindows())
        {
            File.SetUnixFileMode(folder.Of("ffmpeg"), UnixFileMode.UserRead | UnixFileMode.UserExecute);
        }

        var outcome = ScanSimWithPath.Run(folder.Path, "doctor").AssertDone();
        var state = found == "ffmpeg 9" ? "there" : "missing";
        Assert.Matches($@"\nffmpeg with H\.264 +film -o FILE\.mp4 +{state} +{Regex.Escape(folder.Of("ffmpeg"))[..^6]}.*{found}", outcome.Output);
    }

    [Fact]
    public void A_temporary_folder_that_is_not_there_is_reported()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "TMPDIR is not read there");
        // The system's message with this path in it is longer than the table has room for.
        var start = ScanSimWithPath.StartInfo("", "doctor");
        start.Environment["TMPDIR"] = folder.Of("nowhere/" + new string('x', 120));
        var outcome = ScanSimWithPath.Run(start).AssertDone();
        Assert.Matches(@"\ntemporary folder +dotnet run, tests +missing .*TMPDIR", outcome.Output);
    }

    [Fact]
    public void Help_has_an_example_and_an_argument_is_refused()
    {
        Assert.Matches(@"(?s)Example:\s+scansim doctor", ScanSimProcess.Run("doctor", "--help").AssertDone().Output);
        ScanSimProcess.Run("doctor", "now").AssertRefused("now");
    }
}
