using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings.Files;

/// <summary>Names of the files in a recording's folder, and the rules for writing into one that exists.</summary>
/// <remarks>
/// While a run goes on, recording.json.part marks the folder as ours, and the tables are under names ending in .part too, so that no
/// other program takes half a table for a whole one.
/// </remarks>
internal sealed class RecordingFolder(string path)
{
    private const string Part = ".part";
    private const string ManifestName = "recording.json";
    private const string ScenarioName = "scenario.json";

    public string Path { get; } = path;

    public string Manifest => In(ManifestName);

    public string ManifestPart => In(ManifestName + Part);

    public string Scenario => In(ScenarioName);

    public static string TableName(Table table, TableFormat format) => $"{table.Name}.{EnumTexts.Format[(int)format]}";

    public string In(string file) => System.IO.Path.Combine(Path, file);

    public static string PartOf(string file) => file + Part;

    /// <summary>Makes the folder, or with <paramref name="force"/> clears the one that is there, and leaves the mark of an unfinished recording in it.</summary>
    public void Prepare(bool force)
    {
        if (File.Exists(Path))
        {
            throw new RecordingException($"{Path} is a file; a recording needs a folder of its own");
        }

        if (!Directory.Exists(Path))
        {
            Make();
        }
        else if (force)
        {
            Clear();
        }
        else
        {
            throw new RecordingException($"{Path} exists already; choose another folder, or use --force to replace the recording in it");
        }
    }

    /// <summary>Deletes the tables of a recording that will not be completed; the mark stays.</summary>
    public void DropParts()
    {
        foreach (var file in OwnNames().Where(name => name.EndsWith(Part, StringComparison.Ordinal)).Select(In))
        {
            if (!string.Equals(file, ManifestPart, StringComparison.Ordinal))
            {
                File.Delete(file);
            }
        }
    }

    private static IEnumerable<string> OwnNames()
    {
        var tables = RecordingTables.All.SelectMany(table => Enum.GetValues<TableFormat>().Select(format => TableName(table, format)));
        return tables.Append(ScenarioName).Append(ManifestName).SelectMany(name => new[] { name, name + Part });
    }

    private void Make()
    {
        var parent = Parent();
        if (!Directory.Exists(parent))
        {
            throw new RecordingException($"{Path} cannot be made: there is no folder {parent}");
        }

        FileFault.Writing(Path, () => Directory.CreateDirectory(Path));
        Mark();
    }

    /// <summary>The folder above, also where the path ends in a separator.</summary>
    private string? Parent()
    {
        try
        {
            return System.IO.Path.GetDirectoryName(System.IO.Path.TrimEndingDirectorySeparator(System.IO.Path.GetFullPath(Path)));
        }
        catch (ArgumentException fault)
        {
            throw new RecordingException($"\"{Path}\" is no path of a folder: {fault.Message}", fault);
        }
    }

    private void Clear()
    {
        var found = FileFault.Reading(Path, () => Directory.GetFileSystemEntries(Path).Select(entry => System.IO.Path.GetFileName(entry)).ToArray());
        if (found.Length > 0)
        {
            RefuseForeign(found);
        }

        Mark();
        FileFault.Writing(Path, () => File.Delete(Manifest));
        foreach (var file in OwnNames().Select(In).Where(file => !string.Equals(file, ManifestPart, StringComparison.Ordinal)))
        {
            FileFault.Writing(file, () => File.Delete(file));
        }
    }

    private void RefuseForeign(string[] found)
    {
        if (File.Exists(Manifest))
        {
            Files.Manifest.Read(this);
        }
        else if (!File.Exists(ManifestPart))
        {
            throw new RecordingException($"{Path} is neither empty nor a recording, so nothing in it is deleted; choose another folder");
        }

        var own = OwnNames().ToHashSet(StringComparer.Ordinal);
        var foreign = found.Where(name => !own.Contains(name) || Directory.Exists(In(name))).Order(StringComparer.Ordinal).ToArray();
        if (foreign.Length > 0)
        {
            throw new RecordingException(
                $"{Path} holds more than a recording, so nothing in it is deleted: {string.Join(", ", foreign)}; move that away or choose another folder"
            );
        }
    }

    private void Mark() => FileFault.Writing(ManifestPart, () => File.WriteAllText(ManifestPart, "{ \"unfinished\": true }\n"));
}
