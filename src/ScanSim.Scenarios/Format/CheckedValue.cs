using System.Collections.Immutable;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios.Format;

/// <summary>A value of the file that fits its shape, with its place; defaults are filled in.</summary>
internal abstract record CheckedValue(JsonValue Json, string Path)
{
    internal sealed record OfQuantity(JsonValue Json, string Path, Dimension Dimension, Quantity Quantity) : CheckedValue(Json, Path);

    internal sealed record OfNumber(JsonValue Json, string Path, double Number) : CheckedValue(Json, Path);

    internal sealed record OfWhole(JsonValue Json, string Path, ulong Number) : CheckedValue(Json, Path);

    internal sealed record OfText(JsonValue Json, string Path, string Text) : CheckedValue(Json, Path);

    internal sealed record OfInstant(JsonValue Json, string Path, DateTimeOffset Instant) : CheckedValue(Json, Path);

    /// <summary>The items without faults.</summary>
    internal sealed record OfList(JsonValue Json, string Path, ImmutableArray<CheckedValue> Items) : CheckedValue(Json, Path);
}
