using SkiaSharp;

namespace ScanSim.Display.Windowing;

/// <summary>SDL's pixel formats that Skia can draw into.</summary>
internal static class PixelFormats
{
    /// <summary>Unknown for the others. SDL names formats by the order in a 32-bit word, Skia by the order in memory; our processors are little-endian.</summary>
    public static SKColorType Of(uint sdlFormat) => sdlFormat switch
    {
        Sdl.FormatXrgb8888 or Sdl.FormatArgb8888 => SKColorType.Bgra8888,
        Sdl.FormatXbgr8888 or Sdl.FormatAbgr8888 => SKColorType.Rgba8888,
        Sdl.FormatRgb565 => SKColorType.Rgb565,
        _ => SKColorType.Unknown,
    };
}
