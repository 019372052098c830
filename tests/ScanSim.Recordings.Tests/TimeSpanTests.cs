using ScanSim.Recordings.Files;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings.Tests;

public sealed class TimeSpanTests
{
    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void A_span_gives_the_rows_within_it_in_the_order_of_the_file(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        var recording = Samples.Write(folder.Recording, Samples.Rows, format, blockRows: 64);
        foreach (var (from, to) in new[] { (-1e5, 1e5), (0.0, 0.1), (double.NegativeInfinity, 0.0), (0.1, double.PositiveInfinity), (2.0, 1.0) })
        {
            Assert.Equal(Samples.Rows.Looks.Where(row => row.TimeS >= from && row.TimeS <= to), recording.Looks(from, to));
            Assert.Equal(Samples.Rows.Hits.Where(row => row.TimeS >= from && row.TimeS <= to), recording.Hits(from, to));
            Assert.Equal(Samples.Rows.Plots.Where(row => row.TimeS >= from && row.TimeS <= to), recording.Plots(from, to));
            Assert.Equal(Samples.Rows.Truth.Where(row => row.TimeS >= from && row.TimeS <= to), recording.Truth(from, to));
        }
    }

    [Fact]
    public void Row_groups_outside_the_span_are_not_read()
    {
        using var folder = new TemporaryFolder();
        var plots = Enumerable.Range(0, 1000).Select(i => Samples.Rows.Plots[0] with { TimeS = i }).ToArray();
        Samples.Write(folder.Recording, Samples.Rows with { Plots = plots }, TableFormat.Parquet, blockRows: 100);
        using var stream = File.OpenRead(Path.Combine(folder.Recording, "plots.parquet"));
        using var source = new ParquetTableSource(stream, RecordingTables.Plots.Columns, RecordingTables.Plots.TimeColumn, new TimeSpanS(199.5, 300), 1000);
        var block = RecordingTables.Plots.CreateBlock();
        while (source.Read(block))
        {
            block.Clear();
        }

        Assert.Equal(2, source.GroupsRead);
    }
}
