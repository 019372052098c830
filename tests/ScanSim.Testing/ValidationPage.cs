using System.Reflection;
using System.Text;

namespace ScanSim.Testing;

/// <summary>
/// Assembly fixture: when a test project ends, its section of docs/validation.md is brought up to date with the claims that
/// held. Lines of claims that were not run (a filter, a slow category) stay as they are.
/// </summary>
/// <remarks>Use: <c>[assembly: AssemblyFixture(typeof(ValidationPage))]</c>. Several test processes may end at the same time: a lock file orders them.</remarks>
public sealed class ValidationPage : IDisposable
{
    private const string Preamble =
        "# Validation\n\n" +
        "Written by the tests: each line is a claim that held when the tests last ran, with the source it was held against,\n" +
        "how many values were compared, what difference was allowed and the worst one found. Do not edit by hand.\n";

    private const string TableHead =
        "| claim | held against | values | allowed | worst difference | worst row |\n|---|---|---:|---|---|---|\n";

    public void Dispose()
    {
        var entries = ValidationLog.Snapshot();
        var section = Assembly.GetEntryAssembly()?.GetName().Name?.Replace("ScanSim.", "", StringComparison.Ordinal).Replace(".Tests", "", StringComparison.Ordinal);
        if (entries.Count == 0 || section is null || RepositoryRoot.TryFind() is not { } root)
        {
            return;
        }

        var page = Path.Combine(Directory.CreateDirectory(Path.Combine(root, "docs")).FullName, "validation.md");
        using var turn = WaitForTurn(Path.Combine(Path.GetTempPath(), "scansim-validation-" + Convert.ToHexString(System.Security.Cryptography.SHA256.HashData(Encoding.UTF8.GetBytes(root)))[..12] + ".lock"));
        var sections = File.Exists(page) ? Parse(File.ReadAllText(page)) : new SortedDictionary<string, SortedDictionary<string, string>>(StringComparer.Ordinal);
        if (!sections.TryGetValue(section, out var lines))
        {
            sections[section] = lines = new SortedDictionary<string, string>(StringComparer.Ordinal);
        }

        foreach (var e in entries)
        {
            lines[Cell(e.Claim)] = $"| {Cell(e.Claim)} | {Cell(e.Source)} | {e.Count} | {Cell(e.Allowed)} | {Cell(e.Worst)} | {Cell(e.WorstRow)} |";
        }

        var text = Render(sections);
        if (!File.Exists(page) || File.ReadAllText(page) != text)
        {
            File.WriteAllText(page + ".new", text);
            File.Move(page + ".new", page, overwrite: true);
        }
    }

    private static string Render(SortedDictionary<string, SortedDictionary<string, string>> sections)
    {
        var text = new StringBuilder(Preamble);
        foreach (var (name, lines) in sections)
        {
            text.Append("\n## ").Append(name).Append("\n\n").Append(TableHead);
            foreach (var line in lines.Values)
            {
                text.Append(line).Append('\n');
            }
        }

        return text.ToString();
    }

    private static SortedDictionary<string, SortedDictionary<string, string>> Parse(string text)
    {
        var sections = new SortedDictionary<string, SortedDictionary<string, string>>(StringComparer.Ordinal);
        SortedDictionary<string, string>? current = null;
        foreach (var line in text.Split('\n'))
        {
            if (line.StartsWith("## ", StringComparison.Ordinal))
            {
                sections[line[3..]] = current = new SortedDictionary<string, string>(StringComparer.Ordinal);
            }
            else if (current is not null && line.StartsWith("| ", StringComparison.Ordinal) && !line.StartsWith("| claim ", StringComparison.Ordinal))
            {
                current[line[2..line.IndexOf(" |", 2, StringComparison.Ordinal)]] = line;
            }
        }

        return sections;
    }

    private static string Cell(string text) => text.Replace('|', '/').Replace('\n', ' ').Trim();

    private static FileStream WaitForTurn(string path)
    {
        for (var attempt = 0; ; attempt++)
        {
            try
            {
                return new FileStream(path, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
            }
            catch (IOException) when (attempt < 600)
            {
                Thread.Sleep(50);
            }
        }
    }
}
