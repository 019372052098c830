using System.Globalization;

namespace ScanSim.Scenarios.Format;

/// <summary>Says in words what a shape allows: the "expected" of every fault, and a column of the reference page.</summary>
internal static class ShapeWords
{
    public static string Of(Shape shape) => shape switch
    {
        Shape.OfQuantity quantity => Joined(QuantityText.Expected(quantity.Dimension), Limits(quantity)),
        Shape.OfNumber number => $"a number from {Number(number.AtLeast)} to {Number(number.AtMost)}",
        Shape.OfWhole whole => whole.AtLeast == whole.AtMost
            ? $"the number {whole.AtLeast}"
            : string.Create(CultureInfo.InvariantCulture, $"a whole number from {whole.AtLeast} to {whole.AtMost}"),
        Shape.OfText text => $"text of 1 to {text.LongestCharacters} characters ({text.PatternWords})",
        Shape.OfIgnoredText => "text",
        Shape.OfInstant => "a UTC time as YYYY-MM-DDThh:mm:ssZ",
        Shape.OfChoice choice => string.Join(" or ", choice.Words.Select(word => $"\"{word}\"")),
        Shape.OfList list => $"a list of {Count(list)}: {Of(list.Item)}",
        Shape.OfEither either => string.Join("; or ", either.Shapes.Select(Of)),
        Shape.OfBlock block => $"a block {{ ... }} ({block.Name})",
        _ => throw new ArgumentOutOfRangeException(nameof(shape)),
    };

    /// <summary>With an example, when there is one.</summary>
    public static string Of(Property property) =>
        property.Example is null ? Of(property.Shape) : $"{Of(property.Shape)}, for example {property.Example}";

    /// <summary>"above 0 W, at most 1 GW"; empty when there are none.</summary>
    public static string Limits(Shape.OfQuantity quantity)
    {
        if (quantity is { AtLeast: not null, AtMost: not null })
        {
            return $"from {quantity.AtLeast} to {quantity.AtMost}";
        }

        var low = quantity.AtLeast is not null ? $"at least {quantity.AtLeast}" : quantity.Above is not null ? $"above {quantity.Above}" : "";
        var high = quantity.AtMost is not null ? $"at most {quantity.AtMost}" : quantity.Below is not null ? $"below {quantity.Below}" : "";
        return Joined(low, high);
    }

    private static string Count(Shape.OfList list) => list.Fewest == 0 ? $"up to {list.Most}" : $"{list.Fewest} to {list.Most}";

    private static string Number(double number) => number.ToString("R", CultureInfo.InvariantCulture);

    private static string Joined(string first, string second) =>
        first.Length == 0 ? second : second.Length == 0 ? first : $"{first}, {second}";
}
