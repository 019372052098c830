using System.Collections.Immutable;
using System.Globalization;
using System.Text.Json;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings.Files;

/// <summary>Reads a manifest; what does not belong in one comes out as an exception of the JSON reader or a FormatException.</summary>
internal sealed class ManifestParser(RecordingFolder folder)
{
    public Manifest Parse(byte[] text)
    {
        using var document = JsonDocument.Parse(text);
        var root = document.RootElement;
        var format = root.GetProperty("format").GetInt32();
        if (format != RecordingTables.Format)
        {
            throw new RecordingException(
                $"{folder.Manifest} has format {format}, this program reads format {RecordingTables.Format}; use the version that wrote it or a newer one"
            );
        }

        var head = Head(root);
        return new Manifest(head, Tables(root.GetProperty("tables"), head));
    }

    private static RecordingHead Head(JsonElement root) =>
        new()
        {
            ProgramVersion = Text(root, "program_version"),
            ScenarioName = Text(root, "scenario_name"),
            ScenarioDigest = Text(root, "scenario_digest"),
            ScenarioText = "",
            Seed = Seed(Text(root, "seed")),
            StartUtc = StartUtc(Text(root, "start_utc")),
            DurationS = root.GetProperty("duration_s").GetDouble(),
            Looks = EnumTexts.Looks.Parse(Text(root, "looks_kept")),
            Format = EnumTexts.Format.Parse(Text(root, "table_format")),
        };

    private static ImmutableDictionary<string, TableInfo> Tables(JsonElement tables, RecordingHead head) =>
        RecordingTables
            .Of(head.Looks)
            .ToImmutableDictionary(table => table.Name, table => Info(tables.GetProperty(table.Name), table, head.Format), StringComparer.Ordinal);

    private static TableInfo Info(JsonElement element, Table table, TableFormat format)
    {
        var info = new TableInfo
        {
            File = Text(element, "file"),
            Rows = element.GetProperty("rows").GetInt64(),
            Bytes = element.GetProperty("bytes").GetInt64(),
            Digest = Text(element, "digest"),
            ColumnDigests = Columns(element.GetProperty("columns"), table),
        };
        var expected = RecordingFolder.TableName(table, format);
        return string.Equals(info.File, expected, StringComparison.Ordinal)
            ? info
            : throw new FormatException($"table {table.Name} names the file \"{info.File}\", expected \"{expected}\"");
    }

    private static ImmutableDictionary<string, string> Columns(JsonElement columns, Table table)
    {
        var found = columns.EnumerateArray().Select(column => (Name: Text(column, "name"), Type: Text(column, "type"), Digest: Text(column, "digest"))).ToArray();
        return found.Select(column => (column.Name, column.Type)).SequenceEqual(table.Columns.Select(column => (column.Name, column.Type)))
            ? found.ToImmutableDictionary(column => column.Name, column => column.Digest, StringComparer.Ordinal)
            : throw new FormatException($"the columns of {table.Name} are not those of format {RecordingTables.Format}");
    }

    private static ulong Seed(string text) =>
        ulong.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var seed)
            ? seed
            : throw new FormatException($"seed is \"{text}\", expected a whole number up to {ulong.MaxValue}");

    private static DateTimeOffset StartUtc(string text) =>
        DateTimeOffset.TryParse(text, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal, out var start)
            ? start
            : throw new FormatException($"start_utc is \"{text}\", expected a time like 2026-05-01T06:00:00Z");

    private static string Text(JsonElement element, string name) =>
        element.GetProperty(name).GetString() ?? throw new FormatException($"{name} is null");
}
