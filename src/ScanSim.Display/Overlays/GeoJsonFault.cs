using System.Text.Json;

namespace ScanSim.Display.Overlays;

/// <summary>Words a fault of an overlay file: where, what was read, what would be right.</summary>
internal sealed class GeoJsonFault(string fileName)
{
    private const int LongestQuote = 60;

    public OverlayException At(string path, string read, string expected) => new($"{fileName}: {path}: read {read}, expected {expected}");

    /// <summary>A value as it stands in the file, cut when it is long.</summary>
    public static string Short(JsonElement json)
    {
        var text = json.GetRawText().ReplaceLineEndings(" ");
        return text.Length <= LongestQuote ? text : text[..LongestQuote] + "…";
    }
}
