using System.Diagnostics;
using System.Text;
using ScanSim.Display.Films;

namespace ScanSim.Display.Tests.Films;

public sealed class Mp4FilmTests : IDisposable
{
    private static readonly FilmPlan Short = FilmMaking.Plan with { ToS = FilmMaking.Plan.FromS + 5 };
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void An_mp4_has_the_frames_size_and_rate_asked_for_and_its_index_at_the_beginning()
    {
        Assert.SkipWhen(Ffmpeg.Find() is null, "ffmpeg is not installed");
        Film.Save(FilmMaking.Scene, FilmMaking.View, Short, folder.In("a.mp4"));
        Assert.Equal(["a.mp4"], folder.Files());
        var start = new ProcessStartInfo("ffprobe") { UseShellExecute = false, RedirectStandardOutput = true };
        foreach (var argument in (string[])["-v", "error", "-count_frames", "-show_entries", "stream=codec_name,width,height,pix_fmt,r_frame_rate,nb_read_frames", "-of", "csv=p=0", folder.In("a.mp4")])
        {
            start.ArgumentList.Add(argument);
        }

        using var probe = Process.Start(start)!;
        Assert.Equal("h264,800,600,yuv420p,12/1,7", probe.StandardOutput.ReadToEnd().Trim());
        var text = Encoding.Latin1.GetString(File.ReadAllBytes(folder.In("a.mp4")));
        Assert.InRange(text.IndexOf("moov", StringComparison.Ordinal), 1, text.IndexOf("mdat", StringComparison.Ordinal));
    }

    [Fact]
    public void Odd_sizes_are_refused()
    {
        var fault = Assert.Throws<PictureException>(() => Film.Save(FilmMaking.Scene, FilmMaking.View, Short with { Size = new PictureSize(801, 600) }, folder.In("a.mp4")));
        Assert.Contains("801 x 600", fault.Message, StringComparison.Ordinal);
        Assert.Contains("even", fault.Message, StringComparison.Ordinal);
        Assert.Empty(folder.Files());
    }

    [Fact]
    public void A_failure_of_ffmpeg_is_told_in_its_last_words()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "the stand-in is a shell script");
        var program = Script("for i in 1 2 3 4 5 6 7 8 9; do echo \"line $i\" >&2; done; exit 3");
        var fault = Assert.Throws<PictureException>(() => Encode(program, CancellationToken.None));
        Assert.Contains("exit code 3", fault.Message, StringComparison.Ordinal);
        Assert.Contains("line 9", fault.Message, StringComparison.Ordinal);
        Assert.Contains("line 4", fault.Message, StringComparison.Ordinal);
        Assert.DoesNotContain("line 3", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_failure_after_the_last_frame_is_told_too()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "the stand-in is a shell script");
        var fault = Assert.Throws<PictureException>(() => Encode(Script("cat >/dev/null; echo 'disk full' >&2; exit 1"), CancellationToken.None));
        Assert.Contains("disk full", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_program_that_cannot_be_started_is_named()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "the stand-in is a text file");
        File.WriteAllText(folder.In("broken"), "no program");
        SetMode(folder.In("broken"), UnixFileMode.UserRead | UnixFileMode.UserExecute);
        var fault = Assert.Throws<PictureException>(() => Encode(folder.In("broken"), CancellationToken.None));
        Assert.Contains("broken", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_program_that_stalls_is_killed_when_the_film_is_interrupted()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "the stand-in is a shell script");
        using var source = new CancellationTokenSource(TimeSpan.FromMilliseconds(500));
        // Never reads: the pipe is full after a part of the first frame.
        var program = Script($"echo $$ >'{folder.In("pid")}'; exec sleep 600");
        Assert.ThrowsAny<OperationCanceledException>(() => Encode(program, source.Token));
        var pid = int.Parse(File.ReadAllText(folder.In("pid")));
        Assert.Throws<ArgumentException>(() => Process.GetProcessById(pid));
    }

    [Fact]
    public void The_program_is_the_first_on_the_path_that_can_be_run()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "the stand-in is a shell script");
        foreach (var name in (string[])["a", "b", "c"])
        {
            Directory.CreateDirectory(folder.In(name));
        }

        File.WriteAllText(folder.In("a/ffmpeg"), "");
        Directory.CreateDirectory(folder.In("b/ffmpeg"));
        File.WriteAllText(folder.In("c/ffmpeg"), "");
        SetMode(folder.In("a/ffmpeg"), UnixFileMode.UserRead);
        SetMode(folder.In("c/ffmpeg"), UnixFileMode.UserRead | UnixFileMode.UserExecute);
        Assert.Equal(folder.In("c/ffmpeg"), Ffmpeg.Find($"{folder.In("a")}:{folder.In("b")}:{folder.In("c")}"));
        Assert.Null(Ffmpeg.Find(folder.In("a")));
        Assert.Null(Ffmpeg.Find(""));
        Assert.Null(Ffmpeg.Find(null));
    }

    private void Encode(string program, CancellationToken cancellation)
    {
        using var encoder = new Mp4Encoder(program, folder.In("a.mp4"), Short, cancellation);
        new FrameLoop(FilmMaking.Scene, FilmMaking.View, Short).Run(encoder, null, cancellation);
    }

    private static void SetMode(string path, UnixFileMode mode)
    {
        if (!OperatingSystem.IsWindows())
        {
            File.SetUnixFileMode(path, mode);
        }
    }

    private string Script(string commands)
    {
        var path = folder.In("script");
        File.WriteAllText(path, "#!/bin/sh\n" + commands + "\n");
        SetMode(path, UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);
        return path;
    }
}
