namespace ScanSim.Engine;

/// <summary>A look in 64 bits that sort by range cell, then by the order in which looks were found (that of the targets).</summary>
internal static class CellKey
{
    private const int CellShift = 32;

    public static ulong Of(int cell, int index, bool detected) => ((ulong)cell << CellShift) | ((ulong)(uint)index << 1) | (detected ? 1u : 0u);

    public static int Index(ulong key) => (int)((uint)key >> 1);

    /// <summary>Whether the look was detected with its cell to itself.</summary>
    public static bool Detected(ulong key) => (key & 1) != 0;

    public static bool SameCell(ulong a, ulong b) => a >> CellShift == b >> CellShift;
}
