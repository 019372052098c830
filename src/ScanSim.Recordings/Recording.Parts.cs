using System.Collections.Immutable;
using ScanSim.Recordings.Columns;
using ScanSim.Recordings.Files;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings;

/// <content>Parts of tables: some columns of all rows, or the rows of one target. Of a Parquet file only those columns are read.</content>
public sealed partial class Recording
{
    /// <summary>All looks in short; none if none were kept.</summary>
    public IEnumerable<LookSummary> LookSummaries() =>
        Head.Looks == LooksKept.None ? [] : Summaries(RecordingTables.Looks, RecordingTables.Looks.SummaryColumns, RecordingTables.Looks.Summary);

    /// <summary>All plots in short.</summary>
    public IEnumerable<PlotSummary> PlotSummaries() =>
        Summaries(RecordingTables.Plots, RecordingTables.Plots.SummaryColumns, RecordingTables.Plots.Summary);

    /// <summary>All truth in short.</summary>
    public IEnumerable<TruthSummary> TruthSummaries() =>
        Summaries(RecordingTables.Truth, RecordingTables.Truth.SummaryColumns, RecordingTables.Truth.Summary);

    /// <summary>The looks of one target, in the order of the file; none if none were kept.</summary>
    public IEnumerable<LookRow> LooksOf(string target, double fromS = double.NegativeInfinity, double toS = double.PositiveInfinity)
    {
        if (Head.Looks == LooksKept.None)
        {
            yield break;
        }

        var table = RecordingTables.Looks;
        using var reader = new TableReader(folder.In(Tables[table.Name].File), table, Head.Format, Tables[table.Name].Rows, new TimeSpanS(fromS, toS));
        while (reader.Next() is { } block)
        {
            for (var row = 0; row < block.Count; row++)
            {
                if (table.IsOf(target, block, row) && reader.IsWithin(block, row))
                {
                    yield return reader.Build(table, block, row);
                }
            }
        }
    }

    private IEnumerable<TSummary> Summaries<TSummary>(Table table, ImmutableArray<Column> columns, Func<ColumnBlock, int, TSummary> summary)
    {
        var path = folder.In(Tables[table.Name].File);
        using var reader = new TableReader(path, table, Head.Format, Tables[table.Name].Rows, TimeSpanS.Everything, columns);
        while (reader.Next() is { } block)
        {
            for (var row = 0; row < block.Count; row++)
            {
                yield return reader.Build(summary, block, row);
            }
        }
    }
}
