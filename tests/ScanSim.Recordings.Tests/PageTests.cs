using System.Text;
using ScanSim.Recordings.Columns;
using ScanSim.Recordings.Tables;
using ScanSim.Testing;

namespace ScanSim.Recordings.Tests;

/// <summary>Keeps docs/recording.md equal to the declaration of the tables. SCANSIM_REWRITE_DOCS=1 rewrites its tables instead.</summary>
public sealed class PageTests
{
    private const string Start = "<!-- tables: written from the declaration by the tests -->\n";
    private const string End = "<!-- end of tables -->\n";

    [Fact]
    public void The_page_lists_every_column_as_it_is_declared()
    {
        var path = Path.Combine(RepositoryRoot.Find(), "docs", "recording.md");
        var page = File.ReadAllText(path);
        var (start, end) = (page.IndexOf(Start, StringComparison.Ordinal) + Start.Length, page.IndexOf(End, StringComparison.Ordinal));
        if (Environment.GetEnvironmentVariable("SCANSIM_REWRITE_DOCS") == "1")
        {
            File.WriteAllText(path, page[..start] + Tables() + page[end..]);
            return;
        }

        Assert.Equal(Tables(), page[start..end], StringComparer.Ordinal);
    }

    [Fact]
    public void Every_value_of_an_enumeration_has_its_own_text()
    {
        AssertComplete<EchoKind>(EnumTexts.Echo.Texts);
        AssertComplete<LossReason>(EnumTexts.Loss.Texts);
        AssertComplete<TargetView>(EnumTexts.View.Texts);
        AssertComplete<LooksKept>(EnumTexts.Looks.Texts);
        AssertComplete<TableFormat>(EnumTexts.Format.Texts);
    }

    private static void AssertComplete<TEnum>(IReadOnlyCollection<string> texts)
        where TEnum : struct, Enum
    {
        Assert.Equal(Enum.GetValues<TEnum>().Length, texts.Distinct(StringComparer.Ordinal).Count());
        Assert.Equal(Enumerable.Range(0, texts.Count), Enum.GetValues<TEnum>().Select(value => Convert.ToInt32(value)));
    }

    private static string Tables()
    {
        var page = new StringBuilder();
        foreach (var table in RecordingTables.All)
        {
            page.Append($"\n### {table.Name}\n\n{table.RowMeaning}.\n\n| column | type | unit | meaning |\n|---|---|---|---|\n");
            foreach (var column in table.Columns)
            {
                page.Append($"| `{column.Name}` | {column.Type} | {column.Unit} | {column.Description}{Words(column)} |\n");
            }
        }

        return page.Append('\n').ToString();
    }

    private static string Words(Column column)
    {
        var texts = column.Name switch
        {
            "kind" => EnumTexts.Echo.Texts,
            "lost_to" => EnumTexts.Loss.Texts,
            "view" => EnumTexts.View.Texts,
            _ => [],
        };
        return texts.IsEmpty ? "" : ": " + string.Join(", ", texts.Where(text => text.Length > 0).Select(text => $"`{text}`"));
    }
}
