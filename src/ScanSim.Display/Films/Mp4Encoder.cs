using System.ComponentModel;
using System.Diagnostics;
using System.Globalization;

namespace ScanSim.Display.Films;

/// <summary>MP4 with H.264: the frames go to ffmpeg through a pipe, and it writes the file.</summary>
internal sealed class Mp4Encoder : IFilmEncoder, IDisposable
{
    /// <summary>Lines of ffmpeg's talk that are kept for the report of a failure.</summary>
    private const int LinesKept = 6;

    /// <summary>Ctrl-C reaches ffmpeg and us at the same time; this long it may take until ours is known.</summary>
    private static readonly TimeSpan UntilInterruptionIsKnown = TimeSpan.FromSeconds(1);

    private readonly Process process;
    private readonly CancellationToken cancellation;
    private readonly CancellationTokenRegistration registration;
    private readonly Queue<string> lastLines = new();

    public Mp4Encoder(string program, string path, FilmPlan plan, CancellationToken cancellation)
    {
        this.cancellation = cancellation;
        process = new Process { StartInfo = StartInfo(program, path, plan) };
        process.ErrorDataReceived += (_, line) => Keep(line.Data);
        process.OutputDataReceived += static (_, _) => { };
        try
        {
            process.Start();
        }
        catch (Win32Exception fault)
        {
            process.Dispose();
            throw new PictureException($"ffmpeg ({program}) could not be started: {fault.Message}", fault);
        }

        process.BeginErrorReadLine();
        process.BeginOutputReadLine();
        registration = cancellation.Register(Kill);
    }

    /// <summary>H.264 with colours at half resolution has even sides only.</summary>
    public static void Check(FilmPlan plan)
    {
        if ((plan.Size.WidthPx | plan.Size.HeightPx) % 2 != 0)
        {
            throw new PictureException($"Film size {plan.Size.WidthPx} x {plan.Size.HeightPx} does not go in an MP4: width and height must be even.");
        }
    }

    public ReadOnlyMemory<byte> Encode(int index, FrameBuffer frame, FrameBuffer? before) => frame.Bytes;

    public void Write(ReadOnlyMemory<byte> encoded)
    {
        try
        {
            process.StandardInput.BaseStream.Write(encoded.Span);
        }
        catch (IOException)
        {
            process.WaitForExit();
            throw Failure();
        }
    }

    public void Finish()
    {
        try
        {
            process.StandardInput.Close();
        }
        catch (IOException)
        {
            // It has gone already; its exit code says why.
        }

        process.WaitForExit();
        if (process.ExitCode != 0)
        {
            throw Failure();
        }
    }

    public void Dispose()
    {
        registration.Dispose();
        Kill();
        process.WaitForExit();
        process.Dispose();
    }

    private static ProcessStartInfo StartInfo(string program, string path, FilmPlan plan)
    {
        var size = string.Create(CultureInfo.InvariantCulture, $"{plan.Size.WidthPx}x{plan.Size.HeightPx}");
        return new ProcessStartInfo(program)
        {
            UseShellExecute = false,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            ArgumentList =
            {
                "-hide_banner", "-loglevel", "error", "-y",
                "-f", "rawvideo", "-pixel_format", "rgba", "-video_size", size,
                "-framerate", plan.FramesPerSecond.ToString(CultureInfo.InvariantCulture), "-i", "pipe:0",
                // HD colours, converted and said so; without it, viewers guess by the size and the greys shift.
                "-vf", "scale=out_color_matrix=bt709:out_range=tv,format=yuv420p",
                "-colorspace", "bt709", "-color_primaries", "bt709", "-color_trc", "bt709", "-color_range", "tv",
                // 18 is the customary "no visible loss"; thin lines and small text need it.
                "-c:v", "libx264", "-preset", "medium", "-crf", "18",
                "-movflags", "+faststart", "-f", "mp4", "file:" + Path.GetFullPath(path),
            },
        };
    }

    /// <summary>What to throw once ffmpeg has ended too early.</summary>
    private Exception Failure()
    {
        if (cancellation.WaitHandle.WaitOne(process.ExitCode == 0 || SaysInterrupted() ? UntilInterruptionIsKnown : TimeSpan.Zero))
        {
            return new OperationCanceledException(cancellation);
        }

        lock (lastLines)
        {
            return new PictureException(
                $"ffmpeg ended with exit code {process.ExitCode}" + (lastLines.Count == 0 ? " and said nothing." : ":\n" + string.Join('\n', lastLines)));
        }
    }

    /// <summary>255 is what ffmpeg returns after a signal; 128 and the signal's number comes from the system.</summary>
    private bool SaysInterrupted() => process.ExitCode > 128;

    private void Keep(string? line)
    {
        if (string.IsNullOrWhiteSpace(line))
        {
            return;
        }

        lock (lastLines)
        {
            lastLines.Enqueue(line.TrimEnd());
            if (lastLines.Count > LinesKept)
            {
                lastLines.Dequeue();
            }
        }
    }

    private void Kill()
    {
        try
        {
            process.Kill(entireProcessTree: true);
        }
        catch (Exception fault) when (fault is InvalidOperationException or Win32Exception)
        {
            // It has ended already.
        }
    }
}
