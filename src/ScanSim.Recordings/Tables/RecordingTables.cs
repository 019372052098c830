using System.Collections.Immutable;

namespace ScanSim.Recordings.Tables;

/// <summary>The tables of a recording of format <see cref="Format"/>.</summary>
internal static class RecordingTables
{
    /// <summary>Version of tables and manifest together; it changes when a reader of the old one would go wrong.</summary>
    public const int Format = 1;

    public static readonly ScanTable Scans = new();

    public static readonly LookTable Looks = new();

    public static readonly HitTable Hits = new();

    public static readonly PlotTable Plots = new();

    public static readonly TruthTable Truth = new();

    public static readonly ImmutableArray<Table> All = [Scans, Looks, Hits, Plots, Truth];

    public static IEnumerable<Table> Of(LooksKept looks) => looks == LooksKept.None ? All.Where(table => table != Looks) : All;
}
