using System.Text.Json;
using CsvHelper;
using Parquet;
using Parquet.Schema;

namespace ScanSim.Recordings.Columns;

/// <summary>Doubles, some of which may be missing: null in Parquet and JSON, an empty field in CSV.</summary>
internal sealed class NumberOrNullValues(Column column) : ColumnValues<double?>(column)
{
    public override DataField Field => new DataField<double?>(Column.Name, nullable: true);

    public override EncodingHint Encoding => EncodingHint.ByteSplitStream;

    public override void Check(string table, long firstRow)
    {
        var numbers = Values;
        for (var i = 0; i < numbers.Length; i++)
        {
            if (double.IsNaN(numbers[i].GetValueOrDefault()))
            {
                throw Refusal(table, firstRow + i, "is not a number");
            }
        }
    }

    public override void AppendTo(ColumnDigest digest)
    {
        foreach (var number in Values)
        {
            digest.Append(number);
        }
    }

    public override Task WriteAsync(ParquetRowGroupWriter group, DataField field) => group.WriteAsync(field, Memory);

    public override ValueTask ReadAsync(ParquetRowGroupReader group, DataField field, int rows) => group.ReadAsync(field, Renew(rows));

    public override void WriteCsv(CsvWriter writer, int row) => writer.WriteField(this[row]);

    public override void ReadCsv(CsvReader reader)
    {
        var field = reader.GetSpan(Column.Index);
        Append(field.IsEmpty ? null : NumberText.Parse(field));
    }

    public override void WriteJson(Utf8JsonWriter writer, int row)
    {
        writer.WritePropertyName(Column.JsonName);
        if (this[row] is { } number)
        {
            NumberText.WriteJson(writer, number);
        }
        else
        {
            writer.WriteNullValue();
        }
    }

    public override void ReadJson(ref Utf8JsonReader reader) =>
        Append(reader.TokenType == JsonTokenType.Null ? null : NumberText.ReadJson(ref reader));
}
