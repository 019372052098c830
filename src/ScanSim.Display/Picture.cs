using System.Text;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display;

/// <summary>Still pictures as files: PNG, SVG or PDF, by the name's ending. The same input gives the same bytes on the same system.</summary>
public static class Picture
{
    /// <summary>Writes beside the file and renames, so that a broken picture never stands under the name asked for.</summary>
    public static void Save(Scene scene, ViewOptions view, double timeS, PictureSize size, string path) =>
        Write(path, size, scene, (canvas, forSvg) => new Painter(scene) { ForSvg = forSvg }.Paint(canvas, size, view, timeS));

    /// <summary>The same for anything that can be painted onto a canvas in pixels, told whether it becomes SVG; name and date come from the scene.</summary>
    internal static void Write(string path, PictureSize size, Scene scene, Action<SKCanvas, bool> paint)
    {
        var draw = FormatOf(path);
        size.Check();
        FileBeside.Write(path, "Picture", unfinished =>
        {
            using var stream = File.Create(unfinished);
            draw(scene, size, stream, paint);
        });
    }

    private static Action<Scene, PictureSize, Stream, Action<SKCanvas, bool>> FormatOf(string path) =>
        Path.GetExtension(path).ToUpperInvariant() switch
        {
            ".PNG" => Png,
            ".SVG" => Svg,
            ".PDF" => Pdf,
            var other => throw new PictureException(
                $"Picture '{path}' has {(other.Length == 0 ? "no ending" : $"the ending '{Path.GetExtension(path)}'")}: it must end in .png, .svg or .pdf."),
        };

    private static void Png(Scene scene, PictureSize size, Stream into, Action<SKCanvas, bool> paint)
    {
        using var surface = SKSurface.Create(new SKImageInfo(size.WidthPx, size.HeightPx, SKColorType.Rgba8888, SKAlphaType.Premul))
            ?? throw new PictureException($"There is no memory for a picture of {size.WidthPx} x {size.HeightPx} pixels.");
        paint(surface.Canvas, false);
        using var image = surface.Snapshot();
        using var pixels = image.PeekPixels();
        // No filter and medium compression: the quickest of the small ones for flat colours.
        using var data = pixels.Encode(new SKPngEncoderOptions(SKPngEncoderFilterFlags.None, 6))
            ?? throw new PictureException($"A picture of {size.WidthPx} x {size.HeightPx} pixels could not be encoded as PNG.");
        data.SaveTo(into);
    }

    private static void Svg(Scene scene, PictureSize size, Stream into, Action<SKCanvas, bool> paint)
    {
        using var drawn = new MemoryStream();
        using (var canvas = SKSvgCanvas.Create(SKRect.Create(size.WidthPx, size.HeightPx), drawn))
        {
            paint(canvas, true);
        }

        var svg = SvgEnvelope.Finish(Encoding.UTF8.GetString(drawn.ToArray()), scene.ScenarioName, size);
        into.Write(Encoding.UTF8.GetBytes(svg));
    }

    private static void Pdf(Scene scene, PictureSize size, Stream into, Action<SKCanvas, bool> paint)
    {
        // The date of what is shown, not of the making: the bytes must not depend on the clock.
        var date = scene.StartUtc.UtcDateTime;
        var metadata = new SKDocumentPdfMetadata
        {
            Title = scene.ScenarioName,
            Creator = "ScanSim",
            Producer = "ScanSim",
            Creation = date,
            Modified = date,
            RasterDpi = SKDocument.DefaultRasterDpi,
            EncodingQuality = 101,
        };
        using var document = SKDocument.CreatePdf(into, metadata);
        var canvas = document.BeginPage(size.WidthPx, size.HeightPx);
        paint(canvas, false);
        document.EndPage();
        document.Close();
    }
}
