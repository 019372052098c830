namespace ScanSim.Display.Films;

/// <summary>One film to be made: what <see cref="Film.Save"/> was asked for. The path is that of the unfinished file, which exists.</summary>
internal sealed record FilmJob(Scene Scene, ViewOptions View, FilmPlan Plan, string Path, Action<int, int>? Progress, CancellationToken Cancellation)
{
    public void Run(IFilmEncoder encoder) => new FrameLoop(Scene, View, Plan).Run(encoder, Progress, Cancellation);
}
