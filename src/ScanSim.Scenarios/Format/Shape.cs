using System.Collections.Immutable;

namespace ScanSim.Scenarios.Format;

/// <summary>What may stand in one place of a scenario file. The checking, the JSON Schema and the reference page are all made from it.</summary>
internal abstract record Shape
{
    private Shape()
    {
    }

    /// <summary>A number with its unit in one text; limits are written like the file's own values.</summary>
    internal sealed record OfQuantity(Dimension Dimension) : Shape
    {
        public string? AtLeast { get; init; }

        public string? Above { get; init; }

        public string? AtMost { get; init; }

        public string? Below { get; init; }
    }

    /// <summary>A number without dimension.</summary>
    internal sealed record OfNumber(double AtLeast, double AtMost) : Shape;

    internal sealed record OfWhole(ulong AtLeast, ulong AtMost) : Shape;

    /// <summary>Free text of 1 to <paramref name="LongestCharacters"/>; the pattern is a regular expression for the whole.</summary>
    internal sealed record OfText(int LongestCharacters, string Pattern, string PatternWords) : Shape;

    /// <summary>A text that is allowed and not used.</summary>
    internal sealed record OfIgnoredText : Shape;

    /// <summary>A moment in UTC.</summary>
    internal sealed record OfInstant : Shape;

    internal sealed record OfChoice(ImmutableArray<string> Words) : Shape;

    internal sealed record OfList(Shape Item, int Fewest, int Most) : Shape;

    /// <summary>One of several shapes that the reader can tell apart.</summary>
    internal sealed record OfEither(ImmutableArray<Shape> Shapes) : Shape;

    internal sealed record OfBlock(string Name, string Description, ImmutableArray<Property> Properties) : Shape
    {
        public ImmutableArray<PropertyGroup> Groups { get; init; } = [];

        public Property? Find(string name) => Properties.FirstOrDefault(property => string.Equals(property.Name, name, StringComparison.Ordinal));
    }
}
