using Spectre.Console;
using Spectre.Console.Rendering;

namespace ScanSim.Cli;

/// <summary>A table as plain text, the same in a terminal and in a pipe.</summary>
internal static class TextTable
{
    /// <summary>Wide enough that no table of ours is wrapped.</summary>
    private const int WidthInCharacters = 400;

    /// <summary>Writes the table without trailing blanks.</summary>
    /// <param name="output">Where to.</param>
    /// <param name="columns">Headings; one that begins with '&gt;' is of a column that is set flush right.</param>
    /// <param name="rows">As many cells each as there are columns.</param>
    public static void Write(TextWriter output, string[] columns, IEnumerable<string[]> rows)
    {
        var table = new Table { Border = TableBorder.None };
        foreach (var column in columns)
        {
            var right = column.StartsWith('>');
            table.AddColumn(new TableColumn(new Text(right ? column[1..] : column)) { Alignment = right ? Justify.Right : Justify.Left, NoWrap = true, Padding = new Padding(0, 0, 3, 0) });
        }

        foreach (var row in rows)
        {
            table.AddRow(row.Select(cell => (IRenderable)new Text(cell)).ToArray());
        }

        using var text = new StringWriter();
        var console = AnsiConsole.Create(new AnsiConsoleSettings { Ansi = AnsiSupport.No, ColorSystem = ColorSystemSupport.NoColors, Interactive = InteractionSupport.No, Out = new AnsiConsoleOutput(text) });
        console.Profile.Width = WidthInCharacters;
        console.Profile.Capabilities.Unicode = true;
        console.Write(table);
        foreach (var line in text.ToString().Split('\n'))
        {
            var trimmed = line.TrimEnd();
            if (trimmed.Length > 0)
            {
                output.WriteLine(trimmed);
            }
        }
    }
}
