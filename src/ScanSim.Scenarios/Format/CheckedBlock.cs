using System.Collections.Immutable;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios.Format;

/// <summary>A block of the file: its properties without faults. Sound: neither it nor anything in it has a fault, so every required property is there.</summary>
internal sealed record CheckedBlock(JsonValue Json, string Path, ImmutableDictionary<string, CheckedValue> Values, bool Sound)
    : CheckedValue(Json, Path)
{
    public bool Has(string name) => Values.ContainsKey(name);

    public double Si(string name) => ((OfQuantity)Values[name]).Quantity.Si;

    /// <summary>The number before the unit, for decibel values that stay decibels inside.</summary>
    public double Written(string name) => ((OfQuantity)Values[name]).Quantity.Number;

    public double Number(string name) => ((OfNumber)Values[name]).Number;

    public ulong Whole(string name) => ((OfWhole)Values[name]).Number;

    public string Text(string name) => ((OfText)Values[name]).Text;

    public DateTimeOffset Instant(string name) => ((OfInstant)Values[name]).Instant;

    public CheckedBlock Block(string name) => (CheckedBlock)Values[name];

    public CheckedBlock? BlockOrNull(string name) => Values.GetValueOrDefault(name) as CheckedBlock;

    public ImmutableArray<CheckedValue> Items(string name) => Values.GetValueOrDefault(name) is OfList list ? list.Items : [];

    public IEnumerable<CheckedBlock> Blocks(string name) => Items(name).OfType<CheckedBlock>();
}
