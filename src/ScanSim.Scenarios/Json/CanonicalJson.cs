using System.Globalization;
using System.Text;

namespace ScanSim.Scenarios.Json;

/// <summary>One text for all ways to write the same JSON: keys sorted, no white space, one form for numbers and texts.</summary>
/// <remarks>
/// Source: RFC 8785 (JSON Canonicalization Scheme), with one difference: whole numbers beyond 2^53 keep all their digits, so that
/// two seeds that differ have two digests.
/// </remarks>
internal static class CanonicalJson
{
    private const double ExactWhole = 9_007_199_254_740_992;

    public static string Write(JsonValue value)
    {
        var text = new StringBuilder();
        Append(text, value);
        return text.ToString();
    }

    private static void Append(StringBuilder text, JsonValue value)
    {
        switch (value.Kind)
        {
            case JsonKind.Block:
                Members(text, value);
                break;
            case JsonKind.List:
                Items(text, value);
                break;
            case JsonKind.Text:
                Quoted(text, value.Text);
                break;
            case JsonKind.Number:
                text.Append(Number(value.Text));
                break;
            default:
                text.Append(value.Shown());
                break;
        }
    }

    private static void Members(StringBuilder text, JsonValue block)
    {
        text.Append('{');
        var first = true;
        foreach (var member in block.Members.OrderBy(member => member.Name, StringComparer.Ordinal))
        {
            text.Append(first ? "" : ",");
            first = false;
            Quoted(text, member.Name);
            text.Append(':');
            Append(text, member.Value);
        }

        text.Append('}');
    }

    private static void Items(StringBuilder text, JsonValue list)
    {
        text.Append('[');
        for (var i = 0; i < list.Items.Length; i++)
        {
            text.Append(i == 0 ? "" : ",");
            Append(text, list.Items[i]);
        }

        text.Append(']');
    }

    private static void Quoted(StringBuilder text, string content)
    {
        text.Append('"');
        foreach (var c in content)
        {
            text.Append(c switch
            {
                '"' => "\\\"",
                '\\' => "\\\\",
                '\b' => "\\b",
                '\t' => "\\t",
                '\n' => "\\n",
                '\f' => "\\f",
                '\r' => "\\r",
                < ' ' => "\\u" + ((int)c).ToString("x4", CultureInfo.InvariantCulture),
                _ => c.ToString(),
            });
        }

        text.Append('"');
    }

    private static string Number(string written)
    {
        var number = double.Parse(written, NumberStyles.Float, CultureInfo.InvariantCulture);
        if (Math.Abs(number) > ExactWhole && written.All(c => c is '-' or (>= '0' and <= '9')))
        {
            return written;
        }

        return number == 0 ? "0" : EcmaScript(number);
    }

    /// <summary>The shortest digits that read back the same, laid out as ECMAScript's Number::toString does (ECMA-262, 6.1.6.1.20).</summary>
    private static string EcmaScript(double number)
    {
        var (digits, point) = Shortest(Math.Abs(number).ToString("R", CultureInfo.InvariantCulture));
        var exponent = point - 1;
        return (number < 0 ? "-" : "") + point switch
        {
            > 21 or < -5 => digits[..1] + (digits.Length > 1 ? "." + digits[1..] : "") + "e" + (exponent < 0 ? "-" : "+") + Math.Abs(exponent).ToString(CultureInfo.InvariantCulture),
            <= 0 => "0." + new string('0', -point) + digits,
            _ when point >= digits.Length => digits + new string('0', point - digits.Length),
            _ => digits[..point] + "." + digits[point..],
        };
    }

    /// <summary>Significant digits, and how many of them stand before the decimal point.</summary>
    private static (string Digits, int Point) Shortest(string roundTrip)
    {
        var parts = roundTrip.Split('E');
        var dot = parts[0].IndexOf('.', StringComparison.Ordinal);
        var all = parts[0].Replace(".", "", StringComparison.Ordinal);
        var leadingZeros = all.Length - all.TrimStart('0').Length;
        var exponent = parts.Length > 1 ? int.Parse(parts[1], NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture) : 0;
        return (all.Trim('0'), (dot < 0 ? all.Length : dot) - leadingZeros + exponent);
    }
}
