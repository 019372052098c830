using SkiaSharp;

namespace ScanSim.Display.Windowing;

/// <summary>How many pixels a layout unit takes on a screen.</summary>
internal static class WindowScale
{
    /// <summary>Least width in layout units that a screen is asked to fill.</summary>
    public const int LeastWidth = 800;

    public const int LeastHeight = 600;

    public const float Greatest = 8;

    /// <summary>Pixels per inch at which Windows and X draw unscaled.</summary>
    private const float PlainDpi = 96;

    /// <summary>The scale the screen asks for.</summary>
    /// <param name="pixelsPerCoordinate">Above 1 where the system counts windows in points (macOS, Wayland): then that is the scale.</param>
    /// <param name="dpi">Of the display, 0 if unknown.</param>
    /// <param name="dpiIsUsersChoice">
    /// Windows tells the user's setting, taken in quarters. X tells the glass's density, which laptops have well above 96 with unscaled desktops:
    /// only whole steps count there.
    /// </param>
    public static float Wanted(float pixelsPerCoordinate, float dpi, bool dpiIsUsersChoice)
    {
        var step = dpiIsUsersChoice ? 0.25f : 1;
        var scale = pixelsPerCoordinate > 1.01f ? pixelsPerCoordinate : MathF.Floor(dpi / PlainDpi / step + 0.02f) * step;
        return float.IsFinite(scale) ? Math.Clamp(scale, 1, Greatest) : 1;
    }

    /// <summary>Less than wanted where the window would otherwise not hold the least layout; in quarters, never below 1.</summary>
    public static float Fitting(float wanted, SKSizeI pixels)
    {
        var room = Math.Min((float)pixels.Width / LeastWidth, (float)pixels.Height / LeastHeight);
        return room >= wanted ? wanted : Math.Max(1, MathF.Floor(room * 4) / 4);
    }
}
