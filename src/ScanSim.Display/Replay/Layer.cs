using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>A part of the window that seldom changes, kept as pixels and painted anew only when what it depends on has changed.</summary>
internal sealed class Layer : IDisposable
{
    private SKSurface? surface;
    private SKRectI box;
    private object? paintedFor;

    /// <summary>How often it was painted anew.</summary>
    public int Renewals { get; private set; }

    /// <summary>Puts the layer on the frame; without a cache (pictures to save) paints straight onto it.</summary>
    /// <param name="frame">The canvas and its scale.</param>
    /// <param name="area">In layout units.</param>
    /// <param name="key">Equal as long as the layer would look the same.</param>
    /// <param name="paint">Paints the whole area.</param>
    public void Show(Frame frame, SKRect area, object key, Action<SKCanvas> paint)
    {
        if (!frame.IsCached)
        {
            frame.Canvas.Save();
            frame.Canvas.ClipRect(area);
            paint(frame.Canvas);
            frame.Canvas.Restore();
            return;
        }

        Renew(frame, area, (area, frame.Scale, key), paint);
        frame.Canvas.Save();
        frame.Canvas.SetMatrix(frame.Pixels);
        frame.Canvas.DrawSurface(surface, box.Left, box.Top);
        frame.Canvas.Restore();
    }

    private void Renew(Frame frame, SKRect area, object key, Action<SKCanvas> paint)
    {
        if (key.Equals(paintedFor))
        {
            return;
        }

        var scaled = new SKRect(area.Left * frame.Scale, area.Top * frame.Scale, area.Right * frame.Scale, area.Bottom * frame.Scale);
        var needed = SKRectI.Ceiling(scaled, true);
        if (surface is null || needed.Width != box.Width || needed.Height != box.Height)
        {
            surface?.Dispose();
            surface = SKSurface.Create(new SKImageInfo(needed.Width, needed.Height, SKImageInfo.PlatformColorType, SKAlphaType.Premul))
                ?? throw new PictureException($"There is no memory for {needed.Width} x {needed.Height} pixels.");
        }

        box = needed;
        var canvas = surface.Canvas;
        canvas.ResetMatrix();
        canvas.Clear(SKColors.Transparent);
        canvas.Translate(-box.Left, -box.Top);
        canvas.Scale(frame.Scale);
        paint(canvas);
        paintedFor = key;
        Renewals++;
    }

    public void Dispose() => surface?.Dispose();
}
