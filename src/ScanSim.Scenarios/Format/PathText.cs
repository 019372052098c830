using System.Globalization;

namespace ScanSim.Scenarios.Format;

/// <summary>JSON paths as messages show them: $.radar.waveform.prf[1], $['odd name'].</summary>
internal static class PathText
{
    public static string Member(string path, string name) =>
        name.Length > 0 && name.All(c => char.IsAsciiLetterOrDigit(c) || c is '_' or '$')
            ? $"{path}.{name}"
            : $"{path}['{Json.JsonValue.Short(name)}']";

    public static string Item(string path, int index) => path + "[" + index.ToString(CultureInfo.InvariantCulture) + "]";
}
