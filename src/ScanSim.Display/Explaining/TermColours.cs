using SkiaSharp;

namespace ScanSim.Display.Explaining;

/// <summary>The areas of the chart of terms.</summary>
/// <remarks>Hues of Okabe and Ito (see <see cref="Painting.Colours"/>), lightened on white so that lines and marks stand out on them.</remarks>
internal static class TermColours
{
    public static SKColor Of(LookTerm term) => term switch
    {
        LookTerm.Range => new SKColor(0xF3, 0xCF, 0x80),
        LookTerm.AzimuthBeam => new SKColor(0xE0, 0xAE, 0xCA),
        LookTerm.ElevationBeam => new SKColor(0x80, 0xCE, 0xB9),
        _ => new SKColor(0x6F, 0xA8, 0xCE),
    };

    public static string Name(LookTerm term) => term switch
    {
        LookTerm.Range => "range",
        LookTerm.AzimuthBeam => "azimuth beam",
        LookTerm.ElevationBeam => "elevation beam",
        _ => "eclipsing",
    };
}
