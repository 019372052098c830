using System.Globalization;

namespace ScanSim.Testing;

/// <summary>A table of tests/reference: '#' head lines (source, status, domain, tolerance), a header row, then values.</summary>
/// <remarks>Plain commas; a field may stand in double quotes. Read from the folder "reference" beside the test assembly.</remarks>
public sealed class ReferenceTable
{
    private readonly Dictionary<string, int> columnIndex = new(StringComparer.Ordinal);

    private ReferenceTable(string name, IReadOnlyList<string> head, string[] columns, IReadOnlyList<string[]> rows)
    {
        Name = name;
        Head = head;
        Rows = rows;
        for (var i = 0; i < columns.Length; i++)
        {
            columnIndex[columns[i]] = i;
        }
    }

    public string Name { get; }

    public IReadOnlyList<string> Head { get; }

    public IReadOnlyList<string[]> Rows { get; }

    public string Source => Head.FirstOrDefault(line => line.StartsWith("source:", StringComparison.Ordinal))?["source:".Length..].Trim()
        ?? throw new InvalidDataException($"{Name} has no '# source:' line");

    public static ReferenceTable Load(string fileName)
    {
        var path = Path.Combine(AppContext.BaseDirectory, "reference", fileName);
        var lines = File.ReadAllLines(path);
        var head = lines.TakeWhile(l => l.StartsWith('#')).Select(l => l[1..].Trim()).ToList();
        var body = lines.SkipWhile(l => l.StartsWith('#')).Where(l => l.Length > 0).Select(Split).ToList();
        return new ReferenceTable(fileName, head, body[0], body.Skip(1).ToList());
    }

    public string Text(string[] row, string column) => row[columnIndex[column]];

    public double Number(string[] row, string column) => double.Parse(Text(row, column), NumberStyles.Float, CultureInfo.InvariantCulture);

    public int Whole(string[] row, string column) => int.Parse(Text(row, column), NumberStyles.Integer, CultureInfo.InvariantCulture);

    private static string[] Split(string line)
    {
        var fields = new List<string>();
        var field = new System.Text.StringBuilder();
        var quoted = false;
        foreach (var c in line)
        {
            if (c == '"')
            {
                quoted = !quoted;
            }
            else if (c == ',' && !quoted)
            {
                fields.Add(field.ToString());
                field.Clear();
            }
            else
            {
                field.Append(c);
            }
        }

        fields.Add(field.ToString());
        return [.. fields];
    }
}
