using ScanSim.Recordings.Columns;
using ScanSim.Recordings.Files;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings;

/// <summary>A finished recording, read back. Every fault in its files comes out as a <see cref="RecordingException"/>.</summary>
/// <remarks>
/// Rows are read while they are enumerated, in the order of the file, block by block. Enumerations are independent of each other. A table
/// is compared with the row count of the manifest when it is read to its end without a time span.
/// </remarks>
public sealed partial class Recording
{
    private readonly RecordingFolder folder;

    private Recording(RecordingFolder folder, Manifest manifest, string scenarioText)
    {
        this.folder = folder;
        Head = manifest.Head with { ScenarioText = scenarioText };
        Tables = manifest.Tables;
    }

    public RecordingHead Head { get; }

    /// <summary>The tables by name; without looks if none were kept.</summary>
    public IReadOnlyDictionary<string, TableInfo> Tables { get; }

    /// <summary>Text of scenario.json.</summary>
    public string ScenarioText => Head.ScenarioText;

    public static Recording Open(string folder)
    {
        var files = new RecordingFolder(folder);
        RequireManifest(files);
        var manifest = Manifest.Read(files);
        foreach (var table in manifest.Tables.Values)
        {
            RequireLength(files.In(table.File), table.Bytes);
        }

        return new Recording(files, manifest, FileFault.Reading(files.Scenario, () => File.ReadAllText(files.Scenario)));
    }

    public IEnumerable<ScanRow> Scans() => Rows(RecordingTables.Scans, TimeSpanS.Everything);

    /// <summary>Looks with a time from <paramref name="fromS"/> to <paramref name="toS"/>, both included; none if none were kept.</summary>
    public IEnumerable<LookRow> Looks(double fromS = double.NegativeInfinity, double toS = double.PositiveInfinity) =>
        Head.Looks == LooksKept.None ? [] : Rows(RecordingTables.Looks, new TimeSpanS(fromS, toS));

    /// <inheritdoc cref="Looks"/>
    public IEnumerable<HitRow> Hits(double fromS = double.NegativeInfinity, double toS = double.PositiveInfinity) =>
        Rows(RecordingTables.Hits, new TimeSpanS(fromS, toS));

    /// <inheritdoc cref="Looks"/>
    public IEnumerable<PlotRow> Plots(double fromS = double.NegativeInfinity, double toS = double.PositiveInfinity) =>
        Rows(RecordingTables.Plots, new TimeSpanS(fromS, toS));

    /// <inheritdoc cref="Looks"/>
    public IEnumerable<TruthRow> Truth(double fromS = double.NegativeInfinity, double toS = double.PositiveInfinity) =>
        Rows(RecordingTables.Truth, new TimeSpanS(fromS, toS));

    /// <summary>Reads everything and compares row counts and digests with the manifest; the first table that differs is an exception.</summary>
    public void Verify()
    {
        foreach (var table in RecordingTables.Of(Head.Looks))
        {
            Verify(table);
        }
    }

    private static void RequireManifest(RecordingFolder files)
    {
        if (File.Exists(files.Manifest))
        {
            return;
        }

        throw new RecordingException(
            File.Exists(files.ManifestPart) ? $"{files.Path} is an unfinished recording: the run was interrupted or is still going on; run the scenario again"
            : Directory.Exists(files.Path) ? $"{files.Path} is no recording: there is no recording.json in it"
            : File.Exists(files.Path) ? $"{files.Path} is a file; a recording is a folder with recording.json in it"
            : $"{files.Path}: there is no such folder"
        );
    }

    private static void RequireLength(string path, long bytes)
    {
        var file = new FileInfo(path);
        if (!file.Exists)
        {
            throw new RecordingException($"{path} is missing, recording.json names it");
        }

        if (file.Length != bytes)
        {
            throw new RecordingException($"{path} has {file.Length} bytes, recording.json says {bytes}: the file was cut or changed");
        }
    }

    private IEnumerable<TRow> Rows<TRow>(Table<TRow> table, TimeSpanS span)
    {
        using var reader = new TableReader(folder.In(Tables[table.Name].File), table, Head.Format, Tables[table.Name].Rows, span);
        while (reader.Next() is { } block)
        {
            for (var row = 0; row < block.Count; row++)
            {
                if (reader.IsWithin(block, row))
                {
                    yield return reader.Build(table, block, row);
                }
            }
        }
    }

    private void Verify(Table table)
    {
        var info = Tables[table.Name];
        var path = folder.In(info.File);
        using var digest = new TableDigest(table.Columns);
        using var reader = new TableReader(path, table, Head.Format, info.Rows, TimeSpanS.Everything);
        while (reader.Next() is { } block)
        {
            digest.Append(block);
        }

        var found = digest.ByColumn();
        var changed = table.Columns.Select(column => column.Name).Where(name => !string.Equals(found[name], info.ColumnDigests[name], StringComparison.Ordinal));
        var names = string.Join(", ", changed);
        if (names.Length > 0 || !string.Equals(digest.Whole(), info.Digest, StringComparison.Ordinal))
        {
            throw new RecordingException($"{path} is not what the run wrote: the digest differs for {(names.Length > 0 ? names : "the table")}");
        }
    }
}
