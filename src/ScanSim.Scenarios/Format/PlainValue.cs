using System.Globalization;
using System.Text.RegularExpressions;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios.Format;

/// <summary>Reads values that are neither block nor list.</summary>
internal static class PlainValue
{
    /// <summary>Whole numbers up to here are exact however they are written (1e3, 1000.0).</summary>
    private const double ExactWhole = 9_007_199_254_740_992;

    private static readonly TimeSpan PatternTime = TimeSpan.FromSeconds(5);

    private static readonly string[] InstantForms = ["yyyy-MM-dd'T'HH:mm:ss'Z'", "yyyy-MM-dd'T'HH:mm:ss.FFFFFFF'Z'"];

    /// <summary>Null when the value does not fit; the reason may be empty when the value itself shows it.</summary>
    public static CheckedValue? Read(Shape shape, JsonValue json, string path, out string reason)
    {
        reason = "";
        return shape switch
        {
            Shape.OfQuantity quantity => Quantity(quantity, json, path, out reason),
            Shape.OfNumber number => Number(number, json, path, out reason),
            Shape.OfWhole whole => Whole(whole, json, path),
            Shape.OfText text => Text(text, json, path, out reason),
            Shape.OfIgnoredText => json.Kind == JsonKind.Text ? new CheckedValue.OfText(json, path, json.Text) : null,
            Shape.OfInstant => Instant(json, path),
            Shape.OfChoice choice => json.Kind == JsonKind.Text && choice.Words.Contains(json.Text, StringComparer.Ordinal)
                ? new CheckedValue.OfText(json, path, json.Text)
                : null,
            _ => throw new ArgumentOutOfRangeException(nameof(shape)),
        };
    }

    private static CheckedValue.OfQuantity? Quantity(Shape.OfQuantity shape, JsonValue json, string path, out string reason)
    {
        if (json.Kind == JsonKind.Number)
        {
            reason = "a bare number where a unit is needed";
            return null;
        }

        reason = "";
        if (json.Kind != JsonKind.Text)
        {
            return null;
        }

        if (!QuantityText.TryRead(json.Text, shape.Dimension, out var quantity, out var problem))
        {
            reason = problem;
            return null;
        }

        if (Within(shape, quantity.Si))
        {
            return new CheckedValue.OfQuantity(json, path, shape.Dimension, quantity);
        }

        reason = "out of range";
        return null;
    }

    private static bool Within(Shape.OfQuantity shape, double si) =>
        (shape.AtLeast is null || si >= Si(shape, shape.AtLeast))
        && (shape.Above is null || si > Si(shape, shape.Above))
        && (shape.AtMost is null || si <= Si(shape, shape.AtMost))
        && (shape.Below is null || si < Si(shape, shape.Below));

    private static double Si(Shape.OfQuantity shape, string limit) =>
        QuantityText.TryParse(limit, shape.Dimension, out var si, out var problem) ? si : throw new InvalidOperationException(problem);

    private static CheckedValue.OfNumber? Number(Shape.OfNumber shape, JsonValue json, string path, out string reason)
    {
        reason = "";
        if (json.Kind != JsonKind.Number)
        {
            return null;
        }

        var number = double.Parse(json.Text, NumberStyles.Float, CultureInfo.InvariantCulture);
        if (number >= shape.AtLeast && number <= shape.AtMost)
        {
            return new CheckedValue.OfNumber(json, path, number);
        }

        reason = "out of range";
        return null;
    }

    private static CheckedValue.OfWhole? Whole(Shape.OfWhole shape, JsonValue json, string path)
    {
        if (json.Kind != JsonKind.Number)
        {
            return null;
        }

        if (!ulong.TryParse(json.Text, NumberStyles.None, CultureInfo.InvariantCulture, out var number))
        {
            var real = double.Parse(json.Text, NumberStyles.Float, CultureInfo.InvariantCulture);
            if (!(real >= 0 && real <= ExactWhole && real == Math.Floor(real)))
            {
                return null;
            }

            number = (ulong)real;
        }

        return number >= shape.AtLeast && number <= shape.AtMost ? new CheckedValue.OfWhole(json, path, number) : null;
    }

    private static CheckedValue.OfText? Text(Shape.OfText shape, JsonValue json, string path, out string reason)
    {
        reason = "";
        if (json.Kind != JsonKind.Text)
        {
            return null;
        }

        reason = json.Text.Length > shape.LongestCharacters ? $"{json.Text.Length} characters" : "";
        return reason.Length == 0 && Regex.IsMatch(json.Text, WholeText(shape.Pattern), RegexOptions.CultureInvariant, PatternTime)
            ? new CheckedValue.OfText(json, path, json.Text)
            : null;
    }

    /// <summary>In .NET "$" also stands before a last line feed; in the schema's dialect it does not.</summary>
    private static string WholeText(string pattern) => pattern[..^1] + @"\z";

    private static CheckedValue.OfInstant? Instant(JsonValue json, string path) =>
        json.Kind == JsonKind.Text
        && DateTimeOffset.TryParseExact(json.Text, InstantForms, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var instant)
            ? new CheckedValue.OfInstant(json, path, instant)
            : null;
}
