using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>What one frame is painted on.</summary>
/// <param name="Canvas">In layout units.</param>
/// <param name="Pixels">The canvas's matrix before it was scaled.</param>
/// <param name="Scale">Pixels a layout unit.</param>
/// <param name="ForSvg">Text as outlines, points as circles.</param>
/// <param name="IsCached">Whether layers are kept as pixels: on the screen, not in a picture that is saved.</param>
internal sealed record Frame(SKCanvas Canvas, SKMatrix Pixels, float Scale, bool ForSvg, bool IsCached)
{
    /// <summary>Where each piece of text was set is added here, if given.</summary>
    public ICollection<DrawnText>? Journal { get; init; }

    /// <summary>A sheet on a canvas of this frame.</summary>
    public Sheet SheetOn(SKCanvas canvas, Colours colours) => new(canvas, colours, ForSvg, Journal);
}
