using System.Collections.Immutable;
using Parquet;
using Parquet.Schema;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

/// <summary>Reads row group by row group, and leaves out the groups whose times lie outside the span.</summary>
internal sealed class ParquetTableSource : ITableSource
{
    private readonly ParquetReader reader;
    private readonly ImmutableArray<(int Column, DataField Field)> fields;
    private readonly DataField? timeField;
    private readonly Column? time;
    private readonly TimeSpanS span;
    private readonly long mostRows;
    private int next;

    /// <summary>Opens the file and finds its columns.</summary>
    /// <param name="stream">The file, seekable.</param>
    /// <param name="columns">The columns to read; the file must have them.</param>
    /// <param name="timeColumn">The one whose statistics are compared with <paramref name="span"/>.</param>
    /// <param name="span">Times wanted.</param>
    /// <param name="mostRows">No row group may claim more rows than this: a broken footer shall not ask for all memory.</param>
    public ParquetTableSource(Stream stream, ImmutableArray<Column> columns, Column? timeColumn, TimeSpanS span, long mostRows)
    {
        reader = ParquetReader.CreateAsync(stream, leaveStreamOpen: true).GetAwaiter().GetResult();
        fields = [.. columns.Select(column => (column.Index, Find(column)))];
        time = timeColumn;
        timeField = timeColumn is null ? null : Find(timeColumn);
        this.span = span;
        this.mostRows = mostRows;
    }

    /// <summary>Row groups read so far, for tests of what is skipped.</summary>
    public int GroupsRead { get; private set; }

    public bool Read(ColumnBlock block)
    {
        while (next < reader.RowGroupCount)
        {
            using var group = reader.OpenRowGroupReader(next++);
            if (IsWanted(group))
            {
                Read(group, block);
                return true;
            }
        }

        return false;
    }

    public void Dispose() => reader.DisposeAsync().AsTask().GetAwaiter().GetResult();

    private void Read(ParquetRowGroupReader group, ColumnBlock block)
    {
        if (group.RowCount < 0 || group.RowCount > mostRows)
        {
            throw new FormatException($"a row group claims {group.RowCount} rows, the table has {mostRows}");
        }

        foreach (var (column, field) in fields)
        {
            block[column].ReadAsync(group, field, (int)group.RowCount).AsTask().GetAwaiter().GetResult();
        }

        if (StatedTimes(group) is { } stated)
        {
            Check(stated, (ColumnValues<double>)block[time!.Index]);
        }

        GroupsRead++;
    }

    /// <summary>Times outside the stated ones would be missed when a span is read, so they are a fault even where they do no harm.</summary>
    private static void Check(TimeSpanS stated, ColumnValues<double> times)
    {
        for (var row = 0; row < times.Count; row++)
        {
            if (!stated.Contains(times[row]))
            {
                throw new FormatException($"a row group states times from {stated.FromS} to {stated.ToS} s and holds {times[row]} s");
            }
        }
    }

    private bool IsWanted(ParquetRowGroupReader group) =>
        span.IsEverything || StatedTimes(group) is not { } stated || span.Overlaps(stated.FromS, stated.ToS);

    private TimeSpanS? StatedTimes(ParquetRowGroupReader group) =>
        timeField is not null && group.GetStatistics(timeField) is { MinValue: double first, MaxValue: double last }
            ? new TimeSpanS(first, last)
            : null;

    private DataField Find(Column column)
    {
        var expected = column.CreateValues().Field;
        var found = reader.Schema.DataFields.FirstOrDefault(field => string.Equals(field.Name, column.Name, StringComparison.Ordinal));
        return found is not null && found.ClrType == expected.ClrType && found.IsNullable == expected.IsNullable && !found.IsArray
            ? found
            : throw new FormatException($"column {column.Name} of type {column.Type} is missing");
    }
}
