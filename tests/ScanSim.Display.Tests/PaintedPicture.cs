using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Tests;

/// <summary>A scene painted into memory, with the pieces of text that were set.</summary>
internal sealed class PaintedPicture : IDisposable
{
    private PaintedPicture(SKBitmap pixels, IReadOnlyList<DrawnText> texts, PictureLayout layout)
    {
        Pixels = pixels;
        Texts = texts;
        Layout = layout;
    }

    public SKBitmap Pixels { get; }

    public IReadOnlyList<DrawnText> Texts { get; }

    public PictureLayout Layout { get; }

    public static PaintedPicture Of(Scene scene, ViewOptions view, double timeS, PictureSize size)
    {
        var texts = new List<DrawnText>();
        var pixels = new SKBitmap(new SKImageInfo(size.WidthPx, size.HeightPx, SKColorType.Rgba8888, SKAlphaType.Premul));
        using var canvas = new SKCanvas(pixels);
        new Painter(scene) { Journal = texts }.Paint(canvas, size, view, timeS);
        using var sheet = new Sheet(canvas, Colours.Of(view.Theme), false, null);
        var rest = new TimelineHead(sheet, scene, size.Width).Height + TimelineView.AxisHeight;
        return new PaintedPicture(pixels, texts, PictureLayout.Of(size.Width, size.Height, scene.Targets.Length, rest));
    }

    /// <summary>The plan's middle and the pixels per metre, from the definition of <see cref="ViewOptions.RangeM"/> alone.</summary>
    public (SKPoint Middle, double PxPerM) Plan(double rangeM)
    {
        var plan = Layout.Plan;
        return (new SKPoint(plan.MidX, plan.MidY), (Math.Min(plan.Width, plan.Height) / 2 - 30) / rangeM);
    }

    public SKColor At(double x, double y) => Pixels.GetPixel((int)Math.Floor(x), (int)Math.Floor(y));

    public void Dispose() => Pixels.Dispose();
}
