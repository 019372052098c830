using System.Runtime.InteropServices;
using SkiaSharp;

namespace ScanSim.Display.Films;

/// <summary>The pixels of one frame, red first, and the canvas that paints into them.</summary>
internal sealed class FrameBuffer : IDisposable
{
    private readonly byte[] bytes;
    private readonly SKSurface surface;

    public FrameBuffer(PictureSize size)
    {
        Size = size;
        var info = new SKImageInfo(size.WidthPx, size.HeightPx, SKColorType.Rgba8888, SKAlphaType.Premul);
        // Pinned: Skia writes straight into it for as long as the surface lives.
        bytes = GC.AllocateUninitializedArray<byte>(info.BytesSize, pinned: true);
        surface = SKSurface.Create(info, Marshal.UnsafeAddrOfPinnedArrayElement(bytes, 0), info.RowBytes)
            ?? throw new PictureException($"There is no memory for a frame of {size.WidthPx} x {size.HeightPx} pixels.");
    }

    public PictureSize Size { get; }

    public ReadOnlyMemory<byte> Bytes => bytes;

    public ReadOnlySpan<uint> Row(int y) => MemoryMarshal.Cast<byte, uint>(bytes).Slice(y * Size.WidthPx, Size.WidthPx);

    public void Paint(Painter painter, ViewOptions view, double timeS)
    {
        // The painter covers everything, but may leave a fraction of the last pixels at a broken scale.
        surface.Canvas.Clear(SKColors.Black);
        painter.Paint(surface.Canvas, Size, view, timeS);
        surface.Flush();
    }

    public void Dispose() => surface.Dispose();
}
