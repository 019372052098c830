using System.Globalization;
using System.Text.Json;
using CsvHelper;
using Parquet;

namespace ScanSim.Recordings.Columns;

/// <summary>Whole numbers of 32 bits.</summary>
internal sealed class CountValues(Column column) : PlainValues<int>(column)
{
    public override EncodingHint Encoding => EncodingHint.DeltaBinaryPacked;

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
