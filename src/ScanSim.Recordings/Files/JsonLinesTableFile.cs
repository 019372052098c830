using System.Buffers;
using System.Text.Encodings.Web;
using System.Text.Json;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

/// <summary>One JSON object a line, members in the order of the columns, line feeds.</summary>
internal sealed class JsonLinesTableFile : ITableFile, IDisposable
{
    private const int PortionBytes = 1 << 16;

    private readonly Stream stream;
    private readonly ArrayBufferWriter<byte> lines = new(2 * PortionBytes);
    private readonly Utf8JsonWriter writer;

    public JsonLinesTableFile(Stream stream)
    {
        this.stream = stream;

        // The relaxed encoder keeps '+' and letters of all scripts legible; these files are not for HTML.
        writer = new Utf8JsonWriter(lines, new JsonWriterOptions { SkipValidation = true, Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping });
    }

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
            EndLine();
        }
    }

    public void Finish() => HandOver();

    public void Dispose() => writer.Dispose();

    private void EndLine()
    {
        writer.Flush();
        writer.Reset();
        lines.GetSpan(1)[0] = (byte)'\n';
        lines.Advance(1);
        if (lines.WrittenCount >= PortionBytes)
        {
            HandOver();
        }
    }

    private void HandOver()
    {
        stream.Write(lines.WrittenSpan);
        lines.ResetWrittenCount();
    }
}
