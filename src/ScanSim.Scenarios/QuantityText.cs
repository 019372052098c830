using System.Diagnostics.CodeAnalysis;
using System.Globalization;

namespace ScanSim.Scenarios;

/// <summary>Quantities as text, the same way in scenario files and on the command line: "9.41 GHz", "10min", "-3.5 dB".</summary>
public static class QuantityText
{
    /// <summary>The number's part of a quantity as a regular expression; blanks may stand between it and the unit.</summary>
    internal const string NumberPattern = @"[+-]?[0-9]+(\.[0-9]+)?([eE][+-]?[0-9]+)?";

    private static readonly Dimension[] All = Enum.GetValues<Dimension>();

    /// <summary>Reads a quantity into its SI value; when it is none, <paramref name="problem"/> says what was read and what would be right.</summary>
    public static bool TryParse(string text, Dimension dimension, out double si, out string problem)
    {
        if (TryRead(text, dimension, out var quantity, out var reason))
        {
            (si, problem) = (quantity.Si, "");
            return true;
        }

        si = double.NaN;
        problem = $"read \"{text}\" ({reason}), expected {Expected(dimension)}";
        return false;
    }

    /// <summary>"1.5 km" of 1500 m and "km": at most <paramref name="digits"/> significant digits.</summary>
    /// <exception cref="ArgumentException">The unit is not one of the dimension.</exception>
    public static string Format(double si, Dimension dimension, string unitSymbol, int digits = 6)
    {
        var unit = Units.Find(dimension, unitSymbol)
            ?? throw new ArgumentException($"'{unitSymbol}' is not a unit of {Units.Words(dimension)} ({Units.List(dimension)})", nameof(unitSymbol));
        return Plain(unit.FromSi(si), digits) + " " + unit.Symbol;
    }

    /// <summary>"time with its unit (s, ms, us, ns, min, h)".</summary>
    public static string Expected(Dimension dimension) => $"{Units.Words(dimension)} with its unit ({Units.List(dimension)})";

    internal static bool TryRead(string text, Dimension dimension, out Quantity quantity, [NotNullWhen(false)] out string? reason)
    {
        quantity = default;
        var trimmed = text.AsSpan().Trim(' ');
        var length = NumberLength(trimmed);
        if (length == 0)
        {
            reason = trimmed.IsEmpty ? "empty" : "it does not begin with a number";
            return false;
        }

        var symbol = trimmed[length..].TrimStart(' ').ToString();
        var unit = Units.Find(dimension, symbol);
        if (unit is null)
        {
            reason = UnitProblem(symbol, dimension);
            return false;
        }

        var number = double.Parse(trimmed[..length], NumberStyles.Float, CultureInfo.InvariantCulture);
        quantity = new Quantity(number, unit, unit.ToSi(number));
        reason = double.IsFinite(number) && double.IsFinite(quantity.Si) ? null : "the number is too large";
        return reason is null;
    }

    /// <summary>Invariant text without an exponent where that is short.</summary>
    internal static string Plain(double number, int digits)
    {
        var size = Math.Abs(number);
        return size is 0 or (>= 1e-4 and < 1e15)
            ? decimal.Parse(number.ToString("E" + (digits - 1), CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture)
                .ToString("0.#############################", CultureInfo.InvariantCulture)
            : number.ToString("G" + digits, CultureInfo.InvariantCulture);
    }

    private static string UnitProblem(string symbol, Dimension dimension)
    {
        if (symbol.Length == 0)
        {
            return "a bare number where a unit is needed";
        }

        foreach (var other in All)
        {
            if (Units.Find(other, symbol) is not null)
            {
                return $"{symbol} is a unit of {Units.Words(other)}, not of {Units.Words(dimension)}";
            }
        }

        var near = Units.Of(dimension).FirstOrDefault(unit => string.Equals(unit.Symbol, symbol, StringComparison.OrdinalIgnoreCase));
        return near is null ? $"'{symbol}' is not a unit of {Units.Words(dimension)}" : $"'{symbol}' is not a unit; units are case-sensitive: {near.Symbol}";
    }

    /// <summary>Length of the longest prefix that <see cref="NumberPattern"/> matches; 0 when there is none.</summary>
    private static int NumberLength(ReadOnlySpan<char> text)
    {
        var at = text.Length > 0 && text[0] is '+' or '-' ? 1 : 0;
        var whole = Digits(text[at..]);
        if (whole == 0)
        {
            return 0;
        }

        at += whole;
        if (at < text.Length && text[at] == '.' && Digits(text[(at + 1)..]) is > 0 and var fraction)
        {
            at += 1 + fraction;
        }

        if (at < text.Length && text[at] is 'e' or 'E')
        {
            var sign = at + 1 < text.Length && text[at + 1] is '+' or '-' ? 1 : 0;
            if (Digits(text[Math.Min(text.Length, at + 1 + sign)..]) is > 0 and var exponent)
            {
                at += 1 + sign + exponent;
            }
        }

        return at;
    }

    private static int Digits(ReadOnlySpan<char> text)
    {
        var count = text.IndexOfAnyExceptInRange('0', '9');
        return count < 0 ? text.Length : count;
    }
}
