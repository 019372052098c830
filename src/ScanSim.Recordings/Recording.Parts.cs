namespace ScanSim.Recordings;

public sealed partial class Recording
{
    /// <summary>The looks of one target.</summary>
    public IEnumerable<LookRow> LooksOf(string target, double fromS = double.NegativeInfinity, double toS = double.PositiveInfinity) =>
        Looks(fromS, toS).Where(row => string.Equals(row.Target, target, StringComparison.Ordinal));
}
