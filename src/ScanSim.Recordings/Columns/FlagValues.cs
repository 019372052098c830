using System.Runtime.InteropServices;
using System.Text.Json;
using CsvHelper;
using Parquet;
using Parquet.Schema;

namespace ScanSim.Recordings.Columns;

/// <summary>Yes or no: "true" and "false" in texts, one byte 1 or 0 in digests.</summary>
internal sealed class FlagValues(Column column) : ColumnValues<bool>(column)
{
    public override DataField Field => new DataField<bool>(Column.Name, nullable: false);

    public override EncodingHint Encoding => EncodingHint.Default;

    public override void Check(string table, long firstRow)
    {
        // Every value of the type can be stored.
    }

    public override void AppendTo(ColumnDigest digest) => digest.Append(MemoryMarshal.AsBytes(Values));

    public override Task WriteAsync(ParquetRowGroupWriter group, DataField field) => group.WriteAsync(field, Memory);

    public override ValueTask ReadAsync(ParquetRowGroupReader group, DataField field, int rows) => group.ReadAsync(field, Renew(rows));

    public override void WriteCsv(CsvWriter writer, int row) => writer.WriteField(this[row]);

    public override void ReadCsv(CsvReader reader)
    {
        var field = reader.GetSpan(Column.Index);
        Append(
            field.SequenceEqual("true"u8) || (field.SequenceEqual("false"u8)
                ? false
                : throw new FormatException($"\"{System.Text.Encoding.UTF8.GetString(field)}\" is neither true nor false"))
        );
    }

    public override void WriteJson(Utf8JsonWriter writer, int row) => writer.WriteBoolean(Column.JsonName, this[row]);

    public override void ReadJson(ref Utf8JsonReader reader) => Append(reader.GetBoolean());
}
