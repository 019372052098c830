using System.Text.Encodings.Web;
using System.Text.Json;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

/// <summary>One JSON object a line, members in the order of the columns, line feeds.</summary>
internal sealed class JsonLinesTableFile(Stream stream) : ITableFile, IDisposable
{
    // The relaxed encoder keeps '+' and letters of all scripts legible; these files are not for HTML.
    private readonly Utf8JsonWriter writer = new(
        stream,
        new JsonWriterOptions { SkipValidation = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping }
    );

    public void Write(ColumnBlock block)
    {
        for (var row = 0; row < block.Count; row++)
        {
            writer.WriteStartObject();
            foreach (var values in block.Columns)
            {
                values.WriteJson(writer, row);
            }

            writer.WriteEndObject();
            writer.Flush();
            stream.WriteByte((byte)'\n');
            writer.Reset();
        }
    }

    public void Finish() => writer.Flush();

    public void Dispose() => writer.Dispose();
}
