namespace ScanSim.Display.Films;

/// <summary>Which times a film shows, how fast and how large.</summary>
public sealed record FilmPlan
{
    /// <summary>Half an hour at 12 frames a second, with room to spare; a longer film is nearly always a slip in the speed.</summary>
    public const int MostFrames = 20_000;

    public const int MostFramesPerSecond = 60;

    public const double LeastSpeedRatio = 1e-3;

    public const double GreatestSpeedRatio = 1e6;

    /// <summary>Largest side in pixels: several frames are in memory at once, 64 MiB each at this size.</summary>
    public const int GreatestSidePx = 4096;

    /// <summary>Time of the first frame, since the scenario's start.</summary>
    public required double FromS { get; init; }

    /// <summary>Time of the last frame.</summary>
    public required double ToS { get; init; }

    /// <summary>Seconds of the scenario in one second of the film.</summary>
    public double SpeedRatio { get; init; } = 10;

    public int FramesPerSecond { get; init; } = 12;

    public PictureSize Size { get; init; } = new(1280, 800);

    /// <summary>From one frame to the next, in the scenario's time; the last step may be shorter.</summary>
    public double StepS => SpeedRatio / FramesPerSecond;

    /// <summary>Both ends are shown. Only meaningful for a plan that passes <see cref="Check"/>.</summary>
    public int FrameCount => (int)Frames;

    // A millionth of a step is rounding, not a step.
    private double Frames => Math.Ceiling((ToS - FromS) / StepS - 1e-6) + 1;

    /// <summary>What the frame shows, since the scenario's start. The last frame is at <see cref="ToS"/>.</summary>
    public double TimeS(int frame) => frame >= FrameCount - 1 ? ToS : FromS + frame * StepS;

    /// <summary>When the frame is to be shown, since the film's beginning, in so many units a second, to the nearest one.</summary>
    /// <remarks>Lengths of frames are differences of these, so that roundings do not add up.</remarks>
    internal int ShownAt(int frame, int unitsPerSecond) =>
        (int)(((long)frame * unitsPerSecond + FramesPerSecond / 2) / FramesPerSecond);

    /// <summary>Throws <see cref="PictureException"/> unless the film can be made of a recording this long.</summary>
    public void Check(double durationS)
    {
        Size.Check();
        if (Size.WidthPx > GreatestSidePx || Size.HeightPx > GreatestSidePx)
        {
            throw new PictureException($"Film size {Size.WidthPx} x {Size.HeightPx} does not go: at most {GreatestSidePx} pixels a side.");
        }

        if (FramesPerSecond is < 1 or > MostFramesPerSecond)
        {
            throw new PictureException($"{FramesPerSecond} frames a second do not go: 1 to {MostFramesPerSecond}.");
        }

        if (!(SpeedRatio is >= LeastSpeedRatio and <= GreatestSpeedRatio))
        {
            throw new PictureException($"A speed of {SpeedRatio} does not go: {LeastSpeedRatio} to {GreatestSpeedRatio} seconds of the scenario in a second of the film.");
        }

        if (!(FromS >= 0 && ToS <= durationS && FromS < ToS))
        {
            throw new PictureException(
                $"A film from {FromS:0.###} s to {ToS:0.###} s does not go: it must begin before it ends, within the recording: 0 s to {durationS:0.###} s.");
        }

        if (Frames > MostFrames)
        {
            throw new PictureException(
                $"The film would have {Frames:0} frames, at most {MostFrames} are allowed: make the speed at least {SlowestAllowed():0.###}, the time shown shorter or the frames a second fewer.");
        }
    }

    /// <summary>Rounded up to the three decimals that are printed.</summary>
    private double SlowestAllowed() => Math.Ceiling(1000 * (ToS - FromS) * FramesPerSecond / (MostFrames - 1)) / 1000;
}
