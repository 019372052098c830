using SkiaSharp;

namespace ScanSim.Display.Tests.Films;

/// <summary>A WebP or GIF film as an independent decoder sees it: Skia's, which has libwebp and a GIF reader of its own.</summary>
internal sealed class DecodedFilm
{
    private DecodedFilm(SKCodec codec, List<SKColor[]> frames)
    {
        Size = (codec.Info.Width, codec.Info.Height);
        Durations = [.. codec.FrameInfo.Select(f => f.Duration)];
        RepetitionCount = codec.RepetitionCount;
        Frames = frames;
    }

    public (int WidthPx, int HeightPx) Size { get; }

    /// <summary>Milliseconds.</summary>
    public IReadOnlyList<int> Durations { get; }

    /// <summary>-1: for ever.</summary>
    public int RepetitionCount { get; }

    /// <summary>The whole picture at each frame, composed of what came before.</summary>
    public IReadOnlyList<SKColor[]> Frames { get; }

    public static DecodedFilm Read(string path)
    {
        using var codec = SKCodec.Create(path, out var result);
        Assert.Equal(SKCodecResult.Success, result);
        var info = new SKImageInfo(codec.Info.Width, codec.Info.Height, SKColorType.Rgba8888, SKAlphaType.Unpremul);
        using var bitmap = new SKBitmap(info);
        var frames = new List<SKColor[]>();
        for (var i = 0; i < codec.FrameCount; i++)
        {
            Assert.Equal(SKCodecResult.Success, codec.GetPixels(info, bitmap.GetPixels(), new SKCodecOptions(i, i - 1)));
            frames.Add(bitmap.Pixels);
        }

        return new DecodedFilm(codec, frames);
    }
}
