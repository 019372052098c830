using System.Runtime.InteropServices;
using System.Text.Json;
using CsvHelper;
using Parquet;
using Parquet.Schema;

namespace ScanSim.Recordings.Columns;

/// <summary>Doubles. Infinities are values (a cell that is wholly eclipsed has −∞ dB); NaN is a fault of the program.</summary>
internal sealed class NumberValues(Column column) : ColumnValues<double>(column)
{
    public override DataField Field => new DataField<double>(Column.Name, nullable: false);

    /// <summary>Plain for times: the library (6.1.0) writes least and greatest value, by which a span is found, with plain doubles only.</summary>
    public override EncodingHint Encoding => Column.IsTime ? EncodingHint.Default : EncodingHint.ByteSplitStream;

    public override void Check(string table, long firstRow)
    {
        var numbers = Values;
        for (var i = 0; i < numbers.Length; i++)
        {
            if (double.IsNaN(numbers[i]))
            {
                throw Refusal(table, firstRow + i, "is not a number");
            }
        }
    }

    public override void AppendTo(ColumnDigest digest) => digest.Append(MemoryMarshal.AsBytes(Values));

    public override Task WriteAsync(ParquetRowGroupWriter group, DataField field) => group.WriteAsync(field, Memory);

    public override ValueTask ReadAsync(ParquetRowGroupReader group, DataField field, int rows) => group.ReadAsync(field, Renew(rows));

    public override void WriteCsv(CsvWriter writer, int row) => writer.WriteField(this[row]);

    public override void ReadCsv(CsvReader reader) => Append(NumberText.Parse(reader.GetSpan(Column.Index)));

    public override void WriteJson(Utf8JsonWriter writer, int row)
    {
        writer.WritePropertyName(Column.JsonName);
        NumberText.WriteJson(writer, this[row]);
    }

    public override void ReadJson(ref Utf8JsonReader reader) => Append(NumberText.ReadJson(ref reader));
}
