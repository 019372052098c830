using System.Collections.Immutable;
using ScanSim.Recordings.Columns;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings.Files;

/// <summary>Chooses the store by its format.</summary>
internal static class TableStores
{
    public static ITableFile Create(TableFormat format, Stream stream, ColumnBlock block) =>
        format switch
        {
            TableFormat.Parquet => new ParquetTableFile(stream, block),
            TableFormat.Csv => new CsvTableFile(stream, block),
            TableFormat.JsonLines => new JsonLinesTableFile(stream),
            _ => throw new ArgumentOutOfRangeException(nameof(format), format, "is no table format"),
        };

    public static ITableSource Open(TableFormat format, Stream stream, Table table, ImmutableArray<Column> columns, TimeSpanS span, long rows) =>
        format switch
        {
            TableFormat.Parquet => new ParquetTableSource(stream, columns, table.TimeColumn, span, rows),
            TableFormat.Csv => new CsvTableSource(stream, table.Columns),
            TableFormat.JsonLines => new JsonLinesTableSource(stream),
            _ => throw new ArgumentOutOfRangeException(nameof(format), format, "is no table format"),
        };
}
