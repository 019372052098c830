namespace ScanSim.Recordings.Tests;

public sealed class SummaryTests
{
    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void Rows_in_short_are_the_rows_with_fewer_columns(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        var recording = Samples.Write(folder.Recording, Samples.Rows, format, blockRows: 64);
        Assert.Equal(Samples.Rows.Looks.Select(row => LookSummary.Of(row)), recording.LookSummaries());
        Assert.Equal(Samples.Rows.Plots.Select(row => PlotSummary.Of(row)), recording.PlotSummaries());
        Assert.Equal(Samples.Rows.Truth.Select(row => TruthSummary.Of(row)), recording.TruthSummaries());
    }

    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void The_looks_of_a_target_are_its_rows_in_the_order_of_the_file(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        var recording = Samples.Write(folder.Recording, Samples.Rows, format, blockRows: 64);
        var ids = Samples.Rows.Looks.Select(row => row.Target).Distinct(StringComparer.Ordinal).ToList();
        Assert.NotEmpty(ids);
        foreach (var id in ids)
        {
            var rows = Samples.Rows.Looks.Where(row => string.Equals(row.Target, id, StringComparison.Ordinal)).ToList();
            Assert.Equal(rows, recording.LooksOf(id));
            Assert.Equal(rows.Where(row => row.TimeS is >= 0 and <= 0.1), recording.LooksOf(id, 0, 0.1));
        }

        Assert.Empty(recording.LooksOf("no such target"));
    }

    [Fact]
    public void A_table_that_was_cut_is_noticed_when_it_is_read_in_short()
    {
        using var folder = new TemporaryFolder();
        var recording = Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet, blockRows: 64);
        var path = Path.Combine(folder.Recording, "looks.parquet");
        var bytes = File.ReadAllBytes(path);
        File.WriteAllBytes(path, bytes[..(bytes.Length / 2)]);
        var fault = Assert.Throws<RecordingException>(() => recording.LookSummaries().Count());
        Assert.Contains("looks.parquet", fault.Message, StringComparison.Ordinal);
    }
}
