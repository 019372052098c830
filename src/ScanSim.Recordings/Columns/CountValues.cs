using System.Globalization;
using System.Runtime.InteropServices;
using System.Text.Json;
using CsvHelper;
using Parquet;
using Parquet.Schema;

namespace ScanSim.Recordings.Columns;

/// <summary>Whole numbers of 32 bits.</summary>
internal sealed class CountValues(Column column) : ColumnValues<int>(column)
{
    public override DataField Field => new DataField<int>(Column.Name, nullable: false);

    public override EncodingHint Encoding => EncodingHint.DeltaBinaryPacked;

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
            int.TryParse(field, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out var value)
                ? value
                : throw new FormatException($"\"{System.Text.Encoding.UTF8.GetString(field)}\" is not a whole number")
        );
    }

    public override void WriteJson(Utf8JsonWriter writer, int row) => writer.WriteNumber(Column.JsonName, this[row]);

    public override void ReadJson(ref Utf8JsonReader reader) => Append(reader.GetInt32());
}
