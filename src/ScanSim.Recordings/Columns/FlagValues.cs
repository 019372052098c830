using System.Text.Json;
using CsvHelper;
using Parquet;

namespace ScanSim.Recordings.Columns;

/// <summary>Yes or no: "true" and "false" in texts, one byte 1 or 0 in digests.</summary>
internal sealed class FlagValues(Column column) : PlainValues<bool>(column)
{
    public override EncodingHint Encoding => EncodingHint.Default;

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
