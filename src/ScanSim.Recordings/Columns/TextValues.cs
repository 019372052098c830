using System.Text.Json;
using CsvHelper;
using Parquet;
using Parquet.Schema;

namespace ScanSim.Recordings.Columns;

/// <summary>Texts, never null. Rows share few distinct ones (target ids, reasons), so the array holds references only.</summary>
internal sealed class TextValues(Column column) : ColumnValues<string>(column)
{
    public override DataField Field => new DataField<string>(Column.Name, nullable: false);

    public override EncodingHint Encoding => EncodingHint.Dictionary;

    /// <summary>Characters held, to bound the bytes of a row group when ids are long.</summary>
    public long Characters(int fromRow)
    {
        long characters = 0;
        foreach (var text in Values[fromRow..])
        {
            characters += text?.Length ?? 0;
        }

        return characters;
    }

    public override void Check(string table, long firstRow)
    {
        var texts = Values;
        for (var i = 0; i < texts.Length; i++)
        {
            if (texts[i] is null)
            {
                throw Refusal(table, firstRow + i, "is null");
            }
        }
    }

    public override void AppendTo(ColumnDigest digest)
    {
        foreach (var text in Values)
        {
            digest.Append(text);
        }
    }

    public override Task WriteAsync(ParquetRowGroupWriter group, DataField field) => group.WriteAsync(field, Segment);

    public override ValueTask ReadAsync(ParquetRowGroupReader group, DataField field, int rows) => group.ReadAsync(field, Renew(rows)!);

    public override void WriteCsv(CsvWriter writer, int row) => writer.WriteField(this[row]);

    public override void ReadCsv(CsvReader reader) => Append(reader.GetString(Column.Index));

    public override void WriteJson(Utf8JsonWriter writer, int row) => writer.WriteString(Column.JsonName, this[row]);

    public override void ReadJson(ref Utf8JsonReader reader) =>
        Append(reader.GetString() ?? throw new FormatException("null stands where a text is needed"));
}
