using System.Collections.Immutable;

namespace ScanSim.Scenarios.Format;

/// <summary>One way to fill a group: what is required, what may stand beside it, and, with a switching property, the values that pick it.</summary>
internal sealed record PropertyVariant(ImmutableArray<string> Required, ImmutableArray<string> Optional, ImmutableArray<string> Values)
{
    public static PropertyVariant Of(params ReadOnlySpan<string> required) => new([.. required], [], []);

    public static PropertyVariant When(ImmutableArray<string> values, params ReadOnlySpan<string> required) => new([.. required], [], values);

    public IEnumerable<string> Names => Required.Concat(Optional);

    /// <summary>"'east' and 'north'".</summary>
    public string Words => string.Join(" and ", Required.Select(name => $"'{name}'"));

    public PropertyVariant With(params ReadOnlySpan<string> optional) => this with { Optional = [.. optional] };
}
