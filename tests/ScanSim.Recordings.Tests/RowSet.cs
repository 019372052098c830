namespace ScanSim.Recordings.Tests;

/// <summary>All rows of a small recording.</summary>
internal sealed record RowSet(ScanRow[] Scans, LookRow[] Looks, HitRow[] Hits, PlotRow[] Plots, TruthRow[] Truth)
{
    public static RowSet Of(Recording recording) =>
        new([.. recording.Scans()], [.. recording.Looks()], [.. recording.Hits()], [.. recording.Plots()], [.. recording.Truth()]);

    public void AddTo(IRecordingSink sink)
    {
        foreach (var scan in Scans)
        {
            sink.AddScan(scan);
        }

        sink.AddLooks(Looks);
        sink.AddHits(Hits);
        sink.AddPlots(Plots);
        sink.AddTruth(Truth);
    }

    /// <summary>By the bits of the numbers: −0 is not 0 here.</summary>
    public bool HasSameBits(RowSet other) =>
        Same(Scans, other.Scans) && Same(Looks, other.Looks) && Same(Hits, other.Hits) && Same(Plots, other.Plots) && Same(Truth, other.Truth);

    private static bool Same<TRow>(TRow[] rows, TRow[] others) => rows.Select(Bits).SequenceEqual(others.Select(Bits), StringComparer.Ordinal);

    private static string Bits<TRow>(TRow row) =>
        string.Join('\u0001', typeof(TRow).GetProperties().Select(property => property.GetValue(row)).Select(value =>
            value is double number ? BitConverter.DoubleToInt64Bits(number).ToString("x16") : value?.ToString() ?? "\u0002"));
}
