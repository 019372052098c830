using System.Text.Json;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

internal sealed class JsonLinesTableSource(Stream stream) : ITableSource
{
    private const int BlockRows = 4096;

    private readonly Utf8Lines lines = new(stream);

    public bool Read(ColumnBlock block)
    {
        while (block.Count < BlockRows && lines.Next(out var line))
        {
            try
            {
                ReadLine(line, block);
            }
            catch (Exception fault) when (fault is FormatException or InvalidOperationException or JsonException)
            {
                throw new FormatException($"line {lines.LineNumber}: {fault.Message}", fault);
            }
        }

        return block.Count > 0;
    }

    public void Dispose()
    {
        // The stream is the caller's.
    }

    private static void ReadLine(ReadOnlySpan<byte> line, ColumnBlock block)
    {
        var reader = new Utf8JsonReader(line);
        Expect(reader.Read() && reader.TokenType == JsonTokenType.StartObject, "is no JSON object");
        foreach (var values in block.Columns)
        {
            reader.Read();
            if (reader.TokenType != JsonTokenType.PropertyName || !reader.ValueTextEquals(values.Column.JsonName.EncodedUtf8Bytes))
            {
                throw new FormatException($"{values.Column.Name} is missing in its place");
            }

            reader.Read();
            values.ReadJson(ref reader);
        }

        Expect(reader.Read() && reader.TokenType == JsonTokenType.EndObject && !reader.Read(), "has more than the columns of the table");
    }

    private static void Expect(bool holds, string otherwise)
    {
        if (!holds)
        {
            throw new FormatException(otherwise);
        }
    }
}
