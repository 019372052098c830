namespace ScanSim.Display;

/// <summary>Pixels of the picture, and how many of them one unit of the layout takes: 2 draws everything twice as large.</summary>
/// <remarks>default(PictureSize) is no size and is refused.</remarks>
public readonly record struct PictureSize(int WidthPx, int HeightPx, double Scale = 1)
{
    /// <summary>Least width in layout units; below it the parts would cover one another.</summary>
    public const int LeastWidth = 800;

    public const int LeastHeight = 600;

    /// <summary>Largest side in pixels; a 16-bit limit leaves Skia's rasteriser exact.</summary>
    public const int GreatestSidePx = 16384;

    public static PictureSize Default => new(1280, 900);

    /// <summary>Width in layout units.</summary>
    public float Width => (float)(WidthPx / Scale);

    /// <summary>Height in layout units.</summary>
    public float Height => (float)(HeightPx / Scale);

    /// <summary>Throws <see cref="PictureException"/> unless a picture can be laid out in it.</summary>
    public void Check()
    {
        if (!(Scale is >= 1 and <= 8))
        {
            throw new PictureException($"Picture scale {Scale} does not go: it must lie between 1 and 8.");
        }

        if (Width < LeastWidth || Height < LeastHeight || WidthPx > GreatestSidePx || HeightPx > GreatestSidePx)
        {
            throw new PictureException(
                $"Picture size {WidthPx} x {HeightPx} at scale {Scale} does not go: it must be at least {LeastWidth * Scale:0} x {LeastHeight * Scale:0} and at most {GreatestSidePx} pixels a side.");
        }
    }
}
