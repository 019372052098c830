using System.Security;
using System.Text.RegularExpressions;

namespace ScanSim.Display.Painting;

/// <summary>What Skia's SVG lacks: ids that do not depend on what the process drew before, a view box, a title.</summary>
internal static partial class SvgEnvelope
{
    /// <summary>Finishes the text of one picture.</summary>
    public static string Finish(string svg, string title, PictureSize size)
    {
        var numbers = new Dictionary<string, int>(StringComparer.Ordinal);
        var numbered = ClipId().Replace(svg, match =>
        {
            numbers.TryAdd(match.Value, numbers.Count + 1);
            return $"clip-{numbers[match.Value]}";
        });
        var end = numbered.IndexOf('>', numbered.IndexOf("<svg", StringComparison.Ordinal));
        return numbered.Insert(end + 1, $"\n<title>{SecurityElement.Escape(title)}</title>").Insert(end, $" viewBox=\"0 0 {size.WidthPx} {size.HeightPx}\"");
    }

    /// <summary>As in id="cl_1f" and url(#cl_1f); Skia counts them through the life of the process.</summary>
    [GeneratedRegex(@"(?<=[""#])cl_[0-9a-f]+(?=["")])", RegexOptions.None, 10_000)]
    private static partial Regex ClipId();
}
