namespace ScanSim.Display.Films;

/// <summary>Films as files: animated WebP, GIF, or MP4 by ffmpeg, by the name's ending. The same input gives the same WebP and GIF bytes on the same system.</summary>
public static class Film
{
    /// <summary>Writes beside the file and renames, so that half a film never stands under the name asked for.</summary>
    /// <param name="scene">What is filmed.</param>
    /// <param name="view">How it is shown, the same in each frame.</param>
    /// <param name="plan">From when to when, how fast, how large.</param>
    /// <param name="path">The file; its ending chooses the format.</param>
    /// <param name="progress">Is told how many frames of how many are done.</param>
    /// <param name="cancellation">Ends it without a file.</param>
    public static void Save(Scene scene, ViewOptions view, FilmPlan plan, string path, Action<int, int>? progress = null, CancellationToken cancellation = default)
    {
        Check(plan, scene.DurationS, path);
        view.Check();
        var write = FormatOf(path);
        FileBeside.Write(path, "Film", unfinished =>
        {
            write(new FilmJob(scene, view, plan, unfinished, progress, cancellation));
            cancellation.ThrowIfCancellationRequested();
        });
    }

    /// <summary>Throws <see cref="PictureException"/> for what can be known to go wrong before the recording is read.</summary>
    public static void Check(FilmPlan plan, double durationS, string path)
    {
        var write = FormatOf(path);
        plan.Check(durationS);
        if (Directory.Exists(path))
        {
            throw new PictureException($"Film '{path}' could not be written: it is a folder.");
        }

        if (write == Gif)
        {
            GifEncoder.Check(plan);
        }
        else if (write == Mp4)
        {
            Mp4Encoder.Check(plan);
            FfmpegProgram();
        }
    }

    private static Action<FilmJob> FormatOf(string path) =>
        Path.GetExtension(path).ToUpperInvariant() switch
        {
            ".WEBP" => Webp,
            ".GIF" => Gif,
            ".MP4" => Mp4,
            var other => throw new PictureException(
                $"Film '{path}' has {(other.Length == 0 ? "no ending" : $"the ending '{Path.GetExtension(path)}'")}: it must end in .webp, .gif or .mp4."),
        };

    private static void Webp(FilmJob job)
    {
        using var file = File.Create(job.Path);
        job.Run(new WebpEncoder(file, job.Plan));
    }

    private static void Gif(FilmJob job)
    {
        var palette = GifPalette.Of(job.Scene, job.View, job.Plan, job.Cancellation);
        using var file = File.Create(job.Path);
        job.Run(new GifEncoder(file, job.Plan, palette));
    }

    private static void Mp4(FilmJob job)
    {
        using var encoder = new Mp4Encoder(FfmpegProgram(), job.Path, job.Plan, job.Cancellation);
        job.Run(encoder);
    }

    private static string FfmpegProgram() => Ffmpeg.Find() ?? throw new PictureException(
        $"MP4 films need the program ffmpeg, which is not on the PATH. {Ffmpeg.HowToInstall} Or ask for a .webp or .gif, which need nothing.");
}
