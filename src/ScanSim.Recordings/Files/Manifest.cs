using System.Collections.Immutable;
using System.Text.Encodings.Web;
using System.Text.Json;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings.Files;

/// <summary>recording.json: what the recording is, and the digests by which it can be checked and compared.</summary>
internal sealed record Manifest(RecordingHead Head, ImmutableDictionary<string, TableInfo> Tables)
{
    private static readonly JsonWriterOptions Layout = new()
    {
        Indented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>Writes it beside, brings it to the disk and renames it, so that it is there whole or not at all.</summary>
    public static void Write(RecordingFolder folder, RecordingHead head, IReadOnlyDictionary<string, TableInfo> tables) =>
        FileFault.Writing(
            folder.Manifest,
            () =>
            {
                using (var stream = new FileStream(folder.ManifestPart, FileMode.Create, FileAccess.Write))
                {
                    using var writer = new Utf8JsonWriter(stream, Layout);
                    Write(writer, head, tables);
                    writer.Flush();
                    stream.WriteByte((byte)'\n');
                    stream.Flush(flushToDisk: true);
                }

                File.Move(folder.ManifestPart, folder.Manifest, overwrite: true);
            }
        );

    public static Manifest Read(RecordingFolder folder)
    {
        var text = FileFault.Reading(folder.Manifest, () => File.ReadAllBytes(folder.Manifest));
        try
        {
            return new ManifestParser(folder).Parse(text);
        }
        catch (Exception fault) when (fault is JsonException or FormatException or InvalidOperationException or KeyNotFoundException)
        {
            throw new RecordingException($"{folder.Manifest} is no manifest of a recording, or damaged: {fault.Message}", fault);
        }
    }

    private static void Write(Utf8JsonWriter writer, RecordingHead head, IReadOnlyDictionary<string, TableInfo> tables)
    {
        writer.WriteStartObject();
        writer.WriteNumber("format", RecordingTables.Format);
        writer.WriteString("program_version", head.ProgramVersion);
        writer.WriteString("scenario_name", head.ScenarioName);
        writer.WriteString("scenario_digest", head.ScenarioDigest);

        // A text: many JSON readers keep only 53 bits of a number.
        writer.WriteString("seed", head.Seed.ToString());
        writer.WriteString("start_utc", head.StartUtc.ToUniversalTime().ToString("yyyy-MM-dd'T'HH:mm:ss.FFFFFFF'Z'"));
        writer.WriteNumber("duration_s", head.DurationS);
        writer.WriteString("looks_kept", EnumTexts.Looks[(int)head.Looks]);
        writer.WriteString("table_format", EnumTexts.Format[(int)head.Format]);
        writer.WriteStartObject("tables");
        foreach (var table in RecordingTables.Of(head.Looks))
        {
            Write(writer, table, tables[table.Name]);
        }

        writer.WriteEndObject();
        writer.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter writer, Table table, TableInfo info)
    {
        writer.WriteStartObject(table.Name);
        writer.WriteString("file", info.File);
        writer.WriteNumber("rows", info.Rows);
        writer.WriteNumber("bytes", info.Bytes);
        writer.WriteString("digest", info.Digest);
        writer.WriteStartArray("columns");
        foreach (var column in table.Columns)
        {
            writer.WriteStartObject();
            writer.WriteString("name", column.Name);
            writer.WriteString("type", column.Type);
            if (column.Unit is { } unit)
            {
                writer.WriteString("unit", unit);
            }

            writer.WriteString("digest", info.ColumnDigests[column.Name]);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        writer.WriteEndObject();
    }
}
