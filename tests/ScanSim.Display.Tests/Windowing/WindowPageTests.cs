using System.Text;
using ScanSim.Display.Replay;
using ScanSim.Testing;

namespace ScanSim.Display.Tests.Windowing;

public sealed class WindowPageTests
{
    private const string Begin = "<!-- keys: written by the tests -->\n";
    private const string End = "<!-- end of keys -->";

    private static readonly string Page = Path.Combine(RepositoryRoot.Find(), "docs", "window.md");

    [Fact]
    public void The_manual_lists_the_keys_that_the_replay_obeys()
    {
        var page = File.ReadAllText(Page);
        var from = page.IndexOf(Begin, StringComparison.Ordinal) + Begin.Length;
        var to = page.IndexOf(End, StringComparison.Ordinal);
        if (Environment.GetEnvironmentVariable("SCANSIM_APPROVE") == "1")
        {
            File.WriteAllText(Page, page[..from] + Table() + page[to..]);
            return;
        }

        Assert.Equal(Table(), page[from..to]);
    }

    private static string Table()
    {
        var table = new StringBuilder();
        foreach (var group in ReplayKeys.All.GroupBy(key => key.Group))
        {
            table.Append($"\n| {group.Key} | |\n|---|---|\n");
            foreach (var key in group)
            {
                table.Append($"| `{key.Keys}` | {key.Does} |\n");
            }
        }

        table.Append("\n| Mouse | |\n|---|---|\n");
        foreach (var (gesture, does) in ReplayKeys.Pointer)
        {
            table.Append($"| {gesture} | {does} |\n");
        }

        return table.Append('\n').ToString();
    }
}
