using System.Globalization;

namespace ScanSim.Cli;

/// <summary>Values with an SI prefix, four significant digits: "25 kW", "37.47 ns".</summary>
internal static class EngineeringText
{
    private static readonly string[] Prefixes = ["f", "p", "n", "µ", "m", "", "k", "M", "G", "T"];
    private const int PlainIndex = 5;

    /// <summary>Units of area, and what lies outside the prefixes, are given plainly.</summary>
    public static string Of(double value, string unit)
    {
        if (value == 0 || !double.IsFinite(value) || unit.StartsWith("m²", StringComparison.Ordinal))
        {
            return string.Create(CultureInfo.InvariantCulture, $"{value:G5} {unit}");
        }

        var index = (int)Math.Floor(Math.Log10(Math.Abs(value)) / 3 + 1e-12) + PlainIndex;
        if (index < 0 || index >= Prefixes.Length)
        {
            return string.Create(CultureInfo.InvariantCulture, $"{value:0.####E+0} {unit}");
        }

        return string.Create(CultureInfo.InvariantCulture, $"{value / Math.Pow(1000, index - PlainIndex):G5} {Prefixes[index]}{unit}");
    }
}
