using System.Collections.Immutable;

namespace ScanSim.Scenarios.Format;

/// <summary>Exactly one of the variants must be there: the one that the value of the switching property picks, or, without such, the one whose required properties are there.</summary>
internal sealed record PropertyGroup(string? SwitchedBy, ImmutableArray<PropertyVariant> Variants)
{
    public static PropertyGroup ExactlyOne(params ReadOnlySpan<PropertyVariant> variants) => new(null, [.. variants]);

    public static PropertyGroup ByValueOf(string property, params ReadOnlySpan<PropertyVariant> variants) => new(property, [.. variants]);

    public IEnumerable<string> AllNames => Variants.SelectMany(variant => variant.Names).Distinct(StringComparer.Ordinal);

    /// <summary>"'rotation'; or 'sector'".</summary>
    public string Words => string.Join(", or ", Variants.Select(variant => variant.Words));
}
