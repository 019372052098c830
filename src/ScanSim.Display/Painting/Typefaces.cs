using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>The program's own letters, so that a picture looks the same on a system without fonts. Their figures are all of one width.</summary>
internal static class Typefaces
{
    public static readonly SKTypeface Regular = Load("NotoSans-Regular.ttf");
    public static readonly SKTypeface Bold = Load("NotoSans-Bold.ttf");

    private static SKTypeface Load(string resource)
    {
        using var stream = typeof(Typefaces).Assembly.GetManifestResourceStream(resource)
            ?? throw new InvalidOperationException($"resource {resource} is missing from the assembly");
        return SKTypeface.FromStream(stream) ?? throw new InvalidOperationException($"resource {resource} is not a typeface");
    }
}
