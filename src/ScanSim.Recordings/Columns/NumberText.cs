using System.Globalization;
using System.Text;
using System.Text.Json;

namespace ScanSim.Recordings.Columns;

/// <summary>Doubles as text that reads back to the same bits. JSON has no infinities: there they are the texts "Infinity" and "-Infinity".</summary>
internal static class NumberText
{
    public static double Parse(ReadOnlySpan<byte> utf8) =>
        double.TryParse(utf8, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && !double.IsNaN(value)
            ? value
            : throw new FormatException($"\"{Encoding.UTF8.GetString(utf8)}\" is not a number");

    public static void WriteJson(Utf8JsonWriter writer, double value)
    {
        if (double.IsFinite(value))
        {
            writer.WriteNumberValue(value);
        }
        else
        {
            writer.WriteStringValue(value > 0 ? "Infinity"u8 : "-Infinity"u8);
        }
    }

    public static double ReadJson(ref Utf8JsonReader reader)
    {
        if (reader.TokenType != JsonTokenType.String)
        {
            return reader.GetDouble();
        }

        return reader.ValueTextEquals("Infinity"u8) ? double.PositiveInfinity
            : reader.ValueTextEquals("-Infinity"u8) ? double.NegativeInfinity
            : throw new FormatException($"\"{reader.GetString()}\" is not a number");
    }
}
