using ScanSim.Display.Films;
using SkiaSharp;

namespace ScanSim.Display.Tests.Films;

/// <summary>A small scene, short plans for it, and its frames as the painter gives them.</summary>
internal static class FilmMaking
{
    public static readonly Scene Scene = SceneMaking.Scene(8, 120);

    public static readonly ViewOptions View = new();

    /// <summary>More frames than one batch holds on any machine with up to four cores; the last step is a short one.</summary>
    public static readonly FilmPlan Plan = new() { FromS = 40, ToS = 54.3, SpeedRatio = 10, FramesPerSecond = 12, Size = new PictureSize(800, 600) };

    public static SKColor[] Painted(FilmPlan plan, int frame) => Painted(plan, View, frame);

    public static SKColor[] Painted(FilmPlan plan, ViewOptions view, int frame)
    {
        using var painted = PaintedPicture.Of(Scene, view, plan.TimeS(frame), plan.Size);
        return painted.Pixels.Pixels;
    }

    /// <summary>The largest difference of a red, green or blue value.</summary>
    public static int Difference(SKColor a, SKColor b) =>
        Math.Max(Math.Abs(a.Red - b.Red), Math.Max(Math.Abs(a.Green - b.Green), Math.Abs(a.Blue - b.Blue)));
}
