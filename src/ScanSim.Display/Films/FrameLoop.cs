namespace ScanSim.Display.Films;

/// <summary>Paints and encodes the frames of a film on all cores and hands them on in order.</summary>
internal sealed class FrameLoop(Scene scene, ViewOptions view, FilmPlan plan)
{
    /// <summary>Frames in memory at once take at most this much, whatever the number of cores.</summary>
    private const long MostBytes = 512L << 20;

    /// <summary>More frames a batch leave fewer cores idle at its end.</summary>
    private const int FramesPerCore = 4;

    public void Run(IFilmEncoder encoder, Action<int, int>? progress, CancellationToken cancellation)
    {
        var batch = Math.Min(BatchSize(plan.Size), plan.FrameCount);
        // The first one holds the last frame of the batch before.
        var frames = new FrameBuffer[batch + 1];
        try
        {
            for (var i = 0; i < frames.Length; i++)
            {
                frames[i] = new FrameBuffer(plan.Size);
            }

            for (var first = 0; first < plan.FrameCount; first += batch)
            {
                var count = Math.Min(batch, plan.FrameCount - first);
                Run(encoder, frames, first, count, progress, cancellation);
                (frames[0], frames[count]) = (frames[count], frames[0]);
            }
        }
        finally
        {
            foreach (var frame in frames)
            {
                frame?.Dispose();
            }
        }

        encoder.Finish();
    }

    private void Run(IFilmEncoder encoder, FrameBuffer[] frames, int first, int count, Action<int, int>? progress, CancellationToken cancellation)
    {
        var painter = new Painter(scene);
        var encoded = new ReadOnlyMemory<byte>[count];
        var parallel = new ParallelOptions { MaxDegreeOfParallelism = Environment.ProcessorCount, CancellationToken = cancellation };
        Parallel.For(0, count, parallel, i => frames[i + 1].Paint(painter, view, plan.TimeS(first + i)));
        Parallel.For(0, count, parallel, i => encoded[i] = encoder.Encode(first + i, frames[i + 1], first + i == 0 ? null : frames[i]));
        for (var i = 0; i < count; i++)
        {
            cancellation.ThrowIfCancellationRequested();
            encoder.Write(encoded[i]);
            progress?.Invoke(first + i + 1, plan.FrameCount);
        }
    }

    private static int BatchSize(PictureSize size) =>
        (int)Math.Clamp(MostBytes / (4L * size.WidthPx * size.HeightPx), 1, FramesPerCore * Environment.ProcessorCount);
}
