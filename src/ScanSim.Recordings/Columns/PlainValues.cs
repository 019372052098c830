using System.Runtime.InteropServices;
using CsvHelper;
using Parquet;
using Parquet.Schema;

namespace ScanSim.Recordings.Columns;

/// <summary>Values of a type whose every value can be stored, with their bytes in memory as their bytes in digests.</summary>
internal abstract class PlainValues<TValue>(Column column) : ColumnValues<TValue>(column)
    where TValue : unmanaged
{
    public override DataField Field => new DataField<TValue>(Column.Name, nullable: false);

    public override void Check(string table, long firstRow)
    {
        // Every value of the type can be stored.
    }

    public override void AppendTo(ColumnDigest digest) => digest.Append(MemoryMarshal.AsBytes(Values));

    public override Task WriteAsync(ParquetRowGroupWriter group, DataField field) => group.WriteAsync(field, Memory);

    public override ValueTask ReadAsync(ParquetRowGroupReader group, DataField field, int rows) => group.ReadAsync(field, Renew(rows));

    public override void WriteCsv(CsvWriter writer, int row) => writer.WriteField(this[row]);
}
